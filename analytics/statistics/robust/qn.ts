import { requireFinite } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';
import { leastReaching } from './order-search';

const CONSTANT = 2.21914;
/** Corrections for 2 to 12 values, as R's robustbase has them. */
const SMALL = [0.399356, 0.99365, 0.51321, 0.84401, 0.6122, 0.85877, 0.66993, 0.87344, 0.72014, 0.88906, 0.75743];

const correction = (count: number): number => {
  const small = SMALL[count - 2];
  if (small !== undefined) return small;
  const excess =
    count % 2 === 1
      ? (1.60188 + (-2.1284 - 5.172 / count) / count) / count
      : (3.67561 + (1.9654 + (6.987 - 77 / count) / count) / count) / count;
  return 1 / (1 + excess);
};

/** Pairs of a sorted list that are at most `distance` apart. */
const pairsWithin = (order: readonly number[], distance: number): number => {
  let pairs = 0;
  let first = 0;
  order.forEach((value, index) => {
    while (value - (order[first] ?? value) > distance) first += 1;
    pairs += index - first;
  });
  return pairs;
};

/** Qn without and with its correction for few values. */
export type Qn = { uncorrected: number; value: number };

/**
 * Qn = 2.21914 × the h(h − 1)/2-th smallest distance between two values, h = ⌊n/2⌋ + 1: as sturdy as the MAD, and 82 %
 * efficient where values are normal. Needs two values. Rousseeuw & Croux (1993), JASA 88, 1273-1283.
 */
export const qn = (values: readonly number[]): Estimate<Qn> => {
  requireFinite(values, 'Values');
  const { length } = values;
  if (length < 2) return tooFew(2, length, 'values');
  const order = [...values].sort((a, b) => a - b);
  const half = Math.floor(length / 2) + 1;
  const range = (order.at(-1) ?? 0) - (order[0] ?? 0);
  const distance = leastReaching((half * (half - 1)) / 2, 0, range, (bound) => pairsWithin(order, bound));
  const uncorrected = CONSTANT * distance;
  return enough({ uncorrected, value: uncorrected * correction(length) });
};
