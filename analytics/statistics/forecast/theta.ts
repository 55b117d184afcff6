import { type Estimate, enough, tooFew } from '../estimate';
import { classicalDecomposition } from '../season/classical-decomposition';
import { simpleSmoothing } from './exponential-smoothing';
import { lineThrough } from './line';
import { repeatsWith } from './seasonal-test';
import type { SimpleForecast } from './simple-methods';

export type ThetaParts = {
  /** Factors of the season that were taken out, or null where it did not pass the test. */
  season: number[] | null;
  values: number[];
  /** Half of the straight line's slope, a step. */
  halfSlope: number;
};

/** The series without its season, where it has one, and half of its slope: what Theta works on. */
export const thetaParts = (values: readonly number[], period: number): ThetaParts => {
  const seasonal = repeatsWith(period, values) && values.every((value) => value > 0);
  const parts = seasonal ? classicalDecomposition(values, period, 'multiplicative') : null;
  const season = parts?.enough ? parts.value.figures : null;
  const adjusted = values.map((value, at) => value / (season?.[at % period] ?? 1));
  return { season, values: adjusted, halfSlope: lineThrough(adjusted).slope / 2 };
};

/** Level, its weight and the variance of one-step errors from simple smoothing of the adjusted series. */
export type ThetaLevel = { alpha: number; level: number; variance: number };

/**
 * The forecast from its parts: l + b/2 (h − 1 + (1 − (1 − α)ⁿ)/α), times the season; standard error σ√(1 + (h − 1)α²).
 * Hyndman & Billah (2003), International Journal of Forecasting 19, 287-290.
 */
export const thetaAhead = (
  { season, values, halfSlope }: ThetaParts,
  { alpha, level, variance }: ThetaLevel,
  horizon: number,
): SimpleForecast => {
  const { length } = values;
  const settled = (1 - (1 - alpha) ** length) / alpha;
  const factor = (step: number) => season?.[(length + step) % season.length] ?? 1;
  const ahead = Array.from({ length: horizon }, (_, step) => step);
  return {
    mean: ahead.map((step) => (level + halfSlope * (step + settled)) * factor(step)),
    standardError: ahead.map((step) => Math.sqrt(variance * (1 + step * alpha * alpha))),
  };
};

/**
 * Theta, the mean of a straight line and a smoothed level that follows the curvature twice. Needs seven values; a series
 * with a value at or below 0 is taken without season. Assimakopoulos & Nikolopoulos (2000), International Journal of
 * Forecasting 16, 521-530.
 */
export const theta = (values: readonly number[], period: number, horizon: number): Estimate<SimpleForecast> => {
  const parts = thetaParts(values, period);
  const fit = simpleSmoothing(parts.values);
  if (!fit.enough) return tooFew(fit.needs, fit.has, fit.of);
  const { weights, run, variance } = fit.value;
  return enough(thetaAhead(parts, { alpha: weights.alpha, level: run.end.level, variance }, horizon));
};
