import erfc from '@stdlib/math-base-special-erfc';
import erfcinv from '@stdlib/math-base-special-erfcinv';
import { requireFiniteNumber, requireProbability } from '../checked';

/** Probability that a standard normal value is at most `value`. Abramowitz & Stegun 26.2.29. */
export const normalCdf = (value: number): number => {
  requireFiniteNumber(value, 'A normal value');
  return 0.5 * erfc(-value / Math.SQRT2);
};

/** Height of the standard normal curve at `value`. */
export const normalDensity = (value: number): number => {
  requireFiniteNumber(value, 'A normal value');
  return Math.exp(-0.5 * value * value) / Math.sqrt(2 * Math.PI);
};

/** Standard normal value that is not exceeded with probability `p`; ∓Infinity for 0 and 1. */
export const normalQuantile = (p: number): number => {
  requireProbability(p, 'A probability');
  // Each half from its own tail, where the doubles are dense.
  return p < 0.5 ? -Math.SQRT2 * erfcinv(2 * p) : Math.SQRT2 * erfcinv(2 * (1 - p));
};

/** Probability of a standard normal value at least as far from 0 as `z`, on either side. */
export const twoSidedP = (z: number): number => {
  requireFiniteNumber(z, 'A standard score');
  return erfc(Math.abs(z) / Math.SQRT2);
};
