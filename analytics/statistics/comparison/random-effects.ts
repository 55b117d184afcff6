import { sum } from 'simple-statistics';
import { chiSquareUpperTail } from '../distributions/gamma';
import { Z_95 } from '../distributions/z-95';
import { type Estimate, enough, tooFew } from '../estimate';
import type { Interval } from '../intervals/interval';
import { type Effect, pooledMean, requireEffects, weightedSquares } from './pooled-mean';

export type Prediction = Interval & { estimate: number };
export type RandomEffects = {
  betweenVariance: number;
  mean: number;
  standardError: number;
  interval: Interval;
  /** Cochran's Q about the fixed mean, and the chance of at least as much if members do not differ. */
  q: number;
  qP: number;
  /** Percentage of the spread that lies between members, and total spread over what chance alone gives. */
  iSquaredPercent: number;
  hSquared: number;
  /** Each member drawn towards the mean by the share of its variance that is chance, with 95 % interval. */
  members: Prediction[];
};

const around = (estimate: number, standardError: number): Interval => ({
  lower: estimate - Z_95 * standardError,
  upper: estimate + Z_95 * standardError,
});

/**
 * Mean and members of a random-effects model whose variance between members was found by one of the methods beside this.
 * Needs two members. DerSimonian & Laird (1986); I² and H² of Higgins & Thompson (2002), Statistics in Medicine 21,
 * 1539-1558, with the variance between members put in.
 */
export const randomEffects = (effects: readonly Effect[], betweenVariance: number): Estimate<RandomEffects> => {
  requireEffects(effects);
  if (effects.length < 2) return tooFew(2, effects.length, 'members');
  const { mean, standardError } = pooledMean(effects, betweenVariance);
  const fixed = pooledMean(effects);
  const q = weightedSquares(effects, fixed);
  const total = sum(fixed.weights);
  const squares = sum(fixed.weights.map((weight) => weight * weight));
  const typicalVariance = ((effects.length - 1) * total) / (total * total - squares);
  return enough({
    betweenVariance,
    mean,
    standardError,
    interval: around(mean, standardError),
    q,
    qP: chiSquareUpperTail(q, effects.length - 1),
    iSquaredPercent: (100 * betweenVariance) / (typicalVariance + betweenVariance),
    hSquared: betweenVariance / typicalVariance + 1,
    members: effects.map(({ estimate, variance }) => {
      const chance = variance / (variance + betweenVariance);
      const drawn = chance * mean + (1 - chance) * estimate;
      const error = Math.sqrt((1 - chance) * variance + (chance * standardError) ** 2);
      return { estimate: drawn, ...around(drawn, error) };
    }),
  });
};
