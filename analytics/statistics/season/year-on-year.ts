import { sum } from 'simple-statistics';
import { requireNotNegative } from '../checked';
import { Z_95 } from '../distributions/z-95';
import { type Estimate, enough, tooFew } from '../estimate';

export type SumOfJobs = { total: number; standardError: number };
export type YearOnYear = {
  now: SumOfJobs;
  before: SumOfJobs;
  /** now over before with its 95 % interval; too few where either sum is zero. */
  ratio: Estimate<{ ratio: number; logStandardError: number; lower: number; upper: number }>;
};

/**
 * Total of job masses and the standard error √Σm² that chance gives it, in the unit of the masses: the number of jobs
 * is a Poisson count and so the sum a compound one, whose variance is Σm² (Feller, An Introduction to Probability
 * Theory, vol. 1, XII.2).
 */
export const sumOfJobs = (masses: readonly number[]): SumOfJobs => {
  for (const mass of masses) requireNotNegative(mass, 'A mass');
  return { total: sum([...masses]), standardError: Math.sqrt(sum(masses.map((mass) => mass * mass))) };
};

/**
 * One period's sum against an earlier one's. The ratio's interval is R exp(± 1.96 se), se² = Σm₁²/S₁² + Σm₀²/S₀² by the
 * delta method on the logarithm.
 */
export const compareSums = (now: SumOfJobs, before: SumOfJobs): YearOnYear => {
  if (now.total === 0 || before.total === 0) {
    return { now, before, ratio: tooFew(2, Number(now.total > 0) + Number(before.total > 0), 'periods with mass') };
  }
  const ratio = now.total / before.total;
  const logStandardError = Math.hypot(now.standardError / now.total, before.standardError / before.total);
  const factor = Math.exp(Z_95 * logStandardError);
  return { now, before, ratio: enough({ ratio, logStandardError, lower: ratio / factor, upper: ratio * factor }) };
};

/** The same from the masses of the jobs. */
export const yearOnYear = (massesNow: readonly number[], massesBefore: readonly number[]): YearOnYear =>
  compareSums(sumOfJobs(massesNow), sumOfJobs(massesBefore));
