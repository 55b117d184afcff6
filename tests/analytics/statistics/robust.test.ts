import fc from 'fast-check';
import { expect, test } from 'vitest';
import { deviations } from '@/analytics/statistics/robust/deviations';
import { adjustedFences, fences } from '@/analytics/statistics/robust/fences';
import { medcouple } from '@/analytics/statistics/robust/medcouple';
import { doubleScale, modifiedScale, scoreOn } from '@/analytics/statistics/robust/modified-z';
import { qn } from '@/analytics/statistics/robust/qn';
import { medianUnbiasedQuantile, quantile } from '@/analytics/statistics/robust/quantile';
import { sn } from '@/analytics/statistics/robust/sn';
import { given } from './given';

// Whole hundredths: ties are common, as in masses read off a scale.
const readings = fc.array(
  fc.integer({ min: -50_000, max: 50_000 }).map((hundredths) => hundredths / 100),
  {
    minLength: 3,
    maxLength: 80,
  },
);
const factor = fc.integer({ min: 1, max: 400 }).map((quarters) => quarters / 4);
const shift = fc.integer({ min: -1000, max: 1000 });

const scales: Record<string, (values: number[]) => number> = {
  mad: (values) => given(deviations(values)).mad,
  lowerMad: (values) => given(deviations(values)).lowerMad,
  sn: (values) => given(sn(values)).value,
  qn: (values) => given(qn(values)).value,
};

test.each(Object.entries(scales))('%s follows the unit and not the place of zero', (_, scale) => {
  fc.assert(
    fc.property(readings, factor, shift, (values, times, plus) => {
      const changed = scale(values.map((value) => times * value + plus));
      expect(changed).toBeCloseTo(times * scale(values), 6);
    }),
  );
});

test.each(Object.entries({ ...scales, medcouple: (values: number[]) => given(medcouple(values)) }))(
  '%s does not depend on the order of the values',
  (_, measure) => {
    fc.assert(
      fc.property(readings, fc.nat(), (values, turn) => {
        const at = turn % values.length;
        const turned = [...values.slice(at), ...values.slice(0, at)].reverse();
        expect(measure(turned)).toBe(measure(values));
      }),
    );
  },
);

test('medcouple changes its sign with the values and stays within 1', () => {
  fc.assert(
    fc.property(readings, (values) => {
      const skew = given(medcouple(values));
      expect(Math.abs(skew)).toBeLessThanOrEqual(1);
      expect(given(medcouple(values.map((value) => -value)))).toBeCloseTo(-skew, 9);
    }),
  );
});

/** Definitions word by word, over all pairs: Rousseeuw & Croux (1993), 2.1 and 3.1. */
const snByDefinition = (values: number[]): number => {
  const middle = Math.floor(values.length / 2);
  const high = values.map((own) => values.map((other) => Math.abs(own - other)).sort((a, b) => a - b)[middle] ?? 0);
  return 1.1926 * (high.sort((a, b) => a - b)[Math.floor((values.length + 1) / 2) - 1] ?? 0);
};
const qnByDefinition = (values: number[]): number => {
  const pairs = values.flatMap((own, index) => values.slice(0, index).map((other) => Math.abs(own - other)));
  const half = Math.floor(values.length / 2) + 1;
  return 2.21914 * (pairs.sort((a, b) => a - b)[(half * (half - 1)) / 2 - 1] ?? 0);
};

test('the fast Sn and Qn are those of the definition', () => {
  fc.assert(
    fc.property(readings, (values) => {
      expect(given(sn(values)).uncorrected).toBe(snByDefinition(values));
      expect(given(qn(values)).uncorrected).toBe(qnByDefinition(values));
    }),
  );
});

test('quantiles rise with the probability and stay among the values', () => {
  const probability = fc.double({ min: 0, max: 1, noNaN: true });
  fc.assert(
    fc.property(readings, probability, probability, (values, one, other) => {
      const [low, high] = one < other ? [one, other] : [other, one];
      for (const quantileOf of [quantile, medianUnbiasedQuantile]) {
        const [below, above] = [given(quantileOf(values, low)), given(quantileOf(values, high))];
        expect(below).toBeLessThanOrEqual(above);
        expect(below).toBeGreaterThanOrEqual(Math.min(...values));
        expect(above).toBeLessThanOrEqual(Math.max(...values));
      }
    }),
  );
});

