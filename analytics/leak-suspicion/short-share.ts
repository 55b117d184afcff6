import { quantileSorted } from 'simple-statistics';
import { requireFinite } from '@/analytics/statistics/checked';
import { normalDensity } from '@/analytics/statistics/distributions/normal';
import { type Estimate, enough, tooFew } from '@/analytics/statistics/estimate';
import { LEAST_LIKE_VISITS } from './limits';

/**
 * Yields of like jobs as two kinds of visit: the charge was there, and yields lie about `centre` with `spread`; or some of
 * it was gone, and every yield from nothing up to `centre` is as likely as any other.
 */
export type ShortShare = { share: number; centre: number; spread: number };

const STEPS = 60;
const ENOUGH = 1e-7;
/** Scales and plates alone spread yields by about so much. */
const LEAST_SPREAD = 0.01;
/** A starting point, not a finding. */
const FIRST_SHARE = 0.2;

/**
 * Probability that the unit came short, given its yield and what is usual among like jobs: Bayes' rule on the two kinds.
 * A yield at or above the centre is none.
 */
export const shortChance = (recoveryYield: number, { share, centre, spread }: ShortShare): number => {
  if (recoveryYield < 0 || recoveryYield >= centre || share === 0) return 0;
  const short = share / centre;
  const whole = ((1 - share) * normalDensity((recoveryYield - centre) / spread)) / spread;
  return short / (short + whole);
};

/** One step. In loops without lists between them: it runs sixty times over tens of thousands of yields. */
const step = (yields: Float64Array, usual: ShortShare): ShortShare => {
  const whole = yields.map((value) => 1 - shortChance(value, usual));
  let weight = 0;
  let weighted = 0;
  for (let at = 0; at < yields.length; at++) {
    weight += whole[at] ?? 0;
    weighted += (yields[at] ?? 0) * (whole[at] ?? 0);
  }
  const centre = weighted / weight;
  let squares = 0;
  for (let at = 0; at < yields.length; at++) squares += (whole[at] ?? 0) * ((yields[at] ?? 0) - centre) ** 2;
  return {
    share: 1 - weight / yields.length,
    centre,
    spread: Math.max(LEAST_SPREAD, Math.sqrt(squares / weight)),
  };
};

/**
 * Which share of like jobs came short, and what the others yield: a normal with a uniform for what is not of it, fitted by
 * maximum likelihood with the EM algorithm. Fraley & Raftery (2002), JASA 97, 611-631, section 5 (noise); Dempster, Laird
 * & Rubin (1977), JRSS B 39, 1-38. Starts from the upper half of the yields, which leaks do not reach. Needs 20 yields,
 * fractions of the full charge; throws RangeError on what is no finite number.
 */
export const fitShortShare = (yields: readonly number[]): Estimate<ShortShare> => {
  requireFinite(yields, 'Yields');
  if (yields.length < LEAST_LIKE_VISITS) return tooFew(LEAST_LIKE_VISITS, yields.length, 'like jobs');
  const order = [...yields].sort((a, b) => a - b);
  const [middle, upper] = [quantileSorted(order, 0.5), quantileSorted(order, 0.75)];
  // The upper quartile of a normal lies 0.6745 spreads above its centre.
  let usual: ShortShare = {
    share: FIRST_SHARE,
    centre: Math.max(middle, LEAST_SPREAD),
    spread: Math.max(LEAST_SPREAD, (upper - middle) / 0.6744897501960817),
  };
  const fitted = Float64Array.from(yields);
  for (let times = 0; times < STEPS; times++) {
    const next = step(fitted, usual);
    const moved = Math.abs(next.centre - usual.centre) + Math.abs(next.share - usual.share);
    usual = next;
    if (!(usual.centre > 0) || moved < ENOUGH) break;
  }
  return enough(usual);
};
