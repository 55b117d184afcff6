import { BASELINE, baselineLimits } from '@/analytics/statistics/control-charts/baseline';
import {
  DEFAULT_RUN_RULES,
  type RunRule,
  signalsOf,
  standardScores,
} from '@/analytics/statistics/control-charts/run-rules';
import { type Estimate, enough, tooFew } from '@/analytics/statistics/estimate';
import { DECOMPOSITION_NEEDS, decomposeMonths } from '@/analytics/statistics/season/monthly-decomposition';

/** A whole month of routine jobs: recovered mass in kg, and how many recoveries it comes from. */
export type WholeMonth = { month: string; recoveredMass: number; recoveries: number };

/** A month beside what trend and season let expect of it; masses in kg. */
export type PatternMonth = WholeMonth & {
  trend: number;
  /** Times the trend: 1.2 is a fifth above it. */
  seasonFactor: number;
  /** What neither explains, as a factor. */
  remainderFactor: number;
  /** Trend and season together, and where a usual month falls around it. */
  expected: number;
  low: number;
  high: number;
  /** Whether it has recoveries enough to be judged. */
  counts: boolean;
  /** The rules that it breaks; the eighth month of eight on one side breaks that one. */
  signals: RunRule[];
};

export type Pattern = {
  months: PatternMonth[];
  /** How much of what moves is season, 0 to 1, and whether that is enough to speak of one. */
  seasonStrength: number;
  steady: boolean;
  /** The months that the limits come from, and the limits as factors of what was expected. */
  baseline: { from: string; to: string; months: number; form: 'mean' | 'median'; lower: number; upper: number };
};

/**
 * From this full charge on, 100 lb in kg, a job is large plant: a few of them make most of a year's mass, and when a
 * chiller comes up is no season. Routine jobs are all others.
 */
export const LARGE_PLANT_KG = 45.359237;

/** The latest months are judged by limits that they did not set. */
const JUDGED_MONTHS = 12;

/** With fewer recoveries a month says more about one job than about the month. */
export const LEAST_RECOVERIES = 5;

/** What a fit leaves behind in the last binary digits is no deviation: months all alike would break their own limits. */
const withoutDust = (log: number): number => Math.round(log * 1e9) / 1e9;

const rulesBroken = (scores: readonly number[]): RunRule[][] => {
  const broken = scores.map((): RunRule[] => []);
  for (const rule of DEFAULT_RUN_RULES) for (const at of signalsOf(rule, scores)) broken[at]?.push(rule);
  return broken;
};

/**
 * Season and trend of whole months in a row, and the months that neither explains. Limits are those of single values
 * (XmR) on the logarithm of the remainder, from the 24 months before the last twelve: more jobs a month make calmer
 * months, so that those of long ago say little. A month of fewer than five recoveries is neither judged nor a part of
 * the limits. Says what is missing where 24 months that count are not there.
 */
export const monthlyPattern = (months: readonly WholeMonth[]): Estimate<Pattern> => {
  if (months.length < DECOMPOSITION_NEEDS) return tooFew(DECOMPOSITION_NEEDS, months.length, 'full months');
  const counting = months.flatMap(({ recoveries }, index) => (recoveries >= LEAST_RECOVERIES ? [index] : []));
  if (counting.length < DECOMPOSITION_NEEDS)
    return tooFew(DECOMPOSITION_NEEDS, counting.length, `months of ${LEAST_RECOVERIES} routine recoveries or more`);
  const parts = decomposeMonths(months.map(({ recoveredMass }) => recoveredMass));
  if (!parts.enough) return parts;
  const { trend, seasonFactor, remainderFactor, offset, seasonStrength, steady } = parts.value;

  const remainders = counting.map((index) => withoutDust(Math.log(remainderFactor[index] ?? 1)));
  const begin = Math.max(0, remainders.length - JUDGED_MONTHS - BASELINE.most);
  const baseline = baselineLimits(remainders.slice(begin));
  if (!baseline.enough) return baseline;
  const { limits, length } = baseline.value;
  const broken = rulesBroken(standardScores(remainders, limits));
  const signals = new Map(counting.map((index, at) => [index, broken[at] ?? []]));
  const monthOf = (at: number): string => months[counting[at] ?? 0]?.month ?? '';

  return enough({
    months: months.map((month, index) => {
      const level = (trend[index] ?? 0) + offset;
      const factor = seasonFactor[index] ?? 1;
      const times = (log: number) => Math.max(0, level * factor * Math.exp(log) - offset);
      return {
        ...month,
        trend: trend[index] ?? 0,
        seasonFactor: factor,
        remainderFactor: remainderFactor[index] ?? 1,
        expected: times(0),
        low: times(limits.lower),
        high: times(limits.upper),
        counts: month.recoveries >= LEAST_RECOVERIES,
        signals: signals.get(index) ?? [],
      };
    }),
    seasonStrength,
    steady,
    baseline: {
      from: monthOf(begin),
      to: monthOf(begin + length - 1),
      months: length,
      form: limits.form,
      lower: Math.exp(limits.lower),
      upper: Math.exp(limits.upper),
    },
  });
};
