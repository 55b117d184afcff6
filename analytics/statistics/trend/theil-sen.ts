import { median } from 'simple-statistics';
import { Z_95 } from '../distributions/z-95';
import { type Estimate, enough, tooFew } from '../estimate';
import { countOf, type GappySeries, kendallScore } from './kendall-score';

/** Change of the value a step, with its 95 % interval. */
export type TheilSen = { slopePerStep: number; lower: number; upper: number };

/** Slopes between all pairs of values that are there, in the unit of the values a step. */
export const pairSlopes = (series: GappySeries): number[] =>
  series.flatMap((later, index) =>
    series
      .slice(0, index)
      .flatMap((earlier, before) => (later === null || earlier === null ? [] : [(later - earlier) / (index - before)])),
  );

const roundHalfToEven = (value: number): number => {
  const down = Math.floor(value);
  if (value - down !== 0.5) return Math.round(value);
  return down % 2 === 0 ? down : down + 1;
};

/**
 * Median of the slopes between all pairs, and the interval from the ranks (N ∓ 1.96 √var S)/2 of the sorted slopes.
 * Missing values keep their place in time. Needs two values. Sen (1968), JASA 63, 1379-1389; ranks as in Gilbert,
 * Statistical Methods for Environmental Pollution Monitoring (1987), 16.5.
 */
export const theilSen = (series: GappySeries): Estimate<TheilSen> => {
  const { variance } = kendallScore(series);
  const slopes = pairSlopes(series).sort((a, b) => a - b);
  if (slopes.length === 0) return tooFew(2, countOf(series), 'values');
  const reach = Z_95 * Math.sqrt(variance);
  const low = Math.max(1, roundHalfToEven((slopes.length - reach) / 2));
  const high = Math.min(slopes.length, roundHalfToEven((slopes.length + reach) / 2) + 1);
  const slopePerStep = median(slopes);
  return enough({
    slopePerStep,
    lower: slopes[low - 1] ?? slopePerStep,
    upper: slopes[high - 1] ?? slopePerStep,
  });
};
