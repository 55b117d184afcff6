import { requireProbability, requireWhole } from '../checked';
import { betaQuantile } from '../distributions/beta';
import { normalQuantile } from '../distributions/normal';
import type { Interval } from './interval';

const checkHits = (hits: number, trials: number, level: number): number => {
  requireWhole(trials, 'Trials', 1);
  requireWhole(hits, 'Hits');
  requireProbability(level, 'The level of the interval');
  if (hits > trials) throw new RangeError(`${trials} trials cannot have ${hits} hits`);
  return (1 - level) / 2;
};

/** Exact interval of a share: covers at least `level`. Clopper & Pearson (1934), Biometrika 26, 404-413. */
export const clopperPearson = (hits: number, trials: number, level = 0.95): Interval => {
  const tail = checkHits(hits, trials, level);
  return {
    lower: hits === 0 ? 0 : betaQuantile(tail, hits, trials - hits + 1),
    upper: hits === trials ? 1 : betaQuantile(1 - tail, hits + 1, trials - hits),
  };
};

/** Score interval of a share, the default for what is shown: close to `level`. Wilson (1927), JASA 22, 209-212. */
export const wilson = (hits: number, trials: number, level = 0.95): Interval => {
  const z = normalQuantile(1 - checkHits(hits, trials, level));
  const share = hits / trials;
  const centre = share + (z * z) / (2 * trials);
  const half = z * Math.sqrt((share * (1 - share)) / trials + (z * z) / (4 * trials * trials));
  const scale = 1 + (z * z) / trials;
  return {
    lower: hits === 0 ? 0 : (centre - half) / scale,
    upper: hits === trials ? 1 : (centre + half) / scale,
  };
};

/** Interval of a share by Bayes with the prior Beta(½, ½). Brown, Cai & DasGupta (2001), Statistical Science 16, 101-133. */
export const jeffreys = (hits: number, trials: number, level = 0.95): Interval => {
  const tail = checkHits(hits, trials, level);
  return {
    lower: hits === 0 ? 0 : betaQuantile(tail, hits + 0.5, trials - hits + 0.5),
    upper: hits === trials ? 1 : betaQuantile(1 - tail, hits + 0.5, trials - hits + 0.5),
  };
};

/** Wilson's interval made symmetrical; may pass 0 or 1. Agresti & Coull (1998), American Statistician 52, 119-126. */
export const agrestiCoull = (hits: number, trials: number, level = 0.95): Interval => {
  const z = normalQuantile(1 - checkHits(hits, trials, level));
  const total = trials + z * z;
  const centre = (hits + (z * z) / 2) / total;
  const half = z * Math.sqrt((centre * (1 - centre)) / total);
  return { lower: centre - half, upper: centre + half };
};
