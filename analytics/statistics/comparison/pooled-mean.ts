import { sum } from 'simple-statistics';
import { requireFinite, requireNotNegative, requirePositive } from '../checked';

/** One member's estimate and its sampling variance, in the unit and its square. */
export type Effect = { estimate: number; variance: number };

export type PooledMean = { mean: number; standardError: number; weights: number[] };

/** Throws a RangeError for an estimate that is no number or a variance that is not above 0. */
export const requireEffects = (effects: readonly Effect[]): void => {
  requireFinite(
    effects.map((effect) => effect.estimate),
    'Estimates',
  );
  for (const { variance } of effects) requirePositive(variance, 'A sampling variance');
};

/** Mean of the estimates, each weighted by 1/(its variance + the variance between members). */
export const pooledMean = (effects: readonly Effect[], betweenVariance = 0): PooledMean => {
  requireNotNegative(betweenVariance, 'The variance between members');
  const weights = effects.map((effect) => 1 / (effect.variance + betweenVariance));
  const total = sum(weights);
  const mean = sum(effects.map((effect, index) => (weights[index] ?? 0) * effect.estimate)) / total;
  return { mean, standardError: 1 / Math.sqrt(total), weights };
};

/** Weighted squared distances from the pooled mean: Cochran's Q where there is no variance between. */
export const weightedSquares = (effects: readonly Effect[], { mean, weights }: PooledMean, power = 1): number =>
  sum(effects.map((effect, index) => (weights[index] ?? 0) ** power * (effect.estimate - mean) ** 2));
