import { type Estimate, enough, tooFew } from '../estimate';
import { cellOf, type ExpectedYield, expectedYields, type Job, PRIOR_JOBS } from './case-mix';
import { type JobVariances, jobVariances } from './job-variances';

/** How a technician's jobs turned out against what colleagues would have given, as a share of the full charge. */
export type TechnicianEffect = {
  technician: string;
  jobs: number;
  /** Jobs that no colleague's were quite like. */
  weakJobs: number;
  /** Mean difference, each job weighted by how much its kind tells, and its standard error. */
  effect: number;
  standardError: number;
  /** The plain mean, shown beside it. */
  plainMean: number;
  /** Jobs of average weight that would tell as much: the funnel's horizontal position. */
  equivalentJobs: number;
};
export type TechnicianEffects = { perJob: ExpectedYield[]; variances: JobVariances; technicians: TechnicianEffect[] };

type Sums = { jobs: number; weakJobs: number; weight: number; weighted: number; plain: number };

/** Plain mean and weighted effect further apart than this many standard errors are worth a word to the reader. */
export const DISAGREEMENT = 2;

/** Variance that differences of equal jobs show by rounding alone. */
const ROUNDING = 1e-18;

/**
 * Effects of technicians in the order of their names: Σ(d/s²)/Σ(1/s²) with standard error 1/√Σ(1/s²), d the difference
 * from the expected yield and s² its variance in the cell. Needs two technicians and one with two jobs.
 */
export const technicianEffects = (jobs: readonly Job[], priorJobs = PRIOR_JOBS): Estimate<TechnicianEffects> => {
  const perJob = expectedYields(jobs, priorJobs);
  if (!perJob.enough) return perJob;
  const variances = jobVariances(
    perJob.value.map((job) => job.difference),
    jobs.map((job) => job.technician),
    jobs.map(cellOf),
  );
  if (!variances.enough) return variances;
  const { pooled, byCell } = variances.value;
  if (pooled < ROUNDING) return tooFew(1, 0, 'differences between jobs');

  const sums = new Map<string, Sums>();
  jobs.forEach((job, index) => {
    const { difference = 0, weak = false } = perJob.value[index] ?? {};
    const weight = 1 / (byCell.get(cellOf(job)) ?? pooled);
    const own = sums.get(job.technician) ?? { jobs: 0, weakJobs: 0, weight: 0, weighted: 0, plain: 0 };
    own.jobs += 1;
    own.weakJobs += Number(weak);
    own.weight += weight;
    own.weighted += weight * difference;
    own.plain += difference;
    sums.set(job.technician, own);
  });
  const technicians = [...sums]
    .sort(([a], [b]) => (a < b ? -1 : 1))
    .map(([technician, own]) => ({
      technician,
      jobs: own.jobs,
      weakJobs: own.weakJobs,
      effect: own.weighted / own.weight,
      standardError: 1 / Math.sqrt(own.weight),
      plainMean: own.plain / own.jobs,
      equivalentJobs: pooled * own.weight,
    }));
  return enough({ perJob: perJob.value, variances: variances.value, technicians });
};
