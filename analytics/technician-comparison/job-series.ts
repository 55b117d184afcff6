import type { CrewComparison } from './compare-crew';
import { BEFORE_CHANGE, COUNTS, FIRST_JOBS } from './judged-jobs';

/** A technician's jobs in the order of time, as far as they can be compared. */
export type JobSeries = {
  days: number[];
  /** Yield less what colleagues' like jobs gave, as a share of the full charge. */
  differences: number[];
  /** How much a job tells: the chance that its unit did not come short; 1 where vacuums are not told. */
  weights: number[];
  /** 1 for a newcomer's first jobs, by which nobody is judged. */
  first: number[];
  /** Usual variance of a difference. */
  variance: number;
};

/**
 * Jobs that are judged, and a newcomer's first ones; what is set aside for a scale in doubt is left out. A course over
 * the years also shows the jobs before a change, by which a technician is no longer judged.
 */
export const jobSeries = (crew: CrewComparison, { withJobsBeforeChange = false } = {}): JobSeries[] => {
  const { columns, chances, reasons, evidence, sums } = crew;
  const all = columns.technicians.map((_, person): JobSeries => {
    const byVacuum = evidence.technicians[person]?.byVacuum ?? false;
    const own = byVacuum ? sums[person]?.present.variance : undefined;
    const variance = own || (byVacuum ? crew.usualVariance : crew.plain.pooledVariance);
    return { days: [], differences: [], weights: [], first: [], variance };
  });
  const shown = new Set<number | undefined>(
    withJobsBeforeChange ? [COUNTS, FIRST_JOBS, BEFORE_CHANGE] : [COUNTS, FIRST_JOBS],
  );
  for (let at = 0; at < columns.count; at++) {
    const person = columns.technician[at] ?? 0;
    const own = all[person];
    const found = evidence.technicians[person];
    const reason = reasons[at];
    if (!own || !chances.comparable[at] || !shown.has(reason)) continue;
    const expected = found?.byVacuum ? crew.expected[at] : crew.plain.expected[at];
    own.days.push(columns.days[at] ?? 0);
    own.differences.push((columns.yields[at] ?? 0) - (expected ?? 0));
    own.weights.push(found?.byVacuum ? 1 - (chances.short[at] ?? 0) : 1);
    own.first.push(Number(reason === FIRST_JOBS));
  }
  return all;
};

/** Weighted mean difference of the jobs that are asked for, with the weight it rests on. */
export const meanOf = (
  { differences, weights }: JobSeries,
  wanted: (at: number) => boolean,
): { mean: number; weight: number; jobs: number } => {
  let [sum, weight, jobs] = [0, 0, 0];
  differences.forEach((value, at) => {
    if (!wanted(at)) return;
    sum += (weights[at] ?? 0) * value;
    weight += weights[at] ?? 0;
    jobs += 1;
  });
  return { mean: weight > 0 ? sum / weight : 0, weight, jobs };
};
