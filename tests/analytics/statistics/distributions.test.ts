import fc from 'fast-check';
import { expect, test } from 'vitest';
import { betaCdf, betaQuantile } from '@/analytics/statistics/distributions/beta';
import { binomialCdf, binomialQuantile } from '@/analytics/statistics/distributions/binomial';
import { chiSquareUpperTail, gammaCdf, gammaQuantile } from '@/analytics/statistics/distributions/gamma';
import { logBeta, logGamma } from '@/analytics/statistics/distributions/log-gamma';
import { negativeBinomialCdf, negativeBinomialQuantile } from '@/analytics/statistics/distributions/negative-binomial';
import { normalCdf, normalQuantile, twoSidedP } from '@/analytics/statistics/distributions/normal';
import { poissonCdf, poissonQuantile } from '@/analytics/statistics/distributions/poisson';
import { studentTCdf, studentTQuantile } from '@/analytics/statistics/distributions/student-t';
import { Z_95 } from '@/analytics/statistics/distributions/z-95';
import { garwood } from '@/analytics/statistics/intervals/poisson-mean';
import { agrestiCoull, clopperPearson, jeffreys, wilson } from '@/analytics/statistics/intervals/proportion';
import { gaussLegendre } from '@/analytics/statistics/quadrature';

const probability = fc.integer({ min: 1, max: 9999 }).map((parts) => parts / 10_000);
const shape = fc.integer({ min: 2, max: 4000 }).map((tenths) => tenths / 10);

type Pair = {
  cdf: (value: number, a: number, b: number) => number;
  quantile: (p: number, a: number, b: number) => number;
};
const continuous: Record<string, Pair> = {
  normal: { cdf: normalCdf, quantile: normalQuantile },
  t: { cdf: studentTCdf, quantile: studentTQuantile },
  gamma: { cdf: gammaCdf, quantile: gammaQuantile },
  beta: { cdf: betaCdf, quantile: betaQuantile },
};

test.each(Object.entries(continuous))('%s: quantiles undo probabilities and rise with them', (_, { cdf, quantile }) => {
  fc.assert(
    fc.property(probability, probability, shape, shape, (one, other, a, b) => {
      const [low, high] = one < other ? [one, other] : [other, one];
      const [below, above] = [quantile(low, a, b), quantile(high, a, b)];
      expect(below).toBeLessThanOrEqual(above);
      // A share near 1 has no double for every probability: the neighbours must take it between them.
      const spacing = 4 * Number.EPSILON * Math.abs(below);
      expect(cdf(below - spacing, a, b)).toBeLessThanOrEqual(low + 1e-10);
      expect(cdf(below + spacing, a, b)).toBeGreaterThanOrEqual(low - 1e-10);
    }),
  );
});

const whole: Record<string, Pair> = {
  binomial: {
    cdf: (count, a, b) => binomialCdf(count, Math.ceil(a), b / 500),
    quantile: (p, a, b) => binomialQuantile(p, Math.ceil(a), b / 500),
  },
  poisson: { cdf: poissonCdf, quantile: poissonQuantile },
  'negative binomial': {
    cdf: (count, a, b) => negativeBinomialCdf(count, a, b / 500),
    quantile: (p, a, b) => negativeBinomialQuantile(p, a, b / 500),
  },
};

test.each(Object.entries(whole))(
  '%s: a quantile is the least count that reaches its probability',
  (_, { cdf, quantile }) => {
    fc.assert(
      fc.property(probability, shape, shape, (p, a, b) => {
        const count = quantile(p, a, b);
        expect(cdf(count, a, b)).toBeGreaterThanOrEqual(p * (1 - 1e-12));
        expect(cdf(count - 1, a, b)).toBeLessThan(p);
      }),
    );
  },
);

