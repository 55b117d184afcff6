import fc from 'fast-check';
import { expect, test } from 'vitest';
import {
  averageRunLengthOfCusum,
  averageRunLengthOfEwma,
} from '@/analytics/statistics/control-charts/average-run-length';
import { baselineLimits } from '@/analytics/statistics/control-charts/baseline';
import { cusumChart } from '@/analytics/statistics/control-charts/cusum';
import { ewmaChart } from '@/analytics/statistics/control-charts/ewma';
import { individualsLimits, medianIndividualsLimits } from '@/analytics/statistics/control-charts/individuals-limits';
import { DEFAULT_RUN_RULES, signalsOf, standardScores } from '@/analytics/statistics/control-charts/run-rules';
import { shareLimits } from '@/analytics/statistics/control-charts/share-limits';
import { sumOfJobs, yearOnYear } from '@/analytics/statistics/season/year-on-year';
import { given } from './given';
import { normals } from './random';

const readings = fc.array(
  fc.integer({ min: -9000, max: 9000 }).map((hundredths) => hundredths / 100),
  { minLength: 2, maxLength: 60 },
);

test.each([
  ['mean', individualsLimits],
  ['median', medianIndividualsLimits],
])('limits of the %s form follow the unit, hold the centre and lie level about it', (_, limitsOf) => {
  const factor = fc.integer({ min: 1, max: 40 }).map((halves) => halves / 2);
  fc.assert(
    fc.property(readings, factor, fc.integer({ min: -100, max: 100 }), (values, times, plus) => {
      const plain = given(limitsOf(values));
      const changed = given(limitsOf(values.map((value) => times * value + plus)));
      expect(plain.lower).toBeLessThanOrEqual(plain.centre);
      expect(plain.centre - plain.lower).toBeCloseTo(plain.upper - plain.centre, 6);
      expect(changed.lower).toBeCloseTo(times * plain.lower + plus, 6);
      expect(changed.upper).toBeCloseTo(times * plain.upper + plus, 6);
      expect(changed.movingRangeUpper).toBeCloseTo(times * plain.movingRangeUpper, 6);
    }),
  );
});

test('a chart needs two values and refuses what is no number', () => {
  expect(individualsLimits([4])).toEqual({ enough: false, needs: 2, has: 1, of: 'values' });
  expect(() => individualsLimits([1, Number.NaN])).toThrow('The values of the chart must be finite numbers');
  expect(() => ewmaChart([1], { target: 0, sigma: 1, weight: 1.2 })).toThrow('The weight must be at most 1, not 1.2');
  expect(() => cusumChart([1], { target: 0, slack: -1, threshold: 5 })).toThrow('The slack must be at least 0');
});

const quiet = Array.from({ length: 30 }, (_, index) => 50 + 0.5 * ([0, 1, -1, 2, -2][index % 5] ?? 0));

test('a baseline is provisional from 12 values, firm from 20 and frozen after 24', () => {
  expect(baselineLimits(quiet.slice(0, 11))).toEqual({ enough: false, needs: 12, has: 11, of: 'values' });
  expect(given(baselineLimits(quiet.slice(0, 12)))).toMatchObject({ provisional: true, length: 12 });
  expect(given(baselineLimits(quiet.slice(0, 20)))).toMatchObject({ provisional: false, length: 20 });
  const frozen = given(baselineLimits(quiet.slice(0, 24)));
  expect(given(baselineLimits([...quiet.slice(0, 24), 90, 90, 90]))).toEqual(frozen);
});

test('a gross value in the baseline does not widen the limits that find it', () => {
  const spoiled = quiet.with(7, 80);
  const { limits } = given(baselineLimits(spoiled));
  expect(limits.form).toBe('median');
  expect(limits.upper).toBeLessThan(80);
  expect(given(baselineLimits(quiet)).limits.form).toBe('mean');
});

test('a constant baseline has its limits on the centre and no signals', () => {
  const { limits } = given(baselineLimits(new Array<number>(12).fill(5)));
  expect(limits).toMatchObject({ lower: 5, centre: 5, upper: 5, sigma: 0 });
  const scores = standardScores([5, 5, 6], limits);
  expect(DEFAULT_RUN_RULES.flatMap((rule) => signalsOf(rule, scores))).toEqual([]);
});

test('rules see the same from above and from below', () => {
  const scores = fc.array(
    fc.integer({ min: -40, max: 40 }).map((tenths) => tenths / 10),
    { maxLength: 60 },
  );
  const rules = [
    'beyondLimits',
    'nineOneSide',
    'sixOneWay',
    'fourteenAlternating',
    'twoOfThreeBeyondTwo',
    'fourOfFiveBeyondOne',
    'fifteenWithinOne',
    'eightOutsideOne',
    'eightOneSide',
  ] as const;
  fc.assert(
    fc.property(scores, (values) => {
      const turned = values.map((value) => -value);
      for (const rule of rules) expect(signalsOf(rule, turned)).toEqual(signalsOf(rule, values));
    }),
  );
});

