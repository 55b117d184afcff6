import type { EtsModel, EtsWeights } from './model';

const LEAST = 1e-4;
const MOST = 1 - LEAST;
const DAMPING = { least: 0.8, most: 0.98 } as const;

/** A share within two bounds from any number. */
const within = (low: number, high: number, number: number): number => low + (high - low) / (1 + Math.exp(-number));

/** How many weights a model has. */
export const countOfWeights = ({ trend, damped, season }: EtsModel): number =>
  1 + (trend === 'A' ? 1 : 0) + (season === 'N' ? 0 : 1) + (damped ? 1 : 0);

/**
 * Weights within their usual bounds from the first numbers of a search without bounds: 0 < β < α < 1, 0 < γ < 1 − α, and
 * φ from 0.80, below which damping is too strong to tell from no trend, to 0.98.
 */
export const weightsAt = (at: readonly number[], { trend, damped, season }: EtsModel): EtsWeights => {
  const alpha = within(LEAST, MOST, at[0] ?? 0);
  let next = 1;
  const take = (): number => at[next++] ?? 0;
  const beta = trend === 'A' ? within(LEAST, Math.max(alpha, 2 * LEAST), take()) : 0;
  const gamma = season === 'N' ? 0 : within(LEAST, Math.max(1 - alpha, 2 * LEAST), take());
  const phi = damped ? within(DAMPING.least, DAMPING.most, take()) : 1;
  return { alpha, beta, gamma, phi };
};

/** Where the search begins: a likelihood of weights has several valleys. */
export const logisticStarts = ({ trend, damped, season }: EtsModel): number[][] =>
  [
    { alpha: 0, beta: -2, gamma: -2, phi: 1.5 },
    { alpha: -3, beta: 2, gamma: 1, phi: 3 },
    { alpha: 3, beta: 2, gamma: -4, phi: 0 },
  ].map(({ alpha, beta, gamma, phi }) => [
    alpha,
    ...(trend === 'A' ? [beta] : []),
    ...(season === 'N' ? [] : [gamma]),
    ...(damped ? [phi] : []),
  ]);
