import { median } from 'simple-statistics';
import { requireWhole } from '../checked';
import { twoSidedP } from '../distributions/normal';
import { type Estimate, enough, tooFew } from '../estimate';
import { type GappySeries, kendallScore, standardised } from './kendall-score';
import type { MannKendall } from './mann-kendall';
import { pairSlopes } from './theil-sen';

/** Years from which on the months of a year can be compared with themselves. */
const LEAST_YEARS = 3;

export type SeasonalKendall = MannKendall & { slopePerYear: number };

/**
 * Mann-Kendall within each month of the year and added up, so that the season cannot pass for a trend; the slope is
 * the median of the slopes between equal months. Needs three years. Hirsch, Slack & Smith (1982), Water Resources
 * Research 18, 107-121.
 */
export const seasonalKendall = (series: GappySeries, period: number): Estimate<SeasonalKendall> => {
  requireWhole(period, 'The period', 2);
  const years = Math.floor(series.length / period);
  const months = Array.from({ length: period }, (_, phase) => series.filter((_value, at) => at % period === phase));
  const slopes = months.flatMap((month) => pairSlopes(month));
  if (years < LEAST_YEARS || slopes.length === 0) return tooFew(LEAST_YEARS, years, 'years');
  const scores = months.map(kendallScore);
  const total = {
    score: scores.reduce((sum, { score }) => sum + score, 0),
    variance: scores.reduce((sum, { variance }) => sum + variance, 0),
  };
  const z = standardised(total);
  return enough({ ...total, z, p: twoSidedP(z), slopePerYear: median(slopes) });
};
