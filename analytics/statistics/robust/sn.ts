import { requireFinite } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';

const CONSTANT = 1.1926;
/** Corrections for 2 to 9 values. */
const SMALL = [0.743, 1.851, 0.954, 1.351, 0.993, 1.198, 1.005, 1.131];

const correction = (count: number): number => SMALL[count - 2] ?? (count % 2 === 1 ? count / (count - 0.9) : 1);

/** Distance from the value at `index` to its `rank`-th nearest, itself counted, in a sorted list. */
const nearestDistance = (order: readonly number[], index: number, rank: number): number => {
  const own = order[index] ?? 0;
  const reach = (start: number) =>
    Math.max(
      own - (order[start] ?? Number.NEGATIVE_INFINITY),
      (order[start + rank - 1] ?? Number.POSITIVE_INFINITY) - own,
    );
  // The nearest `rank` values stand together. As their window moves up, its lower end nears and its upper end leaves,
  // so the best window is where the two distances cross.
  let low = Math.max(0, index - rank + 1);
  let high = Math.min(index, order.length - rank);
  while (low < high) {
    const middle = Math.floor((low + high) / 2);
    const upper = (order[middle + rank - 1] ?? 0) - own;
    if (own - (order[middle] ?? 0) > upper) low = middle + 1;
    else high = middle;
  }
  return Math.min(reach(low), low > 0 ? reach(low - 1) : Number.POSITIVE_INFINITY);
};

/** Sn without and with its correction for few values. */
export type Sn = { uncorrected: number; value: number };

/**
 * Sn = 1.1926 × low median over i of the high median over j of |xᵢ − xⱼ|: a standard deviation that half of the values
 * cannot spoil and that assumes no symmetry. Needs two values. Rousseeuw & Croux (1993), JASA 88, 1273-1283.
 */
export const sn = (values: readonly number[]): Estimate<Sn> => {
  requireFinite(values, 'Values');
  const { length } = values;
  if (length < 2) return tooFew(2, length, 'values');
  const order = [...values].sort((a, b) => a - b);
  const rank = Math.floor(length / 2) + 1;
  const distances = order.map((_, index) => nearestDistance(order, index, rank)).sort((a, b) => a - b);
  const uncorrected = CONSTANT * (distances[Math.floor((length + 1) / 2) - 1] ?? 0);
  return enough({ uncorrected, value: uncorrected * correction(length) });
};
