import { requireWhole } from '@/analytics/statistics/checked';
import { type Estimate, enough, tooFew } from '@/analytics/statistics/estimate';
import { RANGE_LEVELS, type RangeLevel, refrigerantMassOf, totalMassOf } from './calibration';
import { type Caution, cautionsOf } from './cautions';
import { type Expected, expectedMass, meansOf } from './expected';
import { type MassHistory, requireHistory, routineTotals } from './history';
import type { ChosenMethod } from './level-methods';
import { routineNoise } from './noise';
import { drawnFor, drawnTotal, drawPaths, type Paths } from './paths';
import { type MassRange, rangeOf } from './ranges';
import { completeRunningMonth, type RunningMonth } from './running-month';
import type { TrackRecord } from './track-record';

/** Whole months before which nothing is forecast. */
export const FORECAST_NEEDS = 12;
/** A year ahead is never more than this many times the best year so far. */
const MOST_GROWTH = 3;
const GRAMS = 1000;
const YEAR = 12;

/** Whole grams; `ranges` holds the levels that the past is long enough for. */
export type SeriesForecast = {
  meanGrams: number;
  ranges: { level: RangeLevel; lowerGrams: number; upperGrams: number }[];
};
export type MonthForecast = { total: SeriesForecast; byRefrigerant: Map<string, SeriesForecast> };

export type MassForecast = {
  method: ChosenMethod;
  months: MonthForecast[];
  /** All months ahead together. */
  sum: SeriesForecast;
  cautions: Caution[];
  paths: Paths;
};

export type ForecastOptions = { horizon: number; paths: number; seed: string; running?: RunningMonth };

const toGrams = (kg: number): number => Math.round(kg * GRAMS);

/** A factor that keeps a year ahead from running away from all that was seen; 1 where it does not. */
const heldBack = (history: MassHistory, expected: Expected): number => {
  const perMonth = routineTotals(history).map((mass) => mass ?? 0);
  for (const { at, recoveredKg } of history.largeJobs) perMonth[at] = (perMonth[at] ?? 0) + recoveredKg;
  const years = perMonth.slice(YEAR - 1).map((_, at) => perMonth.slice(at, at + YEAR).reduce((sum, kg) => sum + kg, 0));
  const best = Math.max(0, ...years);
  const ahead =
    meansOf(expected)
      .flat()
      .reduce((sum, kg) => sum + kg, 0) /
    (expected.horizon / YEAR);
  return ahead > MOST_GROWTH * best && ahead > 0 ? (MOST_GROWTH * best) / ahead : 1;
};

const inGrams = ({ lowerKg, upperKg }: MassRange) => ({ lowerGrams: toGrams(lowerKg), upperGrams: toGrams(upperKg) });

const seriesOf = (
  meanGrams: number,
  drawn: Float64Array,
  massOf: (level: RangeLevel) => number | null,
): SeriesForecast => ({
  meanGrams,
  ranges: RANGE_LEVELS.flatMap((level) => {
    const mass = massOf(level);
    return mass === null ? [] : [{ level, ...inGrams(rangeOf(drawn, mass)) }];
  }),
});

const sumOfPaths = ({ kg, count }: Paths): Float64Array => {
  const sums = new Float64Array(count);
  kg.forEach((mass, at) => {
    sums[at % count] = (sums[at % count] ?? 0) + mass;
  });
  return sums.sort();
};

/**
 * The mass of the coming months by refrigerant: means in whole grams, of which a month's total is the exact sum, and
 * ranges from drawn paths, as wide as past forecasts say they must be. `record` is the track record of the same history.
 * Needs twelve whole months; throws a RangeError on a history or horizon that is none.
 */
export const forecastMass = (
  history: MassHistory,
  record: TrackRecord,
  { horizon, paths: count, seed, running }: ForecastOptions,
): Estimate<MassForecast> => {
  requireHistory(history);
  requireWhole(horizon, 'The horizon', 1);
  if (history.months < FORECAST_NEEDS) return tooFew(FORECAST_NEEDS, history.months, 'whole months');
  const { method } = record.choice;
  const plain = expectedMass(history, method, horizon);
  const held = heldBack(history, plain);
  const free: Expected = {
    ...plain,
    routineKg: plain.routineKg.map((mass) => held * mass),
    jobs: plain.jobs.map((jobs) => held * jobs),
  };
  const expected = running ? completeRunningMonth(free, running, routineNoise(history, free)) : free;
  const means = meansOf(expected);
  const paths = drawPaths(history, expected, count, seed);
  // Once for all: each sorts thousands of past forecasts.
  const partMass = new Map(RANGE_LEVELS.map((level) => [level, refrigerantMassOf(record, level)]));
  const partMassOf = (level: RangeLevel) => partMass.get(level) ?? null;
  const months = Array.from({ length: horizon }, (_, step): MonthForecast => {
    const byRefrigerant = new Map(
      paths.refrigerants.map((refrigerant, row) => {
        const grams = toGrams(means[row]?.[step] ?? 0);
        return [refrigerant, seriesOf(grams, drawnFor(paths, row, step), partMassOf)];
      }),
    );
    const grams = [...byRefrigerant.values()].reduce((sum, { meanGrams }) => sum + meanGrams, 0);
    return {
      total: seriesOf(grams, drawnTotal(paths, step), (level) => totalMassOf(record, step, level)),
      byRefrigerant,
    };
  });
  const allGrams = months.reduce((sum, { total }) => sum + total.meanGrams, 0);
  const last = horizon - 1;
  return enough({
    method,
    months,
    sum: seriesOf(allGrams, sumOfPaths(paths), (level) => totalMassOf(record, last, level)),
    cautions: cautionsOf(history, record, held < 1),
    paths,
  });
};
