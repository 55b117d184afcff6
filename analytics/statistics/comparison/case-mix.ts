import { requireNotNegative, requirePositive } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';
import { TalliesWithout } from './tallies';

/** A recovery as it is compared: whose, on what, for what, and recovered mass over full charge. */
export type Job = { technician: string; category: string; jobType: string; recoveryYield: number };

export type ExpectedYield = {
  /** What an average colleague would have given. */
  expected: number;
  /** Given less expected, as a share of the full charge. */
  difference: number;
  /** No colleague did a job of this category and type: compared with the job type alone. */
  weak: boolean;
};

/** Records of the job type that a cell of few records is mixed with. */
export const PRIOR_JOBS = 5;

/** The key of jobs that are alike: category and job type. */
export const cellOf = ({ category, jobType }: Pick<Job, 'category' | 'jobType'>): string => `${category}|${jobType}`;

/**
 * The yield that colleagues' jobs of the same category and type promise: (Y + K b)/(n + K), with n and Y the count and
 * sum of colleagues' yields there and b their mean for the job type (or for all jobs). The technician's own jobs are left
 * out, or a busy one would set the standard that he is held to. Needs two technicians. Indirect standardisation with a
 * prior: Clayton & Kaldor (1987), Biometrics 43, 671-681.
 */
export const expectedYields = (jobs: readonly Job[], priorJobs = PRIOR_JOBS): Estimate<ExpectedYield[]> => {
  requirePositive(priorJobs, 'The number of prior jobs');
  const byCell = new TalliesWithout();
  const byJobType = new TalliesWithout();
  const overall = new TalliesWithout();
  for (const job of jobs) {
    requireNotNegative(job.recoveryYield, 'A yield');
    byCell.add(cellOf(job), job.technician, job.recoveryYield);
    byJobType.add(job.jobType, job.technician, job.recoveryYield);
    overall.add('', job.technician, job.recoveryYield);
  }
  const technicians = new Set(jobs.map((job) => job.technician)).size;
  if (technicians < 2) return tooFew(2, technicians, 'technicians');

  return enough(
    jobs.map((job) => {
      const alike = byCell.without(cellOf(job), job.technician);
      const sameType = byJobType.without(job.jobType, job.technician);
      const base = sameType.count > 0 ? sameType : overall.without('', job.technician);
      const expected = (alike.sum + (priorJobs * base.sum) / base.count) / (alike.count + priorJobs);
      return { expected, difference: job.recoveryYield - expected, weak: alike.count === 0 };
    }),
  );
};
