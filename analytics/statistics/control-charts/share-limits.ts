import { mean, sum } from 'simple-statistics';
import { requirePositive, requireSameLength, requireWhole } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';
import { BASELINE } from './baseline';
import { movingRanges } from './moving-ranges';

export type ShareLimits = {
  /** Share over all groups. */
  centre: number;
  /** Limits of each group by the binomial alone, and as the groups' own spread widens them (Laney's p′). */
  groups: { lower: number; upper: number; laneyLower: number; laneyUpper: number }[];
  /** Spread between neighbouring groups, 1 = as the binomial says; and the factor that the limits used. */
  spread: number;
  spreadUsed: number;
};

/**
 * Limits of shares with varying group sizes: p̄ ± 3 √(p̄(1 − p̄)/n) σz, σz the mean moving range of the groups'
 * standard scores over 1.128. Below 1 with fewer than 20 groups σz is itself mostly chance, so 1 is used then. Clipped
 * to 0…1. Needs two groups. Laney (2002), Quality Engineering 14, 531-537.
 */
export const shareLimits = (hits: readonly number[], sizes: readonly number[]): Estimate<ShareLimits> => {
  requireSameLength(hits, sizes, 'Hits and group sizes');
  hits.forEach((count, index) => {
    const size = sizes[index] ?? 0;
    requireWhole(count, 'Hits');
    requirePositive(size, 'A group size');
    if (count > size) throw new RangeError(`A group of ${size} cannot have ${count} hits`);
  });
  if (hits.length < 2) return tooFew(2, hits.length, 'groups');

  const centre = sum([...hits]) / sum([...sizes]);
  const errors = sizes.map((size) => Math.sqrt((centre * (1 - centre)) / size));
  const scores = errors.map((error, index) =>
    error > 0 ? ((hits[index] ?? 0) / (sizes[index] ?? 1) - centre) / error : 0,
  );
  const spread = mean(movingRanges(scores)) / 1.128;
  const spreadUsed = spread < 1 && hits.length < BASELINE.firm ? 1 : spread;
  const groups = errors.map((error) => ({
    lower: Math.max(0, centre - 3 * error),
    upper: Math.min(1, centre + 3 * error),
    laneyLower: Math.max(0, centre - 3 * error * spreadUsed),
    laneyUpper: Math.min(1, centre + 3 * error * spreadUsed),
  }));
  return enough({ centre, groups, spread, spreadUsed });
};
