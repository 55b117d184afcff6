import { quantileSorted } from 'simple-statistics';
import { requireFinite, requireProbability } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';

const sorted = (values: readonly number[]): number[] => {
  requireFinite(values, 'Values');
  return [...values].sort((a, b) => a - b);
};

/** Quantile by linear interpolation between (n − 1)p places: type 7 of Hyndman & Fan (1996), American Statistician 50. */
export const quantile = (values: readonly number[], p: number): Estimate<number> => {
  requireProbability(p, 'A probability');
  const order = sorted(values);
  return order.length === 0 ? tooFew(1, 0, 'values') : enough(quantileSorted(order, p));
};

/** Quantile whose median is right whatever the distribution: type 8 of Hyndman & Fan (1996), which they advise. */
export const medianUnbiasedQuantile = (values: readonly number[], p: number): Estimate<number> => {
  requireProbability(p, 'A probability');
  const order = sorted(values);
  if (order.length === 0) return tooFew(1, 0, 'values');
  const place = Math.min(Math.max((order.length + 1 / 3) * p + 1 / 3, 1), order.length);
  const below = Math.floor(place + 4 * Number.EPSILON);
  const low = order[below - 1] ?? Number.NaN;
  const high = order[below] ?? low;
  return enough(low + Math.max(0, place - below) * (high - low));
};

export type FiveNumbers = { least: number; lowerHinge: number; median: number; upperHinge: number; most: number };

/** Least, hinges, median and most; a hinge is the median of its half. Tukey, Exploratory Data Analysis (1977). */
export const fiveNumbers = (values: readonly number[]): Estimate<FiveNumbers> => {
  const order = sorted(values);
  const { length } = order;
  if (length === 0) return tooFew(1, 0, 'values');
  const at = (place: number) => ((order[Math.floor(place) - 1] ?? 0) + (order[Math.ceil(place) - 1] ?? 0)) / 2;
  const depth = Math.floor((length + 3) / 2) / 2;
  return enough({
    least: at(1),
    lowerHinge: at(depth),
    median: at((length + 1) / 2),
    upperHinge: at(length + 1 - depth),
    most: at(length),
  });
};