test('a signal of the sums tells where its run began', () => {
  // NIST/SEMATECH e-Handbook 6.3.2.3: signal at the 14th mean. C⁺ was zero until the 12th, so the run began at the 13th.
  const means = [
    324.925, 324.675, 324.725, 324.35, 325.35, 325.225, 324.125, 324.525, 325.225, 324.6, 324.625, 325.15, 328.325,
    327.25, 327.825, 328.5, 326.675, 327.775, 326.875, 328.35,
  ];
  const points = cusumChart(means, { target: 325, slack: 0.3175, threshold: 4.1959 });
  const first = points.findIndex((point) => point.signal);
  expect(first).toBe(13);
  expect(points[first]?.signal).toEqual({ side: 'above', runStart: 12 });
});

test('sums turn over with the values', () => {
  fc.assert(
    fc.property(readings, (values) => {
      const design = { target: 0, slack: 5, threshold: 40 };
      const up = cusumChart(values, design);
      const down = cusumChart(
        values.map((value) => -value),
        design,
      );
      expect(down.map((point) => point.below)).toEqual(up.map((point) => point.above));
    }),
  );
});

/** Mean number of values to the first signal, and its standard error, over seeded runs of normal values. */
const simulated = (runs: number, firstSignal: (values: number[]) => number) => {
  const next = normals(20_260_401);
  const lengths = Array.from({ length: runs }, () => firstSignal(Array.from({ length: 200 }, () => next() + 1)));
  const mean = lengths.reduce((sum, length) => sum + length, 0) / runs;
  const variance = lengths.reduce((sum, length) => sum + (length - mean) ** 2, 0) / (runs - 1);
  return { mean, standardError: Math.sqrt(variance / runs) };
};

test('charts signal as late, on average, as the equations of their run lengths say', () => {
  const ewma = simulated(2000, (values) => {
    const { points, steadyUpper, steadyLower } = ewmaChart(values, { target: 0, sigma: 1 });
    return 1 + points.findIndex(({ average }) => average > steadyUpper || average < steadyLower);
  });
  const cusum = simulated(
    2000,
    (values) =>
      1 + cusumChart(values, { target: 0, slack: 0.5, threshold: 5 }).findIndex((point) => point.signal !== null),
  );
  // Four standard errors of the simulation; the exact lengths are near 10.5 and 10.4.
  const exactEwma = averageRunLengthOfEwma({ weight: 0.2, width: 2.962 }, 1);
  const exactCusum = averageRunLengthOfCusum({ slack: 0.5, threshold: 5 }, 1);
  expect(Math.abs(ewma.mean - exactEwma)).toBeLessThan(4 * ewma.standardError);
  expect(Math.abs(cusum.mean - exactCusum)).toBeLessThan(4 * cusum.standardError);
});

test('the two rules that are on cry wolf about every 153 values', () => {
  const next = normals(1987);
  const longest = 8;
  const lengths = Array.from({ length: 1500 }, () => {
    const window: number[] = [];
    for (let length = 1; ; length++) {
      window.push(next());
      if (window.length > longest) window.shift();
      const last = window.length - 1;
      if (DEFAULT_RUN_RULES.some((rule) => signalsOf(rule, window).includes(last))) return length;
    }
  });
  const mean = lengths.reduce((sum, length) => sum + length, 0) / lengths.length;
  // Champ & Woodall (1987), table 1: 152.73. A run length varies about as much as it is long; four standard errors.
  expect(Math.abs(mean - 152.73)).toBeLessThan((4 * 152.73) / Math.sqrt(lengths.length));
});

test('limits of shares stay within 0 and 1 and around the common share', () => {
  const group = fc
    .integer({ min: 1, max: 300 })
    .chain((size) => fc.tuple(fc.integer({ min: 0, max: size }), fc.constant(size)));
  fc.assert(
    fc.property(fc.array(group, { minLength: 2, maxLength: 30 }), (groups) => {
      const limits = given(
        shareLimits(
          groups.map(([hits]) => hits),
          groups.map(([, size]) => size),
        ),
      );
      for (const { lower, upper, laneyLower, laneyUpper } of limits.groups) {
        expect(lower).toBeGreaterThanOrEqual(0);
        expect(laneyUpper).toBeLessThanOrEqual(1);
        expect(laneyLower).toBeLessThanOrEqual(limits.centre);
        expect(upper).toBeGreaterThanOrEqual(limits.centre);
      }
    }),
  );
});

test('with few groups a spread under 1 is taken as 1', () => {
  const few = given(shareLimits([10, 10, 11, 10], [100, 100, 100, 100]));
  expect(few.spread).toBeLessThan(1);
  expect(few.spreadUsed).toBe(1);
  const many = given(shareLimits(new Array<number>(24).fill(10), new Array<number>(24).fill(100)));
  expect(many.spreadUsed).toBe(0);
  expect(() => shareLimits([5, 3], [4, 4])).toThrow('A group of 4 cannot have 5 hits');
});

test('a year is compared with one that there was', () => {
  expect(yearOnYear([5], []).ratio).toEqual({ enough: false, needs: 2, has: 1, of: 'periods with mass' });
  // Two equal jobs against two equal jobs: se = √(1/2 + 1/2) = 1.
  const { ratio, logStandardError } = given(yearOnYear([4, 4], [2, 2]).ratio);
  expect(ratio).toBe(2);
  expect(logStandardError).toBeCloseTo(1, 12);
  expect(sumOfJobs([3, 4])).toEqual({ total: 7, standardError: 5 });
  expect(() => sumOfJobs([-1])).toThrow('A mass must be at least 0, not -1');
});
