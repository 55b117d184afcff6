import { mean, sampleVariance, sum } from 'simple-statistics';
import { requireFinite, requireSameLength } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';
import { groupBy } from '../group-by';

/** Records of pooled variance that a cell's own is mixed with, and records from which it has one of its own. */
const PRIOR_RECORDS = 20;
const OWN_VARIANCE_FROM = 10;

/** How much one job tells, by cell: variances of a job's difference from its expected yield. */
export type JobVariances = { pooled: number; byCell: Map<string, number> };

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
  const own = [...groupBy(differences, (_, index) => technicians[index] ?? '').values()];
  const squares = sum(own.map((values) => sum(values.map((value) => (value - mean(values)) ** 2))));
  const freedom = differences.length - own.length;
  if (freedom < 1) return tooFew(own.length + 1, differences.length, 'jobs');
  const pooled = squares / freedom;
  const byCell = new Map<string, number>();
  for (const [cell, values] of groupBy(differences, (_, index) => cells[index] ?? '')) {
    const variance = values.length >= OWN_VARIANCE_FROM ? sampleVariance(values) : pooled;
    byCell.set(cell, (values.length * variance + PRIOR_RECORDS * pooled) / (values.length + PRIOR_RECORDS));
  }
  return enough({ pooled, byCell });
};
