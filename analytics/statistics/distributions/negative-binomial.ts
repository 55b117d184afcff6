import { requireFiniteNumber, requirePositive, requireProbability } from '../checked';
import { betaCdf } from './beta';
import { discreteQuantile } from './discrete-quantile';

/**
 * Probability of at most `count` misses before the `size`-th hit, `share` being that of hits: a Poisson count whose
 * mean varies as a gamma. Abramowitz & Stegun 26.5.26.
 */
export const negativeBinomialCdf = (count: number, size: number, share: number): number => {
  requireFiniteNumber(count, 'A count');
  requirePositive(size, 'The size');
  requirePositive(share, 'The share of hits');
  requireProbability(share, 'The share of hits');
  return count < 0 ? 0 : betaCdf(share, size, Math.floor(count) + 1);
};

/** The least count whose cumulated probability reaches `p`; Infinity for 1. */
export const negativeBinomialQuantile = (p: number, size: number, share: number): number => {
  requireProbability(p, 'A probability');
  return discreteQuantile(p, Number.POSITIVE_INFINITY, (count) => negativeBinomialCdf(count, size, share));
};
