import { mean, median } from 'simple-statistics';
import { requireFinite } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';
import { movingRanges } from './moving-ranges';

/** Limits of a chart of single values, in the unit of the values. */
export type IndividualsLimits = {
  form: 'mean' | 'median';
  centre: number;
  lower: number;
  upper: number;
  /** Standard deviation as the moving ranges tell it. */
  sigma: number;
  /** Mean (or median) of the moving ranges, and the limit above which one is unusual. */
  movingRange: number;
  movingRangeUpper: number;
};

// Mean and median of the range of two normal values in standard deviations, and the upper limit of the range.
const D2 = 1.128;
const D2_MEDIAN = 0.9539;
const D4 = 3.267;
const D4_MEDIAN = 3.865;
const MEDIAN_FACTOR = 3.145;

/**
 * XmR limits: mean ± 3 MR̄/1.128, MR̄ the mean of the moving ranges. Needs two values; all equal gives limits on the
 * centre. NIST/SEMATECH e-Handbook of Statistical Methods, 6.3.2.2.
 */
export const individualsLimits = (values: readonly number[]): Estimate<IndividualsLimits> => {
  requireFinite(values, 'The values of the chart');
  if (values.length < 2) return tooFew(2, values.length, 'values');
  const centre = mean([...values]);
  const movingRange = mean(movingRanges(values));
  const sigma = movingRange / D2;
  return enough({
    form: 'mean',
    centre,
    lower: centre - 3 * sigma,
    upper: centre + 3 * sigma,
    sigma,
    movingRange,
    movingRangeUpper: D4 * movingRange,
  });
};

/**
 * XmR limits that a gross value hardly moves: median ± 3.145 median moving range (3/0.9539). Needs two values.
 * Wheeler & Chambers, Understanding Statistical Process Control, 2nd ed. (1992), table A.5.
 */
export const medianIndividualsLimits = (values: readonly number[]): Estimate<IndividualsLimits> => {
  requireFinite(values, 'The values of the chart');
  if (values.length < 2) return tooFew(2, values.length, 'values');
  const centre = median([...values]);
  const movingRange = median(movingRanges(values));
  return enough({
    form: 'median',
    centre,
    lower: centre - MEDIAN_FACTOR * movingRange,
    upper: centre + MEDIAN_FACTOR * movingRange,
    sigma: movingRange / D2_MEDIAN,
    movingRange,
    movingRangeUpper: D4_MEDIAN * movingRange,
  });
};
