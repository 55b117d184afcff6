import type { EtsModel, EtsState, EtsWeights } from './model';

export type EtsRun = {
  /** One step ahead, before the value was seen. */
  fitted: Float64Array;
  /** Differences to the fitted values, relative to them where the error multiplies. */
  errors: Float64Array;
  /** After the last value. */
  end: EtsState;
  /** −2 log-likelihood without its constant; Infinity where a fitted value of a multiplying error is not above 0. */
  minus2LogLikelihood: number;
};

/**
 * Runs the recursion over the values: q = l + φb; l' = q + α(p − q) with p the value without its season;
 * b' = φb + (β/α)(l' − l − φb); s' = s + γ(y − q − s), or y/q − s. −2 log L = n log Σe², and 2 Σ log|ŷ| more for a
 * multiplying error. Hyndman et al. (2002), table 1 and section 3.
 */
export const smoothEts = (values: readonly number[], model: EtsModel, weights: EtsWeights, start: EtsState): EtsRun => {
  const { alpha, beta, gamma, phi } = weights;
  const slopeWeight = alpha > 0 ? beta / alpha : 0;
  const { length } = values;
  const period = start.season.length;
  const fitted = new Float64Array(length);
  const errors = new Float64Array(length);
  // Oldest index first: the one of this position is replaced where it stands.
  const ring = Float64Array.from(start.season).reverse();
  let { level, slope } = start;
  let [squares, logs, valid] = [0, 0, true];
  for (let at = 0; at < length; at++) {
    const value = values[at] ?? Number.NaN;
    const damped = phi * slope;
    const trended = level + damped;
    const place = period > 0 ? at % period : 0;
    const index = ring[place] ?? 0;
    const expected = model.season === 'N' ? trended : model.season === 'A' ? trended + index : trended * index;
    const error = model.error === 'A' ? value - expected : (value - expected) / expected;
    fitted[at] = expected;
    errors[at] = error;
    squares += error * error;
    if (model.error === 'M') {
      logs += Math.log(Math.abs(expected));
      if (expected <= 0) valid = false;
    }
    const plain = model.season === 'N' ? value : model.season === 'A' ? value - index : value / index;
    const next = trended + alpha * (plain - trended);
    slope = damped + slopeWeight * (next - level - damped);
    if (model.season === 'A') ring[place] = index + gamma * (value - trended - index);
    if (model.season === 'M') ring[place] = index + gamma * (value / trended - index);
    level = next;
  }
  const newest = Array.from(ring, (_, back) => ring[(((length - 1 - back) % period) + period) % period] ?? 0);
  const minus2LogLikelihood = valid ? length * Math.log(squares) + 2 * logs : Number.POSITIVE_INFINITY;
  return { fitted, errors, end: { level, slope, season: newest }, minus2LogLikelihood };
};

/** Points 1 to `horizon` steps ahead by the recursion without further errors. */
export const continueEts = (model: EtsModel, { phi }: EtsWeights, end: EtsState, horizon: number): number[] => {
  const period = end.season.length;
  let [damping, slopes] = [1, 0];
  return Array.from({ length: horizon }, (_, step) => {
    damping *= phi;
    slopes += damping;
    const trended = end.level + slopes * end.slope;
    const index = end.season[period - 1 - (step % period)] ?? 0;
    if (model.season === 'N') return trended;
    return model.season === 'A' ? trended + index : trended * index;
  });
};
