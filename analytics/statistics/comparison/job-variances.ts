import { mean, sampleVariance, sum } from 'simple-statistics';
import { requireFinite, requireSameLength } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';

/** Records of pooled variance that a cell's own is mixed with, and records from which it has one of its own. */
const PRIOR_RECORDS = 20;
const OWN_VARIANCE_FROM = 10;

/** How much one job tells, by cell: variances of a job's difference from its expected yield. */
export type JobVariances = { pooled: number; byCell: Map<string, number> };

const gather = (keys: readonly string[], values: readonly number[]): Map<string, number[]> => {
  const groups = new Map<string, number[]>();
  keys.forEach((key, index) => {
    const group = groups.get(key) ?? [];
    group.push(values[index] ?? 0);
    groups.set(key, group);
  });
  return groups;
};

/**
 * Variance of a job's difference in each cell, mixed with the pooled variance within technicians: a leak repair's yield
 * is mostly luck and must weigh less. A technician's own spread is not used, since it is small exactly when he was lucky.
 * Needs one technician with two jobs.
 */
export const jobVariances = (
  differences: readonly number[],
  technicians: readonly string[],
  cells: readonly string[],
): Estimate<JobVariances> => {
  requireFinite(differences, 'Differences');
  requireSameLength(differences, technicians, 'Differences and technicians');
  requireSameLength(differences, cells, 'Differences and cells');
  const own = [...gather(technicians, differences).values()];
  const squares = sum(own.map((values) => sum(values.map((value) => (value - mean(values)) ** 2))));
  const freedom = differences.length - own.length;
  if (freedom < 1) return tooFew(own.length + 1, differences.length, 'jobs');
  const pooled = squares / freedom;
  const byCell = new Map<string, number>();
  for (const [cell, values] of gather(cells, differences)) {
    const variance = values.length >= OWN_VARIANCE_FROM ? sampleVariance(values) : pooled;
    byCell.set(cell, (values.length * variance + PRIOR_RECORDS * pooled) / (values.length + PRIOR_RECORDS));
  }
  return enough({ pooled, byCell });
};