test('ends of the scale are what they are', () => {
  expect(normalQuantile(0)).toBe(Number.NEGATIVE_INFINITY);
  expect(normalQuantile(0.5)).toBeCloseTo(0, 15);
  expect(normalQuantile(0.975)).toBeCloseTo(Z_95, 14);
  expect(studentTQuantile(1, 4)).toBe(Number.POSITIVE_INFINITY);
  expect(gammaQuantile(1, 2, 3)).toBe(Number.POSITIVE_INFINITY);
  expect(poissonQuantile(1, 3)).toBe(Number.POSITIVE_INFINITY);
  expect(binomialQuantile(1, 7, 0.2)).toBe(7);
  expect(binomialCdf(-1, 7, 0.2)).toBe(0);
  expect(poissonCdf(0, 0)).toBe(1);
  // Half of Binomial(5, ½) lies at 2 and below exactly; rounding must not make it 3.
  expect(binomialQuantile(0.5, 5, 0.5)).toBe(2);
  // exp(−x/2): chi-square with two degrees of freedom.
  expect(chiSquareUpperTail(3, 2)).toBeCloseTo(Math.exp(-1.5), 14);
  expect(twoSidedP(-Z_95)).toBeCloseTo(0.05, 14);
  expect(logBeta(2, 3)).toBeCloseTo(Math.log(1 / 12), 14);
});

test('arguments that mean nothing are refused by name', () => {
  expect(() => normalQuantile(1.1)).toThrow(new RangeError('A probability must lie between 0 and 1, not 1.1'));
  expect(() => normalCdf(Number.NaN)).toThrow('A normal value must be a finite number, not NaN');
  expect(() => betaQuantile(0.5, 0, 1)).toThrow('The first shape must be above 0, not 0');
  expect(() => gammaCdf(1, 1, Number.POSITIVE_INFINITY)).toThrow('The rate must be above 0, not Infinity');
  expect(() => binomialCdf(1, 2.5, 0.5)).toThrow('Trials must be a whole number from 0 up, not 2.5');
  expect(() => logGamma(-1)).toThrow(RangeError);
  expect(() => wilson(5, 4)).toThrow('4 trials cannot have 5 hits');
  expect(() => garwood(-1)).toThrow(RangeError);
});

test.each([
  ['Clopper-Pearson', clopperPearson],
  ['Wilson', wilson],
  ['Jeffreys', jeffreys],
  ['Agresti-Coull', agrestiCoull],
])('%s holds the share seen and mirrors hits and misses', (_, intervalOf) => {
  const sample = fc
    .integer({ min: 1, max: 400 })
    .chain((trials) => fc.tuple(fc.integer({ min: 0, max: trials }), fc.constant(trials)));
  fc.assert(
    fc.property(sample, ([hits, trials]) => {
      const { lower, upper } = intervalOf(hits, trials);
      const mirrored = intervalOf(trials - hits, trials);
      expect(lower).toBeLessThanOrEqual(hits / trials);
      expect(upper).toBeGreaterThanOrEqual(hits / trials);
      expect(mirrored.lower).toBeCloseTo(1 - upper, 10);
    }),
  );
});

test('an exact interval covers what it says at its own bounds', () => {
  fc.assert(
    fc.property(fc.integer({ min: 1, max: 200 }), (count) => {
      const { lower, upper } = garwood(count);
      expect(1 - poissonCdf(count - 1, lower)).toBeCloseTo(0.025, 9);
      expect(poissonCdf(count, upper)).toBeCloseTo(0.025, 9);
    }),
  );
});

test('nodes integrate polynomials up to twice their number exactly', () => {
  // ∫ x⁷ − 3x² dx from −1 to 2 = (2⁸ − 1)/8 − (8 + 1) = 22.875: four nodes suffice.
  const nodes = gaussLegendre(4, -1, 2);
  expect(nodes.reduce((sum, { at, weight }) => sum + weight * (at ** 7 - 3 * at ** 2), 0)).toBeCloseTo(22.875, 11);
});
