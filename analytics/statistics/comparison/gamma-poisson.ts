import { sum } from 'simple-statistics';
import { requirePositive, requireSameLength, requireWhole } from '../checked';
import { gammaCdf, gammaQuantile } from '../distributions/gamma';
import { logGamma } from '../distributions/log-gamma';
import { type Estimate, enough, tooFew } from '../estimate';
import type { Interval } from '../intervals/interval';
import { fitPrior } from './prior-fit';

/** A member's true observed-over-expected ratio after the fit, with 95 % interval and the chance that it is under 1. */
export type PosteriorRate = Interval & { mean: number; probabilityBelowOne: number };
export type GammaPoisson =
  | { spread: 'none beyond chance'; mean: number }
  | { spread: 'found'; shape: number; rate: number; logLikelihood: number; members: PosteriorRate[] };

/**
 * Rates of rare events: counts are Poisson about rates that vary as Gamma(shape, rate), fitted by maximum likelihood.
 * Where counts vary no more than Poisson ones do there is no such fit, and the overall ratio holds for all. Needs two
 * members and one event. Clayton & Kaldor (1987), Biometrics 43, 671-681.
 */
export const gammaPoisson = (observed: readonly number[], expected: readonly number[]): Estimate<GammaPoisson> => {
  requireSameLength(observed, expected, 'Observed and expected counts');
  for (const count of observed) requireWhole(count, 'An observed count');
  for (const count of expected) requirePositive(count, 'An expected count');
  const events = sum([...observed]);
  if (observed.length < 2) return tooFew(2, observed.length, 'members');
  if (events === 0) return tooFew(1, 0, 'events');

  const mean = events / sum([...expected]);
  const pairs = observed.map((count, index) => ({ count, expected: expected[index] ?? 1 }));
  const excess = sum(pairs.map((pair) => (pair.count - mean * pair.expected) ** 2 - pair.count));
  if (excess <= 0) return enough({ spread: 'none beyond chance', mean });

  const constant = sum(pairs.map((pair) => logGamma(pair.count + 1)));
  const logLikelihood = (logMean: number, shape: number): number => {
    const rate = shape / Math.exp(logMean);
    const own = pairs.map(
      (pair) =>
        logGamma(shape + pair.count) -
        shape * Math.log1p(pair.expected / rate) +
        pair.count * Math.log(pair.expected / (rate + pair.expected)),
    );
    return sum(own) - pairs.length * logGamma(shape) - constant;
  };
  const fit = fitPrior(logLikelihood, Math.log(mean));
  const shape = fit.precision;
  const rate = shape / Math.exp(fit.centre);
  const members = pairs.map((pair) => {
    const [ownShape, ownRate] = [shape + pair.count, rate + pair.expected];
    return {
      mean: ownShape / ownRate,
      lower: gammaQuantile(0.025, ownShape, ownRate),
      upper: gammaQuantile(0.975, ownShape, ownRate),
      probabilityBelowOne: gammaCdf(1, ownShape, ownRate),
    };
  });
  return enough({ spread: 'found', shape, rate, logLikelihood: fit.logLikelihood, members });
};
