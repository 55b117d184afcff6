import { median } from 'simple-statistics';
import { requireFinite } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';
import { leastReaching } from './order-search';

/** Distances from the median to each side, nearest first; those of 0 are tied with it. */
type Sides = { above: number[]; below: number[] };

const skewOf = (above: number, below: number, aboveRank: number, belowRank: number): number =>
  above + below > 0 ? (above - below) / (above + below) : Math.sign(aboveRank - belowRank);

/** Pairs whose skew is at most `bound`. It rises with the distance above and falls with the one below. */
const pairsUpTo = ({ above, below }: Sides, bound: number): number => {
  let pairs = 0;
  let nearest = 0;
  above.forEach((distance, rank) => {
    while (nearest < below.length && skewOf(distance, below[nearest] ?? 0, rank, nearest) > bound) nearest += 1;
    pairs += below.length - nearest;
  });
  return pairs;
};

/**
 * Medcouple: median over pairs around the median of how much farther the upper one lies than the lower, −1 (long low
 * tail) to 1. Pairs tied with the median count by their rank. Needs three values. Brys, Hubert & Struyf (2004), Journal
 * of Computational and Graphical Statistics 13, 996-1017.
 */
export const medcouple = (values: readonly number[]): Estimate<number> => {
  requireFinite(values, 'Values');
  if (values.length < 3) return tooFew(3, values.length, 'values');
  const centre = median([...values]);
  const side = (sign: 1 | -1) =>
    values
      .map((value) => sign * (value - centre))
      .filter((distance) => distance >= 0)
      .sort((a, b) => a - b);
  const sides = { above: side(1), below: side(-1) };
  const total = sides.above.length * sides.below.length;
  const ranked = (rank: number) => leastReaching(rank, -1, 1, (bound) => pairsUpTo(sides, bound));
  return enough((ranked(Math.floor((total + 1) / 2)) + ranked(Math.floor(total / 2) + 1)) / 2);
};
