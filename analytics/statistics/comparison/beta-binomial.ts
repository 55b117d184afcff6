import { sum } from 'simple-statistics';
import { requireSameLength, requireWhole } from '../checked';
import { betaQuantile } from '../distributions/beta';
import { logBeta, logGamma } from '../distributions/log-gamma';
import { type Estimate, enough, tooFew } from '../estimate';
import type { Interval } from '../intervals/interval';
import { fitPrior } from './prior-fit';

export type PosteriorShare = Interval & { mean: number };
export type BetaBinomial =
  | { spread: 'none beyond chance'; mean: number }
  | { spread: 'found'; a: number; b: number; mean: number; logLikelihood: number; members: PosteriorShare[] };

const logChoose = (trials: number, hits: number): number =>
  logGamma(trials + 1) - logGamma(hits + 1) - logGamma(trials - hits + 1);

const checkHits = (hits: readonly number[], trials: readonly number[]): void => {
  requireSameLength(hits, trials, 'Hits and trials');
  hits.forEach((count, index) => {
    requireWhole(count, 'Hits');
    requireWhole(trials[index] ?? 0, 'Trials', 1);
    if (count > (trials[index] ?? 0)) throw new RangeError(`${trials[index]} trials cannot have ${count} hits`);
  });
};

/**
 * Shares of members: hits are binomial about shares that vary as Beta(a, b), fitted by maximum likelihood. Where hits
 * vary no more than binomial ones do (Tarone 1979, Biometrika 66, 585-590) the overall share holds for all. Needs two
 * members. Griffiths (1973), Biometrics 29, 637-648.
 */
export const betaBinomial = (hits: readonly number[], trials: readonly number[]): Estimate<BetaBinomial> => {
  checkHits(hits, trials);
  if (hits.length < 2) return tooFew(2, hits.length, 'members');
  const pairs = hits.map((count, index) => ({ hits: count, trials: trials[index] ?? 1 }));
  const mean = sum([...hits]) / sum([...trials]);
  const expected = mean * (1 - mean) * sum([...trials]);
  const excess = sum(pairs.map((pair) => (pair.hits - mean * pair.trials) ** 2)) - expected;
  if (excess <= 0) return enough({ spread: 'none beyond chance', mean });

  const shapes = (logit: number, precision: number): [a: number, b: number] => {
    const share = 1 / (1 + Math.exp(-logit));
    return [precision * share, precision * (1 - share)];
  };
  const constant = sum(pairs.map((pair) => logChoose(pair.trials, pair.hits)));
  const logLikelihood = (logit: number, precision: number): number => {
    const [a, b] = shapes(logit, precision);
    const own = pairs.map((pair) => logBeta(a + pair.hits, b + pair.trials - pair.hits));
    return constant + sum(own) - pairs.length * logBeta(a, b);
  };
  const fit = fitPrior(logLikelihood, Math.log(mean / (1 - mean)));
  const [a, b] = shapes(fit.centre, fit.precision);
  const members = pairs.map((pair) => {
    const [ownA, ownB] = [a + pair.hits, b + pair.trials - pair.hits];
    return {
      mean: ownA / (ownA + ownB),
      lower: betaQuantile(0.025, ownA, ownB),
      upper: betaQuantile(0.975, ownA, ownB),
    };
  });
  return enough({ spread: 'found', a, b, mean: a / (a + b), logLikelihood: fit.logLikelihood, members });
};
