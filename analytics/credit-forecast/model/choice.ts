import { historyUntil, type MassHistory, routineTotals } from './history';
import type { ChosenMethod } from './level-methods';
import { deseasonalise, routineForecasts } from './routine';

/** Months from which on methods are chosen by their past; before, the combination is taken. */
export const CHOICE_NEEDS = 48;
const FIRST_ORIGIN = 36;
const ORIGINS = 36;
const HORIZON = 12;

export type MethodRecord = {
  method: ChosenMethod;
  /** Root mean square error over that of the seasonal naive forecast for the same months. */
  relativeError: number;
};
export type Choice = { method: ChosenMethod; record: MethodRecord[]; origins: number };

/** Squared error of each method at one origin, mean over the horizons that have passed, and the naive one's. */
type OriginErrors = { naive: number; byMethod: Map<ChosenMethod, number> };

const meanSquare = (
  points: readonly (number | null | undefined)[],
  actual: readonly (number | null)[],
): number | null => {
  const squares = actual.flatMap((mass, step) => {
    const point = points[step];
    return mass === null || point === null || point === undefined ? [] : [(mass - point) ** 2];
  });
  return squares.length === 0 ? null : squares.reduce((sum, square) => sum + square, 0) / squares.length;
};

const errorsAt = (history: MassHistory, totals: readonly (number | null)[], known: number): OriginErrors | null => {
  const actual = totals.slice(known, known + HORIZON);
  const past = historyUntil(history, known);
  const naive = meanSquare(totals.slice(known - HORIZON, known), actual);
  if (naive === null) return null;
  const byMethod = new Map<ChosenMethod, number>();
  for (const [method, points] of routineForecasts(past, deseasonalise(past), HORIZON)) {
    const error = meanSquare(points, actual);
    if (error !== null) byMethod.set(method, error);
  }
  return { naive, byMethod };
};

const mean = (values: readonly number[]): number => values.reduce((sum, value) => sum + value, 0) / values.length;

/** Whether a method beats the combination by more than one standard error of their difference over the origins. */
const clearlyBetter = (gains: readonly number[]): boolean => {
  const gain = mean(gains);
  const variance = gains.reduce((sum, own) => sum + (own - gain) ** 2, 0) / Math.max(1, gains.length - 1);
  // Origins a month apart share most of their months: a year of them tells about as much as one.
  const independent = Math.max(1, gains.length / HORIZON);
  return gain > Math.sqrt(variance / independent);
};

/**
 * Which method to use for routine masses, by forecasts made again from every month of the last three years. The loss is
 * the squared error, since credit needs the mean. The combination is kept unless one method is better by more than one
 * standard error.
 */
export const chooseMethod = (history: MassHistory): Choice => {
  const fallback: Choice = { method: 'combination', record: [], origins: 0 };
  if (history.months < CHOICE_NEEDS) return fallback;
  const totals = routineTotals(history);
  const first = Math.max(FIRST_ORIGIN, history.months - ORIGINS);
  const origins: OriginErrors[] = [];
  for (let known = first; known < history.months; known++) {
    const errors = errorsAt(history, totals, known);
    if (errors) origins.push(errors);
  }
  if (origins.length === 0) return fallback;
  const naive = mean(origins.map((origin) => origin.naive));
  const methods = [...(origins[0]?.byMethod.keys() ?? [])];
  const errorsOf = (method: ChosenMethod) => origins.map((origin) => origin.byMethod.get(method) ?? origin.naive);
  const combination = errorsOf('combination');
  const record = methods.map((method) => ({
    method,
    relativeError: naive > 0 ? Math.sqrt(mean(errorsOf(method)) / naive) : 1,
  }));
  const better = record.filter(({ method }) => {
    const own = errorsOf(method);
    return method !== 'combination' && clearlyBetter(combination.map((error, at) => error - (own[at] ?? error)));
  });
  const best = better.reduce<MethodRecord | null>(
    (lead, own) => (lead === null || own.relativeError < lead.relativeError ? own : lead),
    null,
  );
  return { method: best?.method ?? 'combination', record, origins: origins.length };
};
