import { requireFinite, requirePositive } from '../checked';
import { normalCdf, normalDensity } from '../distributions/normal';

/**
 * Continuous ranked probability score of a normal forecast, in the unit of the value: the pinball loss over all
 * quantiles, doubled. Gneiting & Raftery (2007), Journal of the American Statistical Association 102, 359-378, eq. 21.
 */
export const normalCrps = (value: number, mean: number, sigma: number): number => {
  requirePositive(sigma, 'The standard deviation');
  const z = (value - mean) / sigma;
  return sigma * (z * (2 * normalCdf(z) - 1) + 2 * normalDensity(z) - 1 / Math.sqrt(Math.PI));
};

/**
 * The same score of a forecast that is a list of draws: mean |x − y| less half of the mean difference of two draws. From
 * the sorted draws, so that 20,000 of them take no square. Gneiting & Raftery (2007), eq. 20.
 */
export const drawsCrps = (value: number, draws: readonly number[]): number => {
  requireFinite(draws, 'Draws');
  const { length } = draws;
  if (length === 0) throw new RangeError('A score needs at least one draw');
  const distance = draws.reduce((sum, draw) => sum + Math.abs(draw - value), 0) / length;
  const order = [...draws].sort((a, b) => a - b);
  // Each draw stands above `rank` others and below the rest.
  const differences = order.reduce((sum, draw, rank) => sum + (2 * rank - length + 1) * draw, 0);
  return distance - differences / (length * length);
};
