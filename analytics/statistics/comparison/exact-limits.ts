import { requirePositive, requireProbability, requireWhole } from '../checked';
import { binomialCdf, binomialQuantile } from '../distributions/binomial';
import { normalQuantile } from '../distributions/normal';
import { poissonCdf, poissonQuantile } from '../distributions/poisson';

/** Chances of lying below each limit of a funnel: the 99.8 % pair outside, the 95 % pair inside. */
export const FUNNEL_PROBABILITIES = [0.001, 0.025, 0.975, 0.999] as const;

/** The count below which chance stays with probability `p`, interpolated between whole counts; may be under 0. */
const interpolated = (p: number, count: number, cdf: (count: number) => number): number => {
  const reached = cdf(count);
  const before = cdf(count - 1);
  return count - (reached - p) / (reached - before);
};

/**
 * Limit of the share of hits among `trials` if the true share is `target`, from the exact binomial and interpolated so
 * that it does not jump; not clipped. Spiegelhalter (2005), Statistics in Medicine 24, 1185-1202, appendix A.1.
 */
export const binomialLimit = (p: number, trials: number, target: number): number => {
  requireWhole(trials, 'Trials', 1);
  const count = binomialQuantile(p, trials, target);
  return interpolated(p, count, (hits) => binomialCdf(hits, trials, target)) / trials;
};

/** Limit of observed over expected where a count is `expected`, from the exact Poisson; the same source. */
export const poissonLimit = (p: number, expected: number): number => {
  requirePositive(expected, 'The expected count');
  if (p === 1) return Number.POSITIVE_INFINITY;
  const count = poissonQuantile(p, expected);
  return interpolated(p, count, (seen) => poissonCdf(seen, expected)) / expected;
};

/** Limit of a mean or share about `target` whose standard error is known, as the normal has it. */
export const normalLimit = (p: number, target: number, standardError: number): number => {
  requireProbability(p, 'A probability');
  requirePositive(standardError, 'The standard error');
  return target + normalQuantile(p) * standardError;
};

/** Limits of a share as a reader sees them, within 0 and 1. */
export const shareFunnel = (trials: number, target: number): number[] =>
  FUNNEL_PROBABILITIES.map((p) => Math.min(1, Math.max(0, binomialLimit(p, trials, target))));
