import { quantileSorted } from 'simple-statistics';
import { type Random, seededRandom } from '@/lib/random';
import { requireProbability, requireWhole } from '../checked';

/** Draws of a quantity, the smallest first. */
export type Draws = Float64Array;

/** `count` values of `draw`, the same for the same seed. JCGM 101:2008, 7. */
export const simulate = (seed: string, count: number, draw: (random: Random) => number): Draws => {
  requireWhole(count, 'The number of draws', 1);
  const random = seededRandom(seed);
  return Float64Array.from({ length: count }, () => draw(random)).sort();
};

/** Mean of draws, and how far chance may have moved it (one standard error). */
export const drawnMean = (draws: Draws): { mean: number; standardError: number } => {
  const { length } = draws;
  const mean = draws.reduce((sum, draw) => sum + draw, 0) / length;
  const squares = draws.reduce((sum, draw) => sum + (draw - mean) ** 2, 0);
  return { mean, standardError: Math.sqrt(squares / length / Math.max(1, length - 1)) };
};

/**
 * A quantile of draws with the ends between which it would come again in 95 of 100 simulations, from the ranks that a
 * binomial count leaves: Conover (1999), Practical Nonparametric Statistics, section 3.2. Figures finer than these ends
 * are chance.
 */
export const drawnQuantile = (draws: Draws, p: number): { value: number; lower: number; upper: number } => {
  requireProbability(p, 'A probability');
  const { length } = draws;
  const sorted = Array.from(draws);
  const reach = 1.96 * Math.sqrt((p * (1 - p)) / length);
  const at = (share: number) => quantileSorted(sorted, Math.min(1, Math.max(0, share)));
  return { value: at(p), lower: at(p - reach), upper: at(p + reach) };
};
