import betainc from '@stdlib/math-base-special-betainc';
import betaincinv from '@stdlib/math-base-special-betaincinv';
import { requireFiniteNumber, requirePositive, requireProbability } from '../checked';

/** Probability that a beta share with shapes `a` and `b` is at most `share`. Abramowitz & Stegun 26.5.1. */
export const betaCdf = (share: number, a: number, b: number): number => {
  requireFiniteNumber(share, 'A share');
  requirePositive(a, 'The first shape');
  requirePositive(b, 'The second shape');
  if (share <= 0) return 0;
  return share >= 1 ? 1 : betainc(share, a, b, true, false);
};

/** The share that a beta variable with shapes `a` and `b` does not exceed with probability `p`. */
export const betaQuantile = (p: number, a: number, b: number): number => {
  requireProbability(p, 'A probability');
  requirePositive(a, 'The first shape');
  requirePositive(b, 'The second shape');
  return betaincinv(p, a, b, false);
};
