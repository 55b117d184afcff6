import { mean, median } from 'simple-statistics';
import { requireFinite } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';

/** Turns a median absolute deviation into a standard deviation where values are normal. */
export const MAD_TO_SIGMA = 1.4826;

/** Distances from the median, in the unit of the values. */
export type Deviations = {
  median: number;
  /** Median of the distances, of those at or below the median, and of those at or above it. */
  mad: number;
  lowerMad: number;
  upperMad: number;
  /** Mean of the distances, for values of which over half are equal. */
  meanDeviation: number;
};

/**
 * Median and median distances from it. Needs two values. The two sides apart serve yields, whose low tail is longer.
 * Rousseeuw & Croux (1993), JASA 88, 1273-1283; Iglewicz & Hoaglin, How to Detect and Handle Outliers (ASQC 1993).
 */
export const deviations = (values: readonly number[]): Estimate<Deviations> => {
  requireFinite(values, 'Values');
  if (values.length < 2) return tooFew(2, values.length, 'values');
  const centre = median([...values]);
  const distances = values.map((value) => Math.abs(value - centre));
  return enough({
    median: centre,
    mad: median(distances),
    lowerMad: median(distances.filter((_, index) => (values[index] ?? 0) <= centre)),
    upperMad: median(distances.filter((_, index) => (values[index] ?? 0) >= centre)),
    meanDeviation: mean(distances),
  });
};
