import { mean } from 'simple-statistics';
import { requireFinite, requireProbability, requireSameLength } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';

const pairs = (actual: readonly number[], forecast: readonly number[]): [actual: number, forecast: number][] => {
  requireFinite(actual, 'Actual values');
  requireFinite(forecast, 'Forecasts');
  requireSameLength(actual, forecast, 'Actual values and forecasts');
  if (actual.length === 0) throw new RangeError('An error needs at least one value');
  return actual.map((value, at) => [value, forecast[at] ?? Number.NaN]);
};
const average = (values: readonly number[]): number => mean([...values]);

export type PointErrors = {
  /** Mean of actual − forecast: above 0 where forecasts were too low. */
  bias: number;
  meanAbsolute: number;
  rootMeanSquare: number;
  /** In per cent; null where an actual value is 0. */
  meanAbsolutePercent: number | null;
  /** In per cent of the mean of actual and forecast, as in the M4 competition; null where both are 0. */
  symmetricPercent: number | null;
};

/** The usual errors of point forecasts, in the unit of the values. Hyndman & Koehler (2006), IJF 22, 679-688. */
export const pointErrors = (actual: readonly number[], forecast: readonly number[]): PointErrors => {
  const both = pairs(actual, forecast);
  const errors = both.map(([value, expected]) => value - expected);
  const percent = (of: (pair: [number, number]) => number): number | null => {
    const whole = both.map(of);
    if (whole.some((size) => size === 0)) return null;
    return 100 * average(errors.map((error, at) => Math.abs(error) / (whole[at] ?? Number.NaN)));
  };
  return {
    bias: average(errors),
    meanAbsolute: average(errors.map(Math.abs)),
    rootMeanSquare: Math.sqrt(average(errors.map((error) => error * error))),
    meanAbsolutePercent: percent(([value]) => Math.abs(value)),
    symmetricPercent: percent(([value, expected]) => (Math.abs(value) + Math.abs(expected)) / 2),
  };
};

/**
 * What the seasonal naive forecast misses by within the history: mean absolute and root mean square. Needs more than a
 * period of values whose seasons differ.
 */
export const naiveScale = (
  history: readonly number[],
  period: number,
): Estimate<{ meanAbsolute: number; rootMeanSquare: number }> => {
  requireFinite(history, 'The history');
  const changes = history.slice(period).map((value, at) => value - (history[at] ?? Number.NaN));
  if (changes.every((change) => change === 0)) return tooFew(1, 0, 'values that differ from a period before');
  return enough({
    meanAbsolute: average(changes.map(Math.abs)),
    rootMeanSquare: Math.sqrt(average(changes.map((change) => change * change))),
  });
};

/** Share of the values that lie within their ranges, ends included. */
export const coverage = (actual: readonly number[], lower: readonly number[], upper: readonly number[]): number => {
  requireSameLength(actual, upper, 'Actual values and upper ends');
  return average(pairs(actual, lower).map(([value, low], at) => (value >= low && value <= (upper[at] ?? low) ? 1 : 0)));
};

/**
 * Width of the ranges plus 2/α times what the values lie outside, α the share that may: less is better. Winkler (1972),
 * Journal of the American Statistical Association 67, 187-191.
 */
export const intervalScore = (
  actual: readonly number[],
  lower: readonly number[],
  upper: readonly number[],
  alpha: number,
): number => {
  requireProbability(alpha, 'The share outside');
  requireSameLength(actual, upper, 'Actual values and upper ends');
  return average(
    pairs(actual, lower).map(([value, low], at) => {
      const high = upper[at] ?? Number.NaN;
      return high - low + (2 / alpha) * (Math.max(0, low - value) + Math.max(0, value - high));
    }),
  );
};

/** Loss of forecasts of the quantile `p`. Koenker & Bassett (1978), Econometrica 46, 33-50. */
export const pinballLoss = (actual: readonly number[], quantiles: readonly number[], p: number): number => {
  requireProbability(p, 'A probability');
  return average(
    pairs(actual, quantiles).map(([value, at]) => (value >= at ? p * (value - at) : (1 - p) * (at - value))),
  );
};
