import { mean, sum } from 'simple-statistics';
import { requireFinite } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';

/** Above this a chart of single values cries wolf, and what is left after season and trend is charted instead. */
export const CHARTABLE_AUTOCORRELATION = 0.3;

/**
 * How much each value repeats its deviation in the next, −1 to 1. Needs three values; a constant series has none. NIST
 * Statistical Reference Datasets, univariate summary statistics.
 */
export const autocorrelation = (values: readonly number[]): Estimate<number> => {
  requireFinite(values, 'The values of the series');
  if (values.length < 3) return tooFew(3, values.length, 'values');
  const centre = mean([...values]);
  const deviations = values.map((value) => value - centre);
  const squares = sum(deviations.map((deviation) => deviation * deviation));
  const products = sum(deviations.slice(1).map((deviation, index) => deviation * (deviations[index] ?? 0)));
  return enough(squares > 0 ? products / squares : 0);
};
