import { sum } from 'simple-statistics';
import { type Estimate, enough, tooFew } from '../estimate';
import { type Effect, pooledMean, requireEffects, weightedSquares } from './pooled-mean';

const MOST_STEPS = 1000;

/**
 * Variance between members by restricted maximum likelihood, as a second opinion. Needs two members. Fisher scoring as
 * in Viechtbauer (2005), Journal of Educational and Behavioral Statistics 30, 261-293.
 */
export const restrictedLikelihood = (effects: readonly Effect[]): Estimate<number> => {
  requireEffects(effects);
  if (effects.length < 2) return tooFew(2, effects.length, 'members');
  let variance = 0;
  for (let step = 0; step < MOST_STEPS; step++) {
    const pooled = pooledMean(effects, variance);
    const powers = [1, 2, 3].map((power) => sum(pooled.weights.map((weight) => weight ** power)));
    const [first = 0, second = 0, third = 0] = powers;
    const trace = first - second / first;
    const information = second - (2 * third) / first + (second / first) ** 2;
    const next = Math.max(0, variance + (weightedSquares(effects, pooled, 2) - trace) / information);
    const moved = Math.abs(next - variance);
    variance = next;
    if (moved <= 1e-13 * variance) break;
  }
  return enough(variance);
};
