import { requireFiniteNumber, requirePositive } from '../checked';
import { normalQuantile } from './normal';

/** The value that a log-normal variable does not exceed with probability `p`; mean and deviation are of its logarithm. */
export const logNormalQuantile = (p: number, logMean: number, logDeviation: number): number => {
  requireFiniteNumber(logMean, 'The mean of the logarithm');
  requirePositive(logDeviation, 'The deviation of the logarithm');
  return Math.exp(logMean + logDeviation * normalQuantile(p));
};
