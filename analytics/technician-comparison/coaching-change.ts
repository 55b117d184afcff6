import { type Estimate, enough, tooFew } from '../statistics/estimate';
import { type JobSeries, meanOf } from './job-series';

/** What became of a technician's jobs after a day on which something was agreed with him. Shares of the full charge. */
export type CoachingChange = {
  jobsBefore: number;
  jobsAfter: number;
  before: number;
  after: number;
  /** After less before; the range holds at 95 % however often it is looked at. */
  difference: number;
  low: number;
  high: number;
  /** Chance by luck, good however often it is looked at. */
  p: number;
  found: 'better' | 'worse' | 'no clear change';
};

/** Jobs on either side without which nothing is said. */
const LEAST_JOBS = 10;
/** A change that is looked for, as a share of the full charge: the test is sharpest for changes of about this size. */
const LOOKED_FOR = 0.05;
const LEVEL = 0.05;

/** How much likelier a change of about the size looked for makes what is seen than none does. */
const evidenceFor = (difference: number, variance: number): number => {
  const wide = variance + LOOKED_FOR ** 2;
  return Math.sqrt(variance / wide) * Math.exp((difference ** 2 * LOOKED_FOR ** 2) / (2 * variance * wide));
};

/**
 * Jobs after a day against those before, tested anew with each job without losing validity: 1 over the largest evidence
 * so far is a p-value at every look (mixture sequential test: Robbins 1970, Annals of Mathematical Statistics 41,
 * 1397-1409; Johari, Koomen, Pekelis & Walsh 2022, Operations Research 70, 1806-1821). Needs ten jobs on either side.
 */
export const coachingChange = (series: JobSeries, day: number): Estimate<CoachingChange> => {
  const { days, differences, weights, first, variance } = series;
  const before = meanOf(series, (at) => (days[at] ?? 0) < day && !first[at]);
  const after = meanOf(series, (at) => (days[at] ?? 0) >= day && !first[at]);
  const least = Math.min(before.jobs, after.jobs);
  if (least < LEAST_JOBS || before.weight <= 0 || after.weight <= 0 || variance <= 0)
    return tooFew(LEAST_JOBS, least, 'jobs on either side');

  let [weight, sum, jobs, most] = [0, 0, 0, 1];
  let varianceNow = Number.POSITIVE_INFINITY;
  differences.forEach((value, at) => {
    if ((days[at] ?? 0) < day || first[at]) return;
    weight += weights[at] ?? 0;
    sum += (weights[at] ?? 0) * value;
    jobs += 1;
    if (jobs < LEAST_JOBS || weight <= 0) return;
    varianceNow = variance * (1 / before.weight + 1 / weight);
    most = Math.max(most, evidenceFor(sum / weight - before.mean, varianceNow));
  });
  const difference = after.mean - before.mean;
  const wide = varianceNow + LOOKED_FOR ** 2;
  const half = Math.sqrt(
    ((varianceNow * wide) / LOOKED_FOR ** 2) * (2 * Math.log(1 / LEVEL) + Math.log(wide / varianceNow)),
  );
  const p = 1 / most;
  const found = p > LEVEL ? 'no clear change' : difference > 0 ? 'better' : 'worse';
  return enough({
    jobsBefore: before.jobs,
    jobsAfter: after.jobs,
    before: before.mean,
    after: after.mean,
    difference,
    low: difference - half,
    high: difference + half,
    p,
    found,
  });
};
