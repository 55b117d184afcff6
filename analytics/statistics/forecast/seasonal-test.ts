import { mean } from 'simple-statistics';
import { normalQuantile } from '../distributions/normal';

const LEVEL = 0.9;

/** Autocorrelations of lags 1 to `most`, of deviations from the mean. */
const autocorrelations = (values: readonly number[], most: number): number[] => {
  const centre = mean([...values]);
  const deviations = values.map((value) => value - centre);
  const squares = deviations.reduce((sum, deviation) => sum + deviation * deviation, 0);
  return Array.from({ length: most }, (_, index) => {
    const lag = index + 1;
    const products = deviations.slice(lag).reduce((sum, later, at) => sum + later * (deviations[at] ?? 0), 0);
    return squares > 0 ? products / squares : 0;
  });
};

/**
 * Whether values repeat after a period more than chance would let them: the autocorrelation at the period beyond 90 % of
 * what Bartlett's (1946) error allows. Needs more than two periods, else no. Assimakopoulos & Nikolopoulos (2000),
 * International Journal of Forecasting 16, 521-530.
 */
export const repeatsWith = (period: number, values: readonly number[]): boolean => {
  if (period < 2 || values.length <= 2 * period) return false;
  const lags = autocorrelations(values, period);
  const before = lags.slice(0, -1).reduce((sum, lag) => sum + lag * lag, 0);
  const error = Math.sqrt((1 + 2 * before) / values.length);
  return Math.abs(lags.at(-1) ?? 0) / error > normalQuantile(0.5 + LEVEL / 2);
};
