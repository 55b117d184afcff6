import { requireFinite, requireNotNegative } from '@/analytics/statistics/checked';

/** What is known of a scale, in the unit of the readings. */
export type Scale = {
  /** The smallest step that it shows. */
  resolution: number;
  /** Standard error of one reading beside the resolution. */
  repeatability: number;
  /** Relative standard error of its slope: the same for everything that it weighs. */
  slope: number;
  /** Standard error by what stays in hoses and valves. */
  holdUp: number;
};

export type Weighing = {
  /** End less start reading. */
  net: number;
  /** Standard errors: what differs from weighing to weighing, what all share, and both. */
  random: number;
  systematic: number;
  standardError: number;
  /** ± this holds about 95 %: twice the standard error. */
  expanded: number;
  /** Standard error over net; Infinity where nothing was weighed. */
  relative: number;
};

/** A reading may be anywhere within its step, all places alike: JCGM 100:2008, 4.3.7. */
const stepError = (resolution: number): number => resolution / Math.sqrt(12);

/**
 * A net mass from two readings of one scale and what it is good for: u² = 2(d²/12) + 2u_rep² + u_hold² + (slope × net)².
 * JCGM 100:2008 (GUM), 5.1.2. Throws a RangeError on a reading that is no number or an error below 0.
 */
export const weighed = (start: number, end: number, scale: Scale): Weighing => {
  requireFinite([start, end], 'Readings');
  for (const error of Object.values(scale)) requireNotNegative(error, 'An error of a scale');
  const net = end - start;
  const random = Math.sqrt(2 * stepError(scale.resolution) ** 2 + 2 * scale.repeatability ** 2 + scale.holdUp ** 2);
  const systematic = Math.abs(net) * scale.slope;
  const standardError = Math.hypot(random, systematic);
  return {
    net,
    random,
    systematic,
    standardError,
    expanded: 2 * standardError,
    relative: standardError / Math.abs(net),
  };
};

/** Above this relative expanded error a recovery's yield says nothing about the work. */
export const MOST_RELATIVE_ERROR = 0.25;

/** Whether a weighed mass is good enough for its yield to be judged. */
export const goodForYield = ({ expanded, net }: Weighing): boolean => expanded <= MOST_RELATIVE_ERROR * Math.abs(net);
