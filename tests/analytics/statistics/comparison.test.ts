import fc from 'fast-check';
import { expect, test } from 'vitest';
import { benjaminiHochberg, bonferroni, hochberg, holm } from '@/analytics/statistics/comparison/adjusted-p';
import { betaBinomial } from '@/analytics/statistics/comparison/beta-binomial';
import { derSimonianLaird } from '@/analytics/statistics/comparison/dersimonian-laird';
import { binomialLimit, shareFunnel } from '@/analytics/statistics/comparison/exact-limits';
import { gammaPoisson } from '@/analytics/statistics/comparison/gamma-poisson';
import { overdispersion } from '@/analytics/statistics/comparison/overdispersion';
import { pauleMandel } from '@/analytics/statistics/comparison/paule-mandel';
import { pooledMean, weightedSquares } from '@/analytics/statistics/comparison/pooled-mean';
import { quasiBinomial } from '@/analytics/statistics/comparison/quasi-binomial';
import { shrinkage } from '@/analytics/statistics/comparison/shrinkage';
import { given } from './given';

const effect = fc.record({
  estimate: fc.integer({ min: -500, max: 500 }).map((parts) => parts / 100),
  variance: fc.integer({ min: 1, max: 400 }).map((parts) => parts / 100),
});
const effects = fc.array(effect, { minLength: 4, maxLength: 25 });

test('variance between members follows the square of the unit and not the level', () => {
  fc.assert(
    fc.property(effects, fc.integer({ min: 1, max: 9 }), fc.integer({ min: -9, max: 9 }), (members, times, plus) => {
      const changed = members.map(({ estimate, variance }) => ({
        estimate: times * estimate + plus,
        variance: times * times * variance,
      }));
      for (const method of [derSimonianLaird, pauleMandel]) {
        expect(given(method(changed))).toBeCloseTo(times * times * given(method(members)), 6);
      }
    }),
  );
});

test('the variance of Paule and Mandel solves its equation or is nought', () => {
  fc.assert(
    fc.property(effects, (members) => {
      const variance = given(pauleMandel(members));
      const squares = weightedSquares(members, pooledMean(members, variance));
      if (variance > 0) expect(squares).toBeCloseTo(members.length - 1, 8);
      else expect(squares).toBeLessThanOrEqual(members.length - 1);
    }),
  );
});

test('shrinking draws each member towards the mean and past no one', () => {
  fc.assert(
    fc.property(effects, (members) => {
      const { mean, members: drawn } = given(shrinkage(members));
      drawn.forEach(({ estimate, weight, lower, upper }, index) => {
        const raw = members[index]?.estimate ?? Number.NaN;
        expect(weight).toBeGreaterThanOrEqual(0);
        expect(weight).toBeLessThan(1);
        expect(Math.abs(estimate - mean)).toBeLessThanOrEqual(Math.abs(raw - mean) + 1e-12);
        expect(lower).toBeLessThan(estimate);
        expect(upper).toBeGreaterThan(estimate);
      });
    }),
  );
});

test('under four members nothing is drawn, and one alone is too few', () => {
  const three = [1, 2, 6].map((estimate) => ({ estimate, variance: 1 }));
  expect(given(shrinkage(three)).members.map((member) => member.estimate)).toEqual([1, 2, 6]);
  expect(shrinkage(three.slice(0, 1))).toMatchObject({ enough: false, needs: 2, has: 1 });
  expect(overdispersion([1, 2, 3, 4], [1, 1, 1, 1])).toEqual({ enough: false, needs: 5, has: 4, of: 'members' });
  expect(() => pauleMandel([{ estimate: 1, variance: 0 }])).toThrow('A sampling variance must be above 0, not 0');
});

test('members spread as far as chance alone have no variance between them', () => {
  // Eight schools, Rubin (1981): Q = 4.7 on 7 degrees of freedom; all shrink most of the way to 7.7.
  const schools = [28, 8, -3, 7, -1, 1, 18, 12].map((estimate, index) => ({
    estimate,
    variance: ([15, 10, 16, 11, 9, 11, 10, 18][index] ?? 0) ** 2,
  }));
  const { betweenVariance, mean } = given(shrinkage(schools));
  expect(betweenVariance).toBe(0);
  expect(mean).toBeCloseTo(7.7, 1);
});

test('limits of a funnel lie in order, close on the target and stay within 0 and 1', () => {
  fc.assert(
    fc.property(fc.integer({ min: 1, max: 2000 }), fc.integer({ min: 1, max: 99 }), (trials, percent) => {
      const target = percent / 100;
      const limits = shareFunnel(trials, target);
      expect(limits).toEqual([...limits].sort((a, b) => a - b));
      expect(limits[0]).toBeGreaterThanOrEqual(0);
      expect(limits[3]).toBeLessThanOrEqual(1);
      expect(limits[0]).toBeLessThanOrEqual(target);
      expect(limits[3]).toBeGreaterThanOrEqual(target);
    }),
  );
  expect(binomialLimit(0.975, 100_000, 0.1) - binomialLimit(0.025, 100_000, 0.1)).toBeCloseTo(
    2 * 1.96 * Math.sqrt((0.1 * 0.9) / 100_000),
    4,
  );
});

