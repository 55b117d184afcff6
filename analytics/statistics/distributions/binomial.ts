import betainc from '@stdlib/math-base-special-betainc';
import { requireFiniteNumber, requireProbability, requireWhole } from '../checked';
import { discreteQuantile } from './discrete-quantile';

/** Probability of at most `hits` hits in `trials` trials. Abramowitz & Stegun 26.5.24. */
export const binomialCdf = (hits: number, trials: number, share: number): number => {
  requireFiniteNumber(hits, 'Hits');
  requireWhole(trials, 'Trials');
  requireProbability(share, 'The share of hits');
  const whole = Math.floor(hits);
  if (whole < 0) return 0;
  return whole >= trials ? 1 : betainc(share, whole + 1, trials - whole, true, true);
};

/** The least number of hits whose cumulated probability reaches `p`. */
export const binomialQuantile = (p: number, trials: number, share: number): number => {
  requireProbability(p, 'A probability');
  return discreteQuantile(p, trials, (hits) => binomialCdf(hits, trials, share));
};
