import { requireFinite, requireWhole } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';
import { nelderMead } from '../nelder-mead';
import type { SimpleForecast } from './simple-methods';

/** Moving-average weights of the last step and of the last season. */
export type AirlineWeights = { last: number; season: number };

/** Weights of the last 0, 1, … shocks: (1 + θB)(1 + ΘBᵐ). */
const movingAverage = ({ last, season }: AirlineWeights, period: number): number[] => {
  const weights = Array.from({ length: period + 2 }, () => 0);
  weights[0] = 1;
  weights[1] = last;
  weights[period] = season;
  weights[period + 1] = last * season;
  return weights;
};

/** What is left of a series after the change to the step before and then to the season before. */
const differenced = (values: readonly number[], period: number): number[] => {
  const steps = values.slice(1).map((value, at) => value - (values[at] ?? Number.NaN));
  return steps.slice(period).map((change, at) => change - (steps[at] ?? Number.NaN));
};

type Innovations = { errors: number[]; variances: number[] };

/**
 * One-step errors of a moving average and their variances in units of the shocks', exact from the first value on: the
 * innovations algorithm. Brockwell & Davis (1991), Time Series: Theory and Methods, section 5.2.
 */
const innovations = (values: readonly number[], weights: readonly number[]): Innovations => {
  const order = weights.length - 1;
  const covariance = (lag: number): number =>
    weights.reduce((sum, weight, at) => sum + weight * (weights[at + lag] ?? 0), 0);
  const covariances = Array.from({ length: order + 1 }, (_, lag) => covariance(lag));
  const errors: number[] = [];
  const variances: number[] = [];
  // rows[n][j]: weight of the error j steps before value n.
  const rows: number[][] = [];
  for (let at = 0; at < values.length; at++) {
    const row: number[] = [];
    for (let back = Math.min(at, order); back >= 1; back--) {
      const past = rows[at - back] ?? [];
      let shared = covariances[back] ?? 0;
      for (let further = back + 1; further <= Math.min(at, order); further++) {
        shared -= (past[further - back] ?? 0) * (row[further] ?? 0) * (variances[at - further] ?? 0);
      }
      row[back] = shared / (variances[at - back] ?? Number.NaN);
    }
    let variance = covariances[0] ?? 0;
    let expected = 0;
    for (let back = 1; back <= Math.min(at, order); back++) {
      const weight = row[back] ?? 0;
      variance -= weight * weight * (variances[at - back] ?? 0);
      expected += weight * (errors[at - back] ?? 0);
    }
    rows.push(row);
    variances.push(variance);
    errors.push((values[at] ?? Number.NaN) - expected);
  }
  return { errors, variances };
};

export type AirlineFit = {
  weights: AirlineWeights;
  /** Of the shocks, by maximum likelihood. */
  variance: number;
  logLikelihood: number;
  ahead: (horizon: number) => SimpleForecast;
};

const bounded = (number = 0): number => Math.tanh(number);

/**
 * The airline model of Box & Jenkins (1976), ARIMA(0,1,1)(0,1,1)ₘ, by exact maximum likelihood: a yardstick for the
 * smoothing methods. Needs two seasons and two values.
 */
export const fitAirline = (values: readonly number[], period: number): Estimate<AirlineFit> => {
  requireFinite(values, 'The values of the series');
  requireWhole(period, 'The period', 2);
  if (values.length < 2 * period + 2) return tooFew(2 * period + 2, values.length, 'values');
  const changes = differenced(values, period);
  const { length } = changes;
  const at = (point: readonly number[]): AirlineWeights => ({ last: bounded(point[0]), season: bounded(point[1]) });
  const fitAt = (weights: AirlineWeights) => {
    const { errors, variances } = innovations(changes, movingAverage(weights, period));
    const variance = errors.reduce((sum, error, index) => sum + error ** 2 / (variances[index] ?? 1), 0) / length;
    const logs = variances.reduce((sum, own) => sum + Math.log(own), 0);
    return { errors, variance, logLikelihood: -0.5 * (length * (Math.log(2 * Math.PI * variance) + 1) + logs) };
  };
  const weights = at(nelderMead((point) => -fitAt(at(point)).logLikelihood, [-0.4, -0.4]).at);
  const { errors, variance, logLikelihood } = fitAt(weights);
  const shocks = movingAverage(weights, period);

  const ahead = (horizon: number): SimpleForecast => {
    const path = [...values];
    // Weights of past shocks in a value: the moving average summed over steps and seasons.
    const responses: number[] = [];
    const standardError: number[] = [];
    let squares = 0;
    for (let step = 0; step < horizon; step++) {
      const known = shocks.reduce(
        (sum, weight, back) => sum + (back > step ? weight * (errors[length + step - back] ?? 0) : 0),
        0,
      );
      const before = (back: number): number => path[path.length - back] ?? Number.NaN;
      path.push(before(1) + before(period) - before(period + 1) + known);
      const response = (back: number): number => responses[step - back] ?? 0;
      responses.push((shocks[step] ?? 0) + response(1) + response(period) - response(period + 1));
      squares += (responses[step] ?? 0) ** 2;
      standardError.push(Math.sqrt(variance * squares));
    }
    return { mean: path.slice(values.length), standardError };
  };
  return enough({ weights, variance, logLikelihood, ahead });
};
