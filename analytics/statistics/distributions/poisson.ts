import gammainc from '@stdlib/math-base-special-gammainc';
import { requireFiniteNumber, requireNotNegative, requireProbability } from '../checked';
import { discreteQuantile } from './discrete-quantile';

/** Probability of a count of at most `count` where `mean` are expected. Abramowitz & Stegun 26.4.21. */
export const poissonCdf = (count: number, mean: number): number => {
  requireFiniteNumber(count, 'A count');
  requireNotNegative(mean, 'The expected count');
  const whole = Math.floor(count);
  if (whole < 0) return 0;
  return mean === 0 ? 1 : gammainc(mean, whole + 1, true, true);
};

/** The least count whose cumulated probability reaches `p`; Infinity for 1. */
export const poissonQuantile = (p: number, mean: number): number => {
  requireProbability(p, 'A probability');
  return discreteQuantile(p, Number.POSITIVE_INFINITY, (count) => poissonCdf(count, mean));
};
