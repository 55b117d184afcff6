import { median } from 'simple-statistics';
import type { TechnicianRow } from '@/analytics/technicians/contract';
import type { FunnelLimit, FunnelPoint } from '@/components/charts/funnel';
import { effectOf } from './wording';

/** Quantiles of the normal law at the funnel's limits: one in forty and one in a thousand by luck on either side. */
const LIMITS = [
  { name: '1 in 40 by luck', z: 1.959964 },
  { name: '1 in 1,000 by luck', z: 3.090232 },
] as const;

/** Technicians of whom something is said, as points: the amount is in jobs that tell as much as an ordinary one. */
export const crewPoints = (rows: readonly TechnicianRow[]): FunnelPoint[] =>
  rows.flatMap((row) => {
    const effect = effectOf(row);
    if (!effect || !row.funnel) return [];
    const { technicianId: key, technician: name, verdict } = row;
    return [{ key, name, amount: row.funnel.equivalentJobs, ...effect, isMarked: verdict === 'below' }];
  });

/**
 * The two limits as curves. Each technician's half width is z √(s² + v / jobs), with s the spread of sound people and v
 * the variance of one of his jobs; the curve takes the v of the technician in the middle.
 */
export const crewLimits = (rows: readonly TechnicianRow[], normalSpread: number): FunnelLimit[] => {
  const variances = rows.flatMap(({ funnel }) =>
    funnel ? [((funnel.inner / LIMITS[0].z) ** 2 - normalSpread ** 2) * funnel.equivalentJobs] : [],
  );
  if (!variances.length) return [];
  const variance = Math.max(0, median(variances));
  return LIMITS.map(({ name, z }) => ({
    name,
    halfWidth: (jobs: number) => z * Math.sqrt(normalSpread ** 2 + variance / jobs),
  }));
};
