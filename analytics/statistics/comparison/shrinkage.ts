import { Z_95 } from '../distributions/z-95';
import { type Estimate, enough, tooFew } from '../estimate';
import type { Interval } from '../intervals/interval';
import { pauleMandel } from './paule-mandel';
import { type Effect, pooledMean, requireEffects } from './pooled-mean';

/** Members from which on estimates are drawn towards their mean; fewer are shown as they are. */
export const SHRINKAGE_NEEDS = 4;

export type ShrunkMember = Interval & {
  /** Share of the way that the estimate was drawn towards the mean, 0 to 1. */
  weight: number;
  estimate: number;
  standardError: number;
};
export type Shrinkage = { betweenVariance: number; mean: number; members: ShrunkMember[] };

/**
 * Empirical Bayes: each member drawn towards the mean by B = (k − 3)/(k − 1) v/(v + τ²), its variance
 * v(1 − (k − 1)/k B) + 2/(k − 3) B²(y − μ)² paying for the estimated τ² (Paule-Mandel). Under four members B is 0. Needs
 * two. Morris (1983), JASA 78, 47-55.
 */
export const shrinkage = (effects: readonly Effect[]): Estimate<Shrinkage> => {
  requireEffects(effects);
  const between = pauleMandel(effects);
  if (!between.enough) return tooFew(2, effects.length, 'members');
  const count = effects.length;
  const betweenVariance = between.value;
  const { mean } = pooledMean(effects, betweenVariance);
  const members = effects.map(({ estimate, variance }) => {
    const few = count < SHRINKAGE_NEEDS;
    const weight = few ? 0 : (((count - 3) / (count - 1)) * variance) / (variance + betweenVariance);
    const drawn = weight === 0 ? estimate : mean + (1 - weight) * (estimate - mean);
    const paid = few ? 0 : (2 / (count - 3)) * (weight * (estimate - mean)) ** 2;
    const standardError = Math.sqrt(variance * (1 - ((count - 1) / count) * weight) + paid);
    const half = Z_95 * standardError;
    return { weight, estimate: drawn, standardError, lower: drawn - half, upper: drawn + half };
  });
  return enough({ betweenVariance, mean, members });
};
