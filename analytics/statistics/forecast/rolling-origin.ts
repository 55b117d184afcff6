import { requireFinite, requireWhole } from '../checked';

export type Origin = {
  /** Values known at this origin. */
  known: number;
  /** Actual − forecast, 1 to the horizon steps ahead. */
  errors: number[];
};

/**
 * Forecasts made again as they would have been made at each origin from `first` known values on, from nothing but what
 * was known then. `forecast` gets the history and gives as many points as the horizon. Tashman (2000), International
 * Journal of Forecasting 16, 437-450.
 */
export const rollingOrigin = (
  values: readonly number[],
  forecast: (history: readonly number[], horizon: number) => readonly number[],
  { first, horizon }: { first: number; horizon: number },
): Origin[] => {
  requireFinite(values, 'The values of the series');
  requireWhole(first, 'The first origin', 1);
  requireWhole(horizon, 'The horizon', 1);
  const origins = Math.max(0, values.length - horizon - first + 1);
  return Array.from({ length: origins }, (_, index) => {
    const known = first + index;
    const points = forecast(values.slice(0, known), horizon);
    const actual = values.slice(known, known + horizon);
    return { known, errors: actual.map((value, step) => value - (points[step] ?? Number.NaN)) };
  });
};
