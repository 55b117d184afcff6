import fc from 'fast-check';
import { expect, test } from 'vitest';
import { classicalDecomposition } from '@/analytics/statistics/season/classical-decomposition';
import { fillGaps } from '@/analytics/statistics/season/fill-gaps';
import { decomposeMonths } from '@/analytics/statistics/season/monthly-decomposition';
import { stl } from '@/analytics/statistics/season/stl';
import { seasonWindowFor } from '@/analytics/statistics/season/stl-options';
import { strengths } from '@/analytics/statistics/season/strength';
import { given } from './given';

const wave = Array.from({ length: 12 }, (_, month) => Math.sin((2 * Math.PI * month) / 12));
const series = (months: number, slope = 0.5) =>
  Array.from({ length: months }, (_, month) => 100 + slope * month + 20 * (wave[month % 12] ?? 0));
const OPTIONS = { period: 12, seasonWindow: 'periodic', robust: false } as const;

test('a level with a fixed season is taken apart as it was put together', () => {
  const { season, trend, remainder } = given(stl(series(60, 0), OPTIONS));
  season.forEach((value, month) => {
    expect(value).toBeCloseTo(20 * (wave[month % 12] ?? 0), 9);
  });
  for (const value of trend) expect(value).toBeCloseTo(100, 9);
  expect(Math.max(...remainder.map(Math.abs))).toBeLessThan(1e-9);
});

test('a steady rise goes to the trend but for what two passes leave in the season', () => {
  const { season, trend } = given(stl(series(60, 0.5), OPTIONS));
  // The rise within a year is 6; the ends, where the smoothers lean on one side, keep less than a tenth of it.
  trend.forEach((value, month) => {
    expect(Math.abs(value - 100 - 0.5 * month)).toBeLessThan(0.6);
  });
  season.forEach((value, month) => {
    expect(Math.abs(value - 20 * (wave[month % 12] ?? 0))).toBeLessThan(0.6);
  });
});

test('parts add up to the series, and follow its unit', () => {
  const values = fc.array(fc.integer({ min: -5000, max: 5000 }), { minLength: 24, maxLength: 50 });
  fc.assert(
    fc.property(values, fc.integer({ min: 1, max: 9 }), fc.integer({ min: -90, max: 90 }), (ints, times, plus) => {
      const plain = given(stl(ints, OPTIONS));
      const changed = given(
        stl(
          ints.map((value) => times * value + plus),
          OPTIONS,
        ),
      );
      ints.forEach((value, at) => {
        const parts = (plain.season[at] ?? 0) + (plain.trend[at] ?? 0) + (plain.remainder[at] ?? 0);
        expect(parts).toBeCloseTo(value, 6);
        expect(changed.season[at]).toBeCloseTo(times * (plain.season[at] ?? 0), 5);
        expect(changed.trend[at]).toBeCloseTo(times * (plain.trend[at] ?? 0) + plus, 5);
      });
    }),
    { numRuns: 25 },
  );
});

test('one gross month neither bends a robust season nor counts in it', () => {
  const spiked = series(61).with(30, 400);
  const { season, weights } = given(stl(spiked, { ...OPTIONS, robust: true }));
  expect(weights[30]).toBe(0);
  season.forEach((value, month) => {
    expect(value).toBeCloseTo(20 * (wave[month % 12] ?? 0), 1);
  });
});

test('less than two years have no season, and what is no number is refused', () => {
  expect(stl(series(23), OPTIONS)).toEqual({ enough: false, needs: 24, has: 23, of: 'values' });
  expect(classicalDecomposition(series(23), 12, 'additive')).toMatchObject({ enough: false, needs: 24 });
  expect(() => stl(series(30).with(4, Number.NaN), OPTIONS)).toThrow('number 5 is NaN');
  expect(() => classicalDecomposition(series(30).with(4, 0), 12, 'multiplicative')).toThrow('need values above 0');
  expect(() => stl(series(30), { ...OPTIONS, period: 1 })).toThrow('The period must be a whole number from 2 up');
});

test('a season may change from five years on', () => {
  expect(seasonWindowFor(59, 12)).toBe('periodic');
  expect(seasonWindowFor(60, 12)).toBe(13);
});

test('a constant series has neither season nor trend', () => {
  const flat = new Array<number>(36).fill(7);
  const parts = given(stl(flat, OPTIONS));
  expect(strengths(parts)).toEqual({ season: 0, trend: 0 });
  expect(strengths({ season: flat, trend: flat, remainder: flat.map(() => 0) })).toEqual({ season: 0, trend: 0 });
});

test('additive figures of a season add to nothing, factors average 1', () => {
  const positive = fc.array(fc.integer({ min: 1, max: 5000 }), { minLength: 24, maxLength: 60 });
  fc.assert(
    fc.property(positive, (values) => {
      const sum = (figures: number[]) => figures.reduce((total, figure) => total + figure, 0);
      expect(sum(given(classicalDecomposition(values, 12, 'additive')).figures)).toBeCloseTo(0, 6);
      expect(sum(given(classicalDecomposition(values, 12, 'multiplicative')).figures)).toBeCloseTo(12, 9);
    }),
  );
});

test('a lost month is filled by its season and marked', () => {
  const whole = series(48, 0);
  const lost = whole.map((value, month) => (month === 18 || month === 31 ? null : value));
  const { values, filled } = given(fillGaps(lost, 12));
  expect(filled.flatMap((isFilled, month) => (isFilled ? [month] : []))).toEqual([18, 31]);
  // The months about a lost one lie up to 20 apart from it; the season brings it back to within 2.
  expect(Math.abs((values[18] ?? 0) - (whole[18] ?? 0))).toBeLessThan(2);
  expect(Math.abs((values[31] ?? 0) - (whole[31] ?? 0))).toBeLessThan(2);
  expect(values.filter((_, month) => !filled[month])).toEqual(whole.filter((_, month) => !filled[month]));
});

test('a month that was never seen twice is not made up', () => {
  const lost = series(24).map((value, month) => (month === 3 ? null : value));
  expect(fillGaps(lost, 12)).toMatchObject({ enough: false, needs: 2, has: 1 });
});

test('monthly masses show a season of factors over a trend of masses', () => {
  const masses = Array.from(
    { length: 72 },
    (_, month) => 200 * 1.01 ** month * Math.exp(0.4 * (wave[month % 12] ?? 0)),
  );
  const parts = given(decomposeMonths(masses));
  expect(parts.steady).toBe(true);
  expect(parts.seasonStrength).toBeGreaterThan(0.95);
  // exp(0.4) = 1.49 at the top, a little less for the twentieth of the mean that is added before the logarithm.
  expect(Math.max(...parts.seasonFactor)).toBeGreaterThan(1.4);
  expect(Math.max(...parts.seasonFactor)).toBeLessThan(1.49);
  expect((parts.trend[60] ?? 0) / (parts.trend[24] ?? 1)).toBeCloseTo(1.01 ** 36, 1);
});

test('months without mass are zeros, not gaps', () => {
  const withZeros = series(36).map((value, month) => (month % 12 === 0 ? 0 : value));
  expect(given(decomposeMonths(withZeros)).filled).not.toContain(true);
  expect(decomposeMonths(new Array<number>(30).fill(0))).toMatchObject({ enough: false, of: 'months with mass' });
  expect(decomposeMonths(series(20))).toEqual({ enough: false, needs: 24, has: 20, of: 'full months' });
  expect(() => decomposeMonths(series(30).with(2, -1))).toThrow('Masses must be at least 0');
});
