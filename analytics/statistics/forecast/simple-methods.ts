import { mean, sampleStandardDeviation } from 'simple-statistics';
import { requireFinite, requireWhole } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';

/** Points ahead, and the standard error of each as a forecast. */
export type SimpleForecast = { mean: number[]; standardError: number[] };

const steps = <Value>(horizon: number, at: (step: number) => Value): Value[] =>
  Array.from({ length: horizon }, (_, index) => at(index + 1));

/** The mean of all values. Its range is a Student t with n − 1 degrees. Needs two values. */
export const meanMethod = (values: readonly number[], horizon: number): Estimate<SimpleForecast> => {
  requireFinite(values, 'The values of the series');
  requireWhole(horizon, 'The horizon', 1);
  const { length } = values;
  if (length < 2) return tooFew(2, length, 'values');
  const level = mean([...values]);
  const error = sampleStandardDeviation([...values]) * Math.sqrt(1 + 1 / length);
  return enough({ mean: steps(horizon, () => level), standardError: steps(horizon, () => error) });
};

/**
 * The value one period before, the yardstick of every forecast; with period 1 the last value. Its error grows with the
 * root of the periods. Needs one value more than a period. Hyndman & Athanasopoulos, Forecasting: Principles and
 * Practice, 3rd ed., section 5.2.
 */
export const seasonalNaive = (values: readonly number[], period: number, horizon: number): Estimate<SimpleForecast> => {
  requireFinite(values, 'The values of the series');
  requireWhole(period, 'The period', 1);
  requireWhole(horizon, 'The horizon', 1);
  const { length } = values;
  if (length <= period) return tooFew(period + 1, length, 'values');
  const changes = values.slice(period).map((value, at) => value - (values[at] ?? Number.NaN));
  const sigma = Math.sqrt(mean(changes.map((change) => change * change)));
  return enough({
    mean: steps(horizon, (step) => values[length - period + ((step - 1) % period)] ?? Number.NaN),
    standardError: steps(horizon, (step) => sigma * Math.sqrt(Math.floor((step - 1) / period) + 1)),
  });
};

/** The last value with the mean change so far: the line through the first and the last. Needs three values. */
export const driftMethod = (values: readonly number[], horizon: number): Estimate<SimpleForecast> => {
  requireFinite(values, 'The values of the series');
  requireWhole(horizon, 'The horizon', 1);
  const { length } = values;
  if (length < 3) return tooFew(3, length, 'values');
  const changes = values.slice(1).map((value, at) => value - (values[at] ?? Number.NaN));
  const change = mean(changes);
  const sigma = sampleStandardDeviation(changes);
  const last = values.at(-1) ?? Number.NaN;
  return enough({
    mean: steps(horizon, (step) => last + step * change),
    standardError: steps(horizon, (step) => sigma * Math.sqrt(step * (1 + step / (length - 1)))),
  });
};
