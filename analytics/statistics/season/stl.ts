import { mean } from 'simple-statistics';
import { requireFinite } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';
import { smooth } from './loess';
import { type StlOptions, type StlPlan, stlPlan } from './stl-options';
import { lowPass, robustnessWeights, smoothCycles } from './stl-steps';

/** value = season + trend + remainder, in the unit of the values. */
export type Decomposition = {
  season: number[];
  trend: number[];
  remainder: number[];
  /** How much each value counted in the robust fit, 0 to 1. */
  weights: number[];
};

const minus = (values: readonly number[], others: readonly number[]): number[] =>
  values.map((value, index) => value - (others[index] ?? 0));

const innerLoop = (
  values: readonly number[],
  period: number,
  plan: StlPlan,
  begin: readonly number[],
  weights?: readonly number[],
) => {
  let trend = [...begin];
  let season = trend;
  for (let pass = 0; pass < plan.inner; pass++) {
    const cycles = smoothCycles(minus(values, trend), period, plan.season, weights);
    season = minus(cycles.slice(period, period + values.length), lowPass(cycles, period, plan.lowPass));
    trend = smooth(minus(values, season), plan.trend, weights);
  }
  return { season, trend };
};

/** Each month of the season at its mean over the years. */
const levelled = (season: readonly number[], period: number): number[] => {
  const means = Array.from({ length: period }, (_, phase) =>
    mean(season.filter((_value, index) => index % period === phase)),
  );
  return season.map((_, index) => means[index % period] ?? 0);
};

/**
 * Seasonal-trend decomposition by loess. Needs two full periods (R's `stl` asks for one value more, for no reason in the
 * method). Cleveland, Cleveland, McRae & Terpenning (1990), Journal of Official Statistics 6, 3-73.
 */
export const stl = (values: readonly number[], options: StlOptions): Estimate<Decomposition> => {
  requireFinite(values, 'The values of the series');
  const { period, seasonWindow } = options;
  const plan = stlPlan(values.length, options);
  const least = 2 * period;
  if (values.length < least) return tooFew(least, values.length, 'values');

  let weights: number[] | undefined;
  let fit = innerLoop(values, period, plan, new Array<number>(values.length).fill(0));
  for (let pass = 0; pass < plan.outer; pass++) {
    weights = robustnessWeights(minus(minus(values, fit.trend), fit.season));
    fit = innerLoop(values, period, plan, fit.trend, weights);
  }
  const season = seasonWindow === 'periodic' ? levelled(fit.season, period) : fit.season;
  return enough({
    season,
    trend: fit.trend,
    remainder: minus(minus(values, season), fit.trend),
    weights: weights ?? values.map(() => 1),
  });
};
