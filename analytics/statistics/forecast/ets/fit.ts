import { requireFinite } from '../../checked';
import { type Estimate, enough, tooFew } from '../../estimate';
import { nelderMead, type SimplexOptions } from '../../nelder-mead';
import { type EtsModel, type EtsState, type EtsWeights, parameterCount } from './model';
import { type EtsRun, smoothEts } from './smooth';
import { startingState } from './start';
import { countOfWeights, logisticStarts, weightsAt } from './weights';

export type EtsFit = {
  model: EtsModel;
  weights: EtsWeights;
  start: EtsState;
  run: EtsRun;
  /** Of the one-step errors, free of the number of parameters. */
  variance: number;
  akaike: { aic: number; corrected: number; bayesian: number };
};

/** Level, slope and season from the search's point: each counts from its first guess, in its own size. */
const stateAt = (at: readonly number[], from: number, guess: EtsState, size: number, model: EtsModel): EtsState => {
  const level = guess.level + size * (at[from] ?? 0);
  const slope = model.trend === 'A' ? guess.slope + 0.1 * size * (at[from + 1] ?? 0) : 0;
  if (model.season === 'N') return { level, slope, season: [] };
  const first = from + (model.trend === 'A' ? 2 : 1);
  const seasonSize = model.season === 'A' ? size : 0.1;
  const total = model.season === 'A' ? 0 : model.period;
  const season = guess.season.map((index, place) =>
    place < model.period - 1 ? index + seasonSize * (at[first + place] ?? 0) : 0,
  );
  // The oldest index is what the others leave of the season's total, so that level and season are told apart.
  season[model.period - 1] = total - season.reduce((sum, index) => sum + index, 0);
  return { level, slope, season };
};

const criteria = (minus2LogLikelihood: number, parameters: number, values: number): EtsFit['akaike'] => {
  const aic = minus2LogLikelihood + 2 * parameters;
  const corrected = aic + (2 * parameters * (parameters + 1)) / (values - parameters - 1);
  return { aic, corrected, bayesian: minus2LogLikelihood + parameters * Math.log(values) };
};

/** The model run from known weights and initial states, with its variance and information criteria. */
export const runEts = (values: readonly number[], model: EtsModel, weights: EtsWeights, start: EtsState): EtsFit => {
  const run = smoothEts(values, model, weights, start);
  const parameters = parameterCount(model);
  const squares = run.errors.reduce((sum, error) => sum + error * error, 0);
  return {
    model,
    weights,
    start,
    run,
    variance: squares / (values.length - parameters + 1),
    akaike: criteria(run.minus2LogLikelihood, parameters, values.length),
  };
};

/**
 * Weights and initial states by maximum likelihood: 0.0001 < β < α < 0.9999, γ < 1 − α, 0.80 < φ < 0.98. Needs four
 * values more than parameters; throws a RangeError where the error multiplies and a value is not above 0.
 */
export const fitEts = (values: readonly number[], model: EtsModel, search: SimplexOptions = {}): Estimate<EtsFit> => {
  requireFinite(values, 'The values of the series');
  const needs = parameterCount(model) + 4;
  if (values.length < needs) return tooFew(needs, values.length, 'values');
  if ((model.error === 'M' || model.season === 'M') && values.some((value) => value <= 0)) {
    throw new RangeError('A part that multiplies needs values above 0');
  }
  const guess = startingState(values, model);
  const size = Math.max(...values.map((value) => Math.abs(value - guess.level)), Number.MIN_VALUE) / 4;
  const weightCount = countOfWeights(model);
  const stateCount = parameterCount(model) - 1 - weightCount;
  const minus2LogLikelihood = (at: readonly number[]): number =>
    smoothEts(values, model, weightsAt(at, model), stateAt(at, weightCount, guess, size, model)).minus2LogLikelihood;
  const states = Array.from({ length: stateCount }, () => 0);
  const found = logisticStarts(model)
    .map((weights) => nelderMead(minus2LogLikelihood, [...weights, ...states], search))
    .reduce((best, next) => (next.value < best.value ? next : best));
  return enough(runEts(values, model, weightsAt(found.at, model), stateAt(found.at, weightCount, guess, size, model)));
};
