import fc from 'fast-check';
import { expect, test } from 'vitest';
import { autocorrelation } from '@/analytics/statistics/trend/autocorrelation';
import { mannKendall } from '@/analytics/statistics/trend/mann-kendall';
import { seasonalKendall } from '@/analytics/statistics/trend/seasonal-kendall';
import { theilSen } from '@/analytics/statistics/trend/theil-sen';
import { given } from './given';

const values = fc.array(fc.oneof(fc.integer({ min: -20, max: 20 }), fc.constant(null)), {
  minLength: 12,
  maxLength: 40,
});
const seen = values.filter((series) => series.filter((value) => value !== null).length >= 8);

test('a trend turns over with the values and with time', () => {
  fc.assert(
    fc.property(seen, (series) => {
      const { score, variance } = given(mannKendall(series));
      const negative = given(mannKendall(series.map((value) => (value === null ? null : -value))));
      const backwards = given(mannKendall([...series].reverse()));
      expect(negative.score + score).toBe(0);
      expect(backwards.score + score).toBe(0);
      expect(backwards.variance).toBe(variance);
    }),
  );
});

test('slopes follow the unit, lie within their interval and do not see the level', () => {
  fc.assert(
    fc.property(seen, fc.integer({ min: 1, max: 9 }), fc.integer({ min: -9, max: 9 }), (series, times, plus) => {
      const plain = given(theilSen(series));
      const changed = given(theilSen(series.map((value) => (value === null ? null : times * value + plus))));
      expect(changed.slopePerStep).toBeCloseTo(times * plain.slopePerStep, 9);
      expect(plain.lower).toBeLessThanOrEqual(plain.slopePerStep);
      expect(plain.upper).toBeGreaterThanOrEqual(plain.slopePerStep);
    }),
  );
});

test('a steady rise under a season is found, its slope in units a year', () => {
  const series = Array.from({ length: 48 }, (_, month) => 3 * Math.floor(month / 12) + 40 * (month % 12 === 6 ? 1 : 0));
  const trend = given(seasonalKendall(series, 12));
  expect(trend.slopePerYear).toBe(3);
  // Every month rises in all 6 pairs of its 4 years: 72, each with variance 4 × 3 × 13/18.
  expect(trend.score).toBe(72);
  expect(trend.variance).toBeCloseTo((12 * 4 * 3 * 13) / 18, 9);
});

test('too few values, years or moves say so', () => {
  expect(mannKendall([1, 2, null, 3, 4, 5, 6, 7])).toEqual({ enough: false, needs: 8, has: 7, of: 'values' });
  expect(seasonalKendall(new Array<number>(35).fill(1), 12)).toEqual({ enough: false, needs: 3, has: 2, of: 'years' });
  expect(theilSen([4, null])).toEqual({ enough: false, needs: 2, has: 1, of: 'values' });
  expect(given(mannKendall(new Array<number>(9).fill(2)))).toEqual({ score: 0, variance: 0, z: 0, p: 1 });
  expect(() => mannKendall([1, Number.NaN])).toThrow(
    'The values of the series must be finite numbers: number 2 is NaN',
  );
});

test('a value that repeats its neighbour is told from one that flees it', () => {
  // NIST StRD, NumAcc1: 10000001, 10000003, 10000002 has −0.5.
  expect(given(autocorrelation([10_000_001, 10_000_003, 10_000_002]))).toBeCloseTo(-0.5, 9);
  expect(given(autocorrelation([1, 1, 1, 1]))).toBe(0);
  expect(autocorrelation([1, 2])).toMatchObject({ enough: false, needs: 3, has: 2 });
});
