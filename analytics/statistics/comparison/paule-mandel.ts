import { type Estimate, enough, tooFew } from '../estimate';
import { type Effect, pooledMean, requireEffects, weightedSquares } from './pooled-mean';

const MOST_STEPS = 200;

/**
 * Variance between members that makes Σ(y − μ)²/(v + τ²) equal k − 1; 0 where it is smaller without any. The better
 * default below 15 members, and the fit of Morris (1983). Needs two. Paule & Mandel (1982), Journal of Research of the
 * NBS 87, 377-385; Newton's steps as in DerSimonian & Kacker (2007), Contemporary Clinical Trials 28, 105-114.
 */
export const pauleMandel = (effects: readonly Effect[]): Estimate<number> => {
  requireEffects(effects);
  if (effects.length < 2) return tooFew(2, effects.length, 'members');
  // The sum falls and flattens with the variance, so Newton's steps rise from 0 towards the root and never pass it.
  let variance = 0;
  for (let step = 0; step < MOST_STEPS; step++) {
    const pooled = pooledMean(effects, variance);
    const excess = weightedSquares(effects, pooled) - (effects.length - 1);
    const next = variance + excess / weightedSquares(effects, pooled, 2);
    if (!(next > variance * (1 + Number.EPSILON))) break;
    variance = next;
  }
  return enough(variance);
};
