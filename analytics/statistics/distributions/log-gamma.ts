import gammaln from '@stdlib/math-base-special-gammaln';
import { requirePositive } from '../checked';

/** Natural logarithm of the gamma function, for arguments above 0. */
export const logGamma = (value: number): number => {
  requirePositive(value, 'The argument of the gamma function');
  return gammaln(value);
};

/** Natural logarithm of the beta function, for arguments above 0. */
export const logBeta = (a: number, b: number): number => logGamma(a) + logGamma(b) - logGamma(a + b);
