import betainc from '@stdlib/math-base-special-betainc';
import betaincinv from '@stdlib/math-base-special-betaincinv';
import { requireFiniteNumber, requirePositive, requireProbability } from '../checked';

/** Probability that Student's t is at most `value`. Abramowitz & Stegun 26.7.1. */
export const studentTCdf = (value: number, degrees: number): number => {
  requireFiniteNumber(value, 'A value of t');
  requirePositive(degrees, 'Degrees of freedom');
  const tail = 0.5 * betainc(degrees / (degrees + value * value), degrees / 2, 0.5, true, false);
  return value < 0 ? tail : 1 - tail;
};

/** The value that Student's t does not exceed with probability `p`; ∓Infinity for 0 and 1. */
export const studentTQuantile = (p: number, degrees: number): number => {
  requireProbability(p, 'A probability');
  requirePositive(degrees, 'Degrees of freedom');
  const side = p < 0.5 ? -1 : 1;
  const bothTails = 2 * Math.min(p, 1 - p);
  if (bothTails === 0) return side * Number.POSITIVE_INFINITY;
  // n/(n + t²) is exact for large t, and its complement t²/(n + t²) for small.
  const far = betaincinv(bothTails, degrees / 2, 0.5, false);
  if (far < 0.5) return side * Math.sqrt((degrees * (1 - far)) / far);
  const near = betaincinv(1 - bothTails, 0.5, degrees / 2, false);
  return side * Math.sqrt((degrees * near) / (1 - near));
};
