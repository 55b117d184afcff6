import { twoSidedP } from '../distributions/normal';
import { type Estimate, enough, tooFew } from '../estimate';
import { countOf, type GappySeries, type KendallScore, kendallScore, standardised } from './kendall-score';

/** Below this the normal approximation of the score does not hold (Kendall 1975, table 5). */
const LEAST = 8;

export type MannKendall = KendallScore & {
  /** Standard score, and the probability of one at least as far from 0 if there is no trend. */
  z: number;
  p: number;
};

/**
 * Test for a steady rise or fall, whatever its shape. Missing values are left out. Needs eight values. Mann (1945),
 * Econometrica 13, 245-259; Kendall (1975).
 */
export const mannKendall = (series: GappySeries): Estimate<MannKendall> => {
  const score = kendallScore(series);
  const count = countOf(series);
  if (count < LEAST) return tooFew(LEAST, count, 'values');
  const z = standardised(score);
  return enough({ ...score, z, p: twoSidedP(z) });
};
