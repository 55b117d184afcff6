import { forecastMass } from '@/analytics/credit-forecast/model/forecast';
import { historyUntil, largeKg, type MassHistory } from '@/analytics/credit-forecast/model/history';
import { trackRecord } from '@/analytics/credit-forecast/model/track-record';
import { intervalScore, naiveScale } from '@/analytics/statistics/forecast/accuracy';
import { chooseEts } from '@/analytics/statistics/forecast/ets/choose';
import { continueEts } from '@/analytics/statistics/forecast/ets/smooth';
import { normalRange } from '@/analytics/statistics/forecast/range';
import { seasonalNaive } from '@/analytics/statistics/forecast/simple-methods';
import { theta } from '@/analytics/statistics/forecast/theta';

export const HELD_BACK = 12;
const NEAR = 6;
export const PATHS = 5000;
const YEAR = 12;
const LEVELS = [0.8, 0.95] as const;

export type SeriesResult = { level: number; step: number; inside: boolean };
export type CompanyResult = {
  /** Mean absolute error of the total, horizons 1 to 6, over that of the seasonal naive method in the history. */
  mase: { own: number; naive: number; ets: number; theta: number };
  /** Winkler's score of the 80 % range of the total over the same scale: own and the seasonal naive method's. */
  score80: { own: number; naive: number };
  /** Forecast of the whole year over what came. */
  yearRatio: number;
  kg: { forecast: number; actual: number };
  total: SeriesResult[];
  byRefrigerant: SeriesResult[];
  addsUp: boolean;
  cpuMs: { record: number; forecast: number };
};

const kgOf = (history: MassHistory, refrigerant: string): number[] =>
  largeKg(history, refrigerant).map((mass, at) => mass + (history.routineKg.get(refrigerant)?.[at] ?? 0));

const sum = (values: readonly number[]): number => values.reduce((all, value) => all + value, 0);

export const timed = <Value>(make: () => Value): { value: Value; cpuMs: number } => {
  const before = process.cpuUsage();
  const value = make();
  const { user, system } = process.cpuUsage(before);
  return { value, cpuMs: (user + system) / 1000 };
};

const value = <Value>(estimate: { enough: true; value: Value } | { enough: false }): Value => {
  if (!estimate.enough) throw new Error('A simulated company has too few months');
  return estimate.value;
};

/** Forecasts the last twelve months of a company from those before, and sets it beside the usual methods. */
export const measureCompany = (whole: MassHistory, seed: string): CompanyResult => {
  const known = whole.months - HELD_BACK;
  const history = historyUntil(whole, known);
  const names = [...new Set([...whole.routineKg.keys(), ...whole.largeJobs.map(({ refrigerant }) => refrigerant)])];
  const masses = new Map(names.map((name) => [name, kgOf(whole, name)]));
  const totals = Array.from({ length: whole.months }, (_, at) => sum(names.map((name) => masses.get(name)?.[at] ?? 0)));
  const [past, came] = [totals.slice(0, known), totals.slice(known)];

  const record = timed(() => trackRecord(history, seed));
  const forecast = timed(() => forecastMass(history, record.value, { horizon: HELD_BACK, paths: PATHS, seed }));
  const own = value(forecast.value);
  const naive = value(seasonalNaive(past, YEAR, HELD_BACK));
  const ets = value(chooseEts(past, YEAR, { restarts: 1, tolerance: 1e-6 }));
  const scale = value(naiveScale(past, YEAR)).meanAbsolute;
  const near = (points: readonly number[]) =>
    sum(points.slice(0, NEAR).map((point, step) => Math.abs(point - (came[step] ?? 0)))) / NEAR / scale;

  const inside = (kg: number, step: number, ranges: (typeof own.sum)['ranges']): SeriesResult[] =>
    ranges
      .filter(({ level }) => LEVELS.some((wanted) => wanted === level))
      .map(({ level, lowerGrams, upperGrams }) => ({
        level,
        step,
        inside: Math.round(kg * 1000) >= lowerGrams && Math.round(kg * 1000) <= upperGrams,
      }));
  const naiveRange = normalRange(naive.mean, naive.standardError, 0.8);
  const ends = own.months.map(({ total }) => total.ranges.find(({ level }) => level === 0.8));
  const means = own.months.map(({ total }) => total.meanGrams / 1000);
  return {
    mase: {
      own: near(means),
      naive: near(naive.mean),
      ets: near(continueEts(ets.model, ets.weights, ets.run.end, HELD_BACK)),
      theta: near(value(theta(past, YEAR, HELD_BACK)).mean),
    },
    score80: {
      own:
        intervalScore(
          came,
          ends.map((range) => (range?.lowerGrams ?? Number.NaN) / 1000),
          ends.map((range) => (range?.upperGrams ?? Number.NaN) / 1000),
          0.2,
        ) / scale,
      naive: intervalScore(came, naiveRange.lower, naiveRange.upper, 0.2) / scale,
    },
    yearRatio: own.sum.meanGrams / 1000 / sum(came),
    kg: { forecast: own.sum.meanGrams / 1000, actual: sum(came) },
    total: own.months.flatMap(({ total }, step) => inside(came[step] ?? 0, step, total.ranges)),
    byRefrigerant: own.months.flatMap(({ byRefrigerant }, step) =>
      [...byRefrigerant].flatMap(([name, { ranges }]) => inside(masses.get(name)?.[known + step] ?? 0, step, ranges)),
    ),
    addsUp: own.months.every(
      ({ total, byRefrigerant }) => sum([...byRefrigerant.values()].map((part) => part.meanGrams)) === total.meanGrams,
    ),
    cpuMs: { record: record.cpuMs, forecast: forecast.cpuMs },
  };
};