test('fences contain the middle half', () => {
  fc.assert(
    fc.property(readings, (values) => {
      const { lower, upper } = given(fences(values));
      expect(lower).toBeLessThanOrEqual(given(quantile(values, 0.25)));
      expect(upper).toBeGreaterThanOrEqual(given(quantile(values, 0.75)));
    }),
  );
});

test('with a long low tail the lower fence forgives more than the upper', () => {
  const yields = [...Array.from({ length: 30 }, (_, index) => 0.9 + 0.003 * index), 0.2, 0.35, 0.5, 0.6, 0.7, 0.75];
  const plain = given(fences(yields));
  const leaning = given(adjustedFences(yields));
  expect(given(medcouple(yields))).toBeLessThan(0);
  expect(leaning.lower).toBeLessThan(plain.lower);
  expect(leaning.upper).toBeLessThan(plain.upper);
  expect(adjustedFences(yields.slice(0, 29))).toEqual({ enough: false, needs: 30, has: 29, of: 'values' });
});

test('two gross errors hide from mean and deviation but not from the median', () => {
  // Median 2.45, MAD 0.15: 0.6745 × 5.75/0.15 = 25.86.
  const scale = given(modifiedScale([2.1, 2.6, 2.4, 2.5, 2.3, 2.1, 2.3, 2.6, 8.2, 8.3]));
  expect(scoreOn(scale, 8.2)).toBeCloseTo(25.86, 2);
});

test('where most are tied the mean deviation measures', () => {
  // MAD 0, mean deviation 0.088: (0.2 − 1)/(1.253314 × 0.088) = −7.25.
  const scale = given(modifiedScale([1, 1, 1, 1, 1, 1, 1, 0.94, 0.2, 0.98]));
  expect(scale.basis).toBe('mean deviation');
  expect(scoreOn(scale, 0.2)).toBeCloseTo(-7.25, 2);
});

test('nothing is scored where there is nothing to score by', () => {
  const equal = given(modifiedScale([5, 5, 5]));
  expect(equal.basis).toBe('all equal');
  expect(scoreOn(equal, 5)).toBe(0);
  expect(scoreOn(equal, 6)).toBeNull();
  const oneSided = given(doubleScale([1, 1, 1, 1, 2, 3]));
  expect(scoreOn(oneSided, 0.5)).toBeNull();
  expect(modifiedScale([1])).toEqual({ enough: false, needs: 2, has: 1, of: 'values' });
  expect(medcouple([1, 2])).toMatchObject({ enough: false, needs: 3, has: 2 });
  expect(quantile([], 0.5)).toMatchObject({ enough: false, needs: 1, has: 0 });
});

test('what is no number is refused by name', () => {
  const bad = [1, Number.NaN, 3];
  for (const measure of [sn, qn, medcouple, deviations, fences]) {
    expect(() => measure(bad)).toThrow(new RangeError('Values must be finite numbers: number 2 is NaN'));
  }
  expect(() => quantile([1, 2], 1.5)).toThrow(RangeError);
  expect(() => quantile([1, Number.POSITIVE_INFINITY], 0.5)).toThrow(RangeError);
});

test('a long record is measured in a moment', () => {
  const values = Array.from({ length: 20_000 }, (_, index) => (index * 7919) % 10_007);
  const begun = performance.now();
  // Evenly spread over a length of 10,007: half of the points have half of the others within 1/4 of it, and a quarter of
  // all pairs lie within 1 − √(3/4) of it.
  expect(given(sn(values)).value / (1.1926 * 10_007 * 0.25)).toBeCloseTo(1, 2);
  expect(given(qn(values)).value / (2.21914 * 10_007 * (1 - Math.sqrt(0.75)))).toBeCloseTo(1, 2);
  expect(given(medcouple(values))).toBeCloseTo(0, 2);
  expect(performance.now() - begun).toBeLessThan(5000);
});
