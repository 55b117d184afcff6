import { requireFinite, requireProbability } from '../checked';

const sorted = (errors: readonly number[]): number[] => {
  requireFinite(errors, 'Errors');
  return [...errors].sort((a, b) => a - b);
};

// (n + 1)·0.9 must not come out a hair above 18 and be rounded up to the next error.
const ROUNDING = 1e-9;
const ceiling = (rank: number): number => Math.ceil(rank - ROUNDING);
const floor = (rank: number): number => Math.floor(rank + ROUNDING);

/**
 * How far about a forecast the share 1 − α of coming values lies, if they come as the past errors did: the
 * ⌈(n + 1)(1 − α)⌉-th smallest absolute error; null where there are too few errors for this level. Lei et al. (2018),
 * Journal of the American Statistical Association 113, 1094-1111.
 */
export const conformalReach = (errors: readonly number[], alpha: number): number | null => {
  requireProbability(alpha, 'The share outside');
  const sizes = sorted(errors.map(Math.abs));
  return sizes[ceiling((sizes.length + 1) * (1 - alpha)) - 1] ?? null;
};

/**
 * The same with each side by its own errors: the ⌊(n + 1)α/2⌋-th and the ⌈(n + 1)(1 − α/2)⌉-th smallest of actual −
 * forecast, to be added to a forecast. An end is null where there are too few errors: 80 % takes 9 of them, 95 % 39.
 */
export const conformalOffsets = (
  errors: readonly number[],
  alpha: number,
): { lower: number | null; upper: number | null } => {
  requireProbability(alpha, 'The share outside');
  const order = sorted(errors);
  const places = order.length + 1;
  return {
    lower: order[floor((places * alpha) / 2) - 1] ?? null,
    upper: order[ceiling(places * (1 - alpha / 2)) - 1] ?? null,
  };
};

/** Errors from which on a level can be shown. */
export const errorsNeededFor = (alpha: number): number => ceiling(2 / alpha) - 1;

/**
 * The share outside to ask for next, after each forecast that was missed or not: α' = α + γ(target − missed), so that
 * ranges widen where they have been too narrow. Gibbs & Candès (2021), Advances in Neural Information Processing
 * Systems 34.
 */
export const adaptiveAlphas = (target: number, gamma: number, missed: readonly boolean[]): number[] => {
  requireProbability(target, 'The share outside');
  let alpha = target;
  return [target, ...missed.map((miss) => (alpha += gamma * (target - (miss ? 1 : 0))))];
};
