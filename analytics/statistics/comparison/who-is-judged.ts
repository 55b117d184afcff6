import { requirePositive } from '../checked';
import type { TechnicianEffect } from './technician-effects';

/** Jobs from which on a technician may be judged, those of his first months left out, and the most that may be weak. */
export const LEAST_JOBS = 20;
export const FIRST_JOBS_LEFT_OUT = 40;
export const MOST_WEAK = 1 / 3;

export type Judged = { judged: true } | { judged: false; because: 'too few jobs' | 'too few jobs like a colleague’s' };

/** Whether anything is said about a technician at all. Pass jobs without his first forty. */
export const whetherJudged = ({ jobs, weakJobs }: Pick<TechnicianEffect, 'jobs' | 'weakJobs'>): Judged => {
  if (jobs < LEAST_JOBS) return { judged: false, because: 'too few jobs' };
  if (weakJobs > MOST_WEAK * jobs) return { judged: false, because: 'too few jobs like a colleague’s' };
  return { judged: true };
};

/** z of 80 % power plus z of a two-sided 5 % test: 0.8416 + 1.9600. */
const POWER_AND_TEST = 2.8;

/**
 * Jobs needed to see a true shortfall with 80 % certainty at 5 %, both as a share of the full charge: (2.8 s/δ)². Cohen,
 * Statistical Power Analysis for the Behavioral Sciences, 2nd ed. (1988), chapter 2.
 */
export const jobsNeeded = (shortfall: number, deviation: number): number => {
  requirePositive(shortfall, 'The shortfall');
  requirePositive(deviation, 'The standard deviation');
  return Math.ceil(((POWER_AND_TEST * deviation) / shortfall) ** 2);
};
