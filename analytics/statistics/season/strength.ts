import { sampleVariance } from 'simple-statistics';
import type { Decomposition } from './stl';

/** Below this strength of season a reader is told that there is no steady seasonal pattern. */
export const STEADY_SEASON = 0.3;

// What the fit leaves of a constant series is rounding, and a ratio of roundings is no strength.
const ROUNDING = 1e-10;

const strength = (component: readonly number[], remainder: readonly number[], size: number): number => {
  const both = remainder.map((rest, index) => rest + (component[index] ?? 0));
  const total = sampleVariance(both);
  return total > (ROUNDING * size) ** 2 ? Math.max(0, 1 - sampleVariance([...remainder]) / total) : 0;
};

/**
 * How much of what moves is season and trend rather than remainder, 0 to 1: 1 − var(R)/var(S + R). A constant series
 * has none of either. Wang, Smith & Hyndman (2006), Data Mining and Knowledge Discovery 13, 335-364.
 */
export const strengths = ({ season, trend, remainder }: Omit<Decomposition, 'weights'>) => {
  const size = Math.max(...season.map(Math.abs), ...trend.map(Math.abs), ...remainder.map(Math.abs));
  return { season: strength(season, remainder, size), trend: strength(trend, remainder, size) };
};
