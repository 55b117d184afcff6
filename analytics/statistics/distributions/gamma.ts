import gammainc from '@stdlib/math-base-special-gammainc';
import gammaincinv from '@stdlib/math-base-special-gammaincinv';
import { requireFiniteNumber, requirePositive, requireProbability } from '../checked';

/** Probability that a gamma variable (mean shape/rate) is at most `value`. Abramowitz & Stegun 26.1.31. */
export const gammaCdf = (value: number, shape: number, rate: number): number => {
  requireFiniteNumber(value, 'A value');
  requirePositive(shape, 'The shape');
  requirePositive(rate, 'The rate');
  return value <= 0 ? 0 : gammainc(value * rate, shape, true, false);
};

/** The value that a gamma variable (mean shape/rate) does not exceed with probability `p`. */
export const gammaQuantile = (p: number, shape: number, rate: number): number => {
  requireProbability(p, 'A probability');
  requirePositive(shape, 'The shape');
  requirePositive(rate, 'The rate');
  if (p === 1) return Number.POSITIVE_INFINITY;
  return gammaincinv(p, shape, false) / rate;
};

/** Probability that a chi-square variable is above `value`. Abramowitz & Stegun 26.4.2. */
export const chiSquareUpperTail = (value: number, degrees: number): number => {
  requireFiniteNumber(value, 'A value');
  requirePositive(degrees, 'Degrees of freedom');
  return value <= 0 ? 1 : gammainc(value / 2, degrees / 2, true, true);
};

/** The value that a chi-square variable does not exceed with probability `p`. */
export const chiSquareQuantile = (p: number, degrees: number): number => gammaQuantile(p, degrees / 2, 0.5);
