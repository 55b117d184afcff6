import { sum } from 'simple-statistics';
import { type Estimate, enough, tooFew } from '../estimate';
import { type Effect, pooledMean, requireEffects, weightedSquares } from './pooled-mean';

/**
 * Variance between members by the method of moments: max(0, (Q − (k − 1))/(Σw − Σw²/Σw)). 0 is a real answer, "no
 * difference beyond chance". Needs two members. DerSimonian & Laird (1986), Controlled Clinical Trials 7, 177-188.
 */
export const derSimonianLaird = (effects: readonly Effect[]): Estimate<number> => {
  requireEffects(effects);
  if (effects.length < 2) return tooFew(2, effects.length, 'members');
  const pooled = pooledMean(effects);
  const total = sum(pooled.weights);
  const spare = total - sum(pooled.weights.map((weight) => weight * weight)) / total;
  return enough(Math.max(0, (weightedSquares(effects, pooled) - (effects.length - 1)) / spare));
};