test('adjusted p-values keep their order and do not depend on that of the tests', () => {
  const ps = fc.array(
    fc.integer({ min: 0, max: 1000 }).map((parts) => parts / 1000),
    { minLength: 1, maxLength: 30 },
  );
  fc.assert(
    fc.property(ps, (raw) => {
      for (const adjust of [benjaminiHochberg, holm, hochberg, bonferroni]) {
        const adjusted = adjust(raw);
        expect(adjust([...raw].reverse())).toEqual([...adjusted].reverse());
        raw.forEach((p, index) => {
          expect(adjusted[index]).toBeGreaterThanOrEqual(p);
          raw.forEach((other, at) => {
            if (p < other) expect(adjusted[index]).toBeLessThanOrEqual(adjusted[at] ?? Number.NaN);
          });
        });
      }
      const [found, byHolm] = [benjaminiHochberg(raw), holm(raw)];
      found.forEach((p, index) => {
        expect(p).toBeLessThanOrEqual((byHolm[index] ?? 0) + 1e-12);
      });
    }),
  );
  expect(benjaminiHochberg([])).toEqual([]);
  expect(() => benjaminiHochberg([0.2, Number.NaN])).toThrow('A probability must lie between 0 and 1, not NaN');
});

test('counts and shares that vary as chance alone would are told so', () => {
  expect(given(gammaPoisson([10, 10, 11, 9], [10, 10, 10, 10]))).toEqual({ spread: 'none beyond chance', mean: 1 });
  expect(given(betaBinomial([10, 10, 11, 9], [40, 40, 40, 40]))).toEqual({ spread: 'none beyond chance', mean: 0.25 });
  expect(gammaPoisson([0, 0], [1, 2])).toMatchObject({ enough: false, of: 'events' });
  expect(betaBinomial([1], [2])).toMatchObject({ enough: false, needs: 2, has: 1 });
  expect(() => betaBinomial([3, 1], [2, 2])).toThrow('2 trials cannot have 3 hits');
});

test('a prior that members were drawn from is found again', () => {
  // Means of Gamma(2, 2) at its 19 even quantiles, each seen over 1,000 expected: noise is a sixtieth of the spread.
  const rates = [
    0.178, 0.266, 0.342, 0.412, 0.48, 0.549, 0.618, 0.688, 0.762, 0.839, 0.922, 1.011, 1.109, 1.22, 1.346, 1.497, 1.685,
    1.945, 2.372,
  ];
  const fit = given(
    gammaPoisson(
      rates.map((rate) => Math.round(1000 * rate)),
      rates.map(() => 1000),
    ),
  );
  if (fit.spread !== 'found') throw new Error(fit.spread);
  // Even quantiles leave out the tails, so the fitted shape is a little above 2.
  expect(fit.shape).toBeGreaterThan(1.9);
  expect(fit.shape).toBeLessThan(2.8);
  fit.members.forEach((member, index) => {
    expect(member.mean).toBeCloseTo(rates[index] ?? 0, 1);
    expect(member.lower).toBeLessThan(member.mean);
    expect(member.upper).toBeGreaterThan(member.mean);
  });
});

test('a regression on one column of ones gives the common share', () => {
  const fit = given(quasiBinomial([[1], [1], [1]], [3, 5, 10], [10, 20, 30]));
  if (!fit.converged) throw new Error('did not converge');
  expect(1 / (1 + Math.exp(-(fit.coefficients[0] ?? 0)))).toBeCloseTo(18 / 60, 12);
});

test('a regression says when it has no answer', () => {
  expect(
    quasiBinomial(
      [
        [1, 0],
        [1, 1],
      ],
      [1, 1],
      [2, 2],
    ),
  ).toEqual({ enough: false, needs: 3, has: 2, of: 'shares' });
  const twins = [
    [1, 2, 2],
    [1, 3, 3],
    [1, 5, 5],
    [1, 7, 7],
  ];
  expect(() => quasiBinomial(twins, [1, 1, 1, 1], [2, 2, 2, 2])).toThrow('Columns of the design depend on each other');
  const apart = given(
    quasiBinomial(
      [
        [1, 0],
        [1, 0],
        [1, 1],
        [1, 1],
      ],
      [0, 0, 5, 5],
      [5, 5, 5, 5],
    ),
  );
  expect(apart).toEqual({ converged: false });
});
