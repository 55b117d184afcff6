import { CUSUM_DEFAULTS, cusumChart } from '../statistics/control-charts/cusum';
import { twoSidedP } from '../statistics/distributions/normal';
import { Z_95 } from '../statistics/distributions/z-95';
import { type Estimate, enough, tooFew } from '../statistics/estimate';
import { dayWritten } from './columns';
import { type JobSeries, meanOf } from './job-series';

/** One month of a technician, as shares of the full charge. */
export type MonthOfJobs = {
  /** YYYY-MM */
  month: string;
  jobs: number;
  effect: number;
  low: number;
  high: number;
  /** Whether it has jobs enough to say anything. */
  counts: boolean;
};
/** A steady change, in shares of the full charge a year, with its 95 % range and the chance by luck. */
export type Trend = { perYear: number; low: number; high: number; p: number };
/** First jobs of a newcomer against those since. */
export type Learning = { first: number; since: number; gain: number; low: number; high: number };

const LEAST_IN_MONTH = 5;
const LEAST_FOR_TREND = 30;
const YEAR_DAYS = 365.25;
/** A single job moves the sum by at most this many deviations: an empty unit is no change of work. */
const JOB_BOUND = 3;

const around = (mean: number, error: number) => ({ low: mean - Z_95 * error, high: mean + Z_95 * error });

/** Month by month; months without a job are left out. */
export const monthsOf = (series: JobSeries): MonthOfJobs[] => {
  const months = new Map<string, number[]>();
  series.days.forEach((day, at) => {
    const month = dayWritten(day).slice(0, 7);
    const own = months.get(month);
    if (own) own.push(at);
    else months.set(month, [at]);
  });
  return [...months].map(([month, places]) => {
    const inMonth = new Set(places);
    const { mean, weight, jobs } = meanOf(series, (at) => inMonth.has(at));
    const error = Math.sqrt(series.variance / Math.max(weight, 0.5));
    return { month, jobs, effect: mean, ...around(mean, error), counts: jobs >= LEAST_IN_MONTH };
  });
};

/** Weighted least squares over time, a newcomer's first jobs left out. Needs 30 jobs over a year. */
export const trendOf = ({ days, differences, weights, first, variance }: JobSeries): Estimate<Trend> => {
  const places = days.flatMap((_, at) => (first[at] ? [] : [at]));
  const years = (at: number) => (days[at] ?? 0) / YEAR_DAYS;
  const span = places.length > 0 ? years(places.at(-1) ?? 0) - years(places[0] ?? 0) : 0;
  if (places.length < LEAST_FOR_TREND || span < 1)
    return tooFew(LEAST_FOR_TREND, span < 1 ? 0 : places.length, 'jobs over a year');
  let [weight, time, value] = [0, 0, 0];
  for (const at of places) {
    weight += weights[at] ?? 0;
    time += (weights[at] ?? 0) * years(at);
    value += (weights[at] ?? 0) * (differences[at] ?? 0);
  }
  let [squares, products] = [0, 0];
  for (const at of places) {
    const lead = years(at) - time / weight;
    squares += (weights[at] ?? 0) * lead * lead;
    products += (weights[at] ?? 0) * lead * ((differences[at] ?? 0) - value / weight);
  }
  if (!(squares > 0) || variance <= 0) return tooFew(LEAST_FOR_TREND, 0, 'jobs over a year');
  const perYear = products / squares;
  const error = Math.sqrt(variance / squares);
  return enough({ perYear, ...around(perYear, error), p: twoSidedP(perYear / error) });
};

/** What a newcomer has learned; null for others. */
export const learningOf = (series: JobSeries): Learning | null => {
  const first = meanOf(series, (at) => series.first[at] === 1);
  const since = meanOf(series, (at) => series.first[at] === 0);
  if (first.weight < 5 || since.weight < 5) return null;
  const gain = since.mean - first.mean;
  const error = Math.sqrt(series.variance * (1 / first.weight + 1 / since.weight));
  return { first: first.mean, since: since.mean, gain, ...around(gain, error) };
};

/** The day on which the run of low (or high) jobs that is still going on began; null where there is none. */
export const runStart = (series: JobSeries): { side: 'above' | 'below'; fromDay: number } | null => {
  const deviation = Math.sqrt(series.variance);
  if (deviation <= 0 || series.days.length === 0) return null;
  const scores = series.differences.map((value, at) =>
    Math.max(-JOB_BOUND, Math.min(JOB_BOUND, ((series.weights[at] ?? 0) * value) / deviation)),
  );
  const signal = cusumChart(scores, { target: 0, ...CUSUM_DEFAULTS }).at(-1)?.signal;
  return signal ? { side: signal.side, fromDay: series.days[signal.runStart] ?? 0 } : null;
};
