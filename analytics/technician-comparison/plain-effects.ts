import type { Columns } from './columns';
import { COUNTS } from './judged-jobs';
import { SumsWithout } from './sums-without';

/** A technician against like jobs of colleagues, leaks and all, as shares of the full charge. */
export type PlainEffect = {
  jobs: number;
  weakJobs: number;
  /** Each job weighted by how much its kind tells, its standard error, and the unweighted mean. */
  effect: number;
  standardError: number;
  mean: number;
  /** Mean of what colleagues' like jobs gave. */
  expected: number;
};
export type PlainEffects = {
  technicians: PlainEffect[];
  /** By job, what colleagues' like jobs gave. */
  expected: Float64Array;
  /** Pooled variance of a job's difference within technicians. */
  pooledVariance: number;
};

const PRIOR_JOBS = 5;
const PRIOR_RECORDS = 20;
const OWN_VARIANCE_FROM = 10;
/** Variance that differences of equal jobs show by rounding alone. */
const ROUNDING = 1e-18;

/**
 * The effects of `statistics/comparison/technician-effects`, to the same figures, from columns: sections of a crew's
 * records are compared anew whenever a reader changes the scope, and a hundred thousand records must not take a second.
 */
export const plainEffects = (columns: Columns, reasons: Uint8Array): PlainEffects => {
  const { count, cell, cells, jobType, jobTypes, technician, yields } = columns;
  const people = columns.technicians.length;
  const [byCell, byType] = [new SumsWithout(cells, people), new SumsWithout(jobTypes, people)];
  for (let at = 0; at < count; at++) {
    if (reasons[at] !== COUNTS) continue;
    byCell.add(cell[at] ?? 0, technician[at] ?? 0, 1, yields[at] ?? 0);
    byType.add(jobType[at] ?? 0, technician[at] ?? 0, 1, yields[at] ?? 0);
  }
  const expected = new Float64Array(count);
  const jobs = new Float64Array(people);
  const weak = new Float64Array(people);
  const [sum, squares] = [new Float64Array(people), new Float64Array(people)];
  const expectedSum = new Float64Array(people);
  const [cellJobs, cellSum, cellSquares] = [new Float64Array(cells), new Float64Array(cells), new Float64Array(cells)];
  for (let at = 0; at < count; at++) {
    const c = cell[at] ?? 0;
    const t = technician[at] ?? 0;
    const base =
      byType.weightOfOthers(jobType[at] ?? 0, t) > 0 ? byType.expected(jobType[at] ?? 0, t, 0) : byType.overall(t);
    const own = byCell.expectedTowards(c, t, PRIOR_JOBS, base);
    expected[at] = own;
    if (reasons[at] !== COUNTS) continue;
    const difference = (yields[at] ?? 0) - own;
    jobs[t] = (jobs[t] ?? 0) + 1;
    weak[t] = (weak[t] ?? 0) + Number(byCell.weightOfOthers(c, t) === 0);
    sum[t] = (sum[t] ?? 0) + difference;
    squares[t] = (squares[t] ?? 0) + difference * difference;
    expectedSum[t] = (expectedSum[t] ?? 0) + own;
    cellJobs[c] = (cellJobs[c] ?? 0) + 1;
    cellSum[c] = (cellSum[c] ?? 0) + difference;
    cellSquares[c] = (cellSquares[c] ?? 0) + difference * difference;
  }
  let [within, freedom] = [0, 0];
  for (let t = 0; t < people; t++) {
    const n = jobs[t] ?? 0;
    if (n === 0) continue;
    within += (squares[t] ?? 0) - (sum[t] ?? 0) ** 2 / n;
    freedom += n - 1;
  }
  const pooledVariance = freedom > 0 ? within / freedom : 0;
  const variances = cellJobs.map((n, c) => {
    const own =
      n >= OWN_VARIANCE_FROM ? ((cellSquares[c] ?? 0) - (cellSum[c] ?? 0) ** 2 / n) / (n - 1) : pooledVariance;
    return (n * own + PRIOR_RECORDS * pooledVariance) / (n + PRIOR_RECORDS);
  });
  const [weights, weighted] = [new Float64Array(people), new Float64Array(people)];
  for (let at = 0; at < count; at++) {
    if (reasons[at] !== COUNTS) continue;
    const t = technician[at] ?? 0;
    const weight = 1 / Math.max(variances[cell[at] ?? 0] ?? 0, ROUNDING);
    weights[t] = (weights[t] ?? 0) + weight;
    weighted[t] = (weighted[t] ?? 0) + weight * ((yields[at] ?? 0) - (expected[at] ?? 0));
  }
  const technicians = columns.technicians.map((_, t) => {
    const n = jobs[t] ?? 0;
    const some = n > 0 && (weights[t] ?? 0) > 0;
    return {
      jobs: n,
      weakJobs: weak[t] ?? 0,
      effect: some ? (weighted[t] ?? 0) / (weights[t] ?? 1) : 0,
      standardError: some ? 1 / Math.sqrt(weights[t] ?? 1) : Number.POSITIVE_INFINITY,
      mean: n > 0 ? (sum[t] ?? 0) / n : 0,
      expected: n > 0 ? (expectedSum[t] ?? 0) / n : 0,
    };
  });
  return { technicians, expected, pooledVariance };
};
