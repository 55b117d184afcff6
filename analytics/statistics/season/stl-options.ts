import { requireWhole } from '../checked';
import type { Smoother } from './loess';

export type StlOptions = {
  /** Values a year (12 for months). */
  period: number;
  /** Years a season is smoothed over; 'periodic' keeps one season for all years. */
  seasonWindow: number | 'periodic';
  /** Let no single value bend season or trend. */
  robust: boolean;
  /** Positions between local fits; R's default is a tenth of each window, 1 fits everywhere. */
  jump?: number | 'tenth of window';
};

export type StlPlan = { season: Smoother; trend: Smoother; lowPass: Smoother; inner: number; outer: number };

const nextOdd = (value: number): number => {
  const whole = Math.ceil(value);
  return whole % 2 === 0 ? whole + 1 : whole;
};

/** One season for all years until there are five of them, and one that may change slowly from then on. */
export const seasonWindowFor = (length: number, period: number): StlOptions['seasonWindow'] =>
  length >= 5 * period ? 13 : 'periodic';

/**
 * Windows and passes as R's `stl` chooses them: trend window the smallest odd number from 1.5 m/(1 − 1.5/s), low-pass
 * the one from m; robust 1 inner and 15 outer passes, otherwise 2 and none. Cleveland et al. (1990), section 3.
 */
export const stlPlan = (length: number, { period, seasonWindow, robust, jump = 1 }: StlOptions): StlPlan => {
  requireWhole(period, 'The period', 2);
  const window = seasonWindow === 'periodic' ? 10 * length + 1 : seasonWindow;
  requireWhole(window, 'The window of the season', 3);
  const smoother = (width: number, degree: 0 | 1): Smoother => ({
    window: width,
    degree,
    jump: jump === 'tenth of window' ? Math.ceil(width / 10) : jump,
  });
  return {
    season: smoother(window, 0),
    trend: smoother(nextOdd((1.5 * period) / (1 - 1.5 / window)), 1),
    lowPass: smoother(nextOdd(period), 1),
    inner: robust ? 1 : 2,
    outer: robust ? 15 : 0,
  };
};
