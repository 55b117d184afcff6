import fc from 'fast-check';
import { expect, test } from 'vitest';
import { fitShortShare, shortChance } from '@/analytics/leak-suspicion/short-share';
import { seededRandom } from '@/seed/random';
import { given } from '../statistics/given';

/** Yields of visits of which a share came short with anything up to the centre, the others normal about it. */
const yields = (count: number, share: number, seed: string) => {
  const random = seededRandom(seed);
  return Array.from({ length: count }, () =>
    random.chance(share) ? random.between(0, 0.92) : random.normal(0.92, 0.04),
  );
};

test.each([0.05, 0.15, 0.3, 0.45])('finds a planted share of %d', (share) => {
  const fit = given(fitShortShare(yields(2000, share, `share ${share}`)));
  expect(fit.share).toBeGreaterThan(share - 0.04);
  expect(fit.share).toBeLessThan(share + 0.04);
  expect(fit.centre).toBeCloseTo(0.92, 2);
  expect(fit.spread).toBeCloseTo(0.04, 2);
});

// Bayes' rule worked by hand: 0.2/0.9 against 0.8 times the normal height at two spreads below, 0.053991 / 0.05.
test('the probability of one yield is Bayes’ rule on the two kinds', () => {
  const usual = { share: 0.2, centre: 0.9, spread: 0.05 };
  expect(shortChance(0.8, usual)).toBeCloseTo(0.222222 / (0.222222 + 0.8 * 1.07981933), 5);
  expect(shortChance(0.9, usual)).toBe(0);
  expect(shortChance(0.1, usual)).toBeCloseTo(1, 9);
});

test('the less came out, the likelier the unit was short', () => {
  const usual = { share: 0.2, centre: 0.9, spread: 0.05 };
  const pulled = fc.double({ min: 0, max: 0.89, noNaN: true });
  fc.assert(
    fc.property(pulled, pulled, (a, b) => {
      const [less, more] = a < b ? [a, b] : [b, a];
      expect(shortChance(less, usual)).toBeGreaterThanOrEqual(shortChance(more, usual));
    }),
  );
});

test('under 20 like jobs nothing is usual', () => {
  expect(fitShortShare(yields(19, 0.2, 'few'))).toEqual({ enough: false, needs: 20, has: 19, of: 'like jobs' });
});

test('yields that are all alike are no leak', () => {
  const fit = given(fitShortShare(Array.from({ length: 40 }, () => 0.9)));
  expect(shortChance(0.9, fit)).toBeLessThan(0.5);
  expect(() => fitShortShare([Number.NaN])).toThrow(RangeError);
});
