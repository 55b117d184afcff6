import { describe, expect, test } from 'vitest';
import { forecastCredit } from '@/analytics/credit-forecast/model/credit';
import type { CreditTerms } from '@/analytics/credit-forecast/model/credit-draws';
import type { Paths } from '@/analytics/credit-forecast/model/paths';
import { outlookFromQuotes, outlookFromRange } from '@/analytics/credit-forecast/model/price-outlook';
import { betaQuantile } from '@/analytics/statistics/distributions/beta';
import { portfolioMoments } from '@/analytics/statistics/monte-carlo/moments';
import { expectedPayment } from '@/analytics/statistics/monte-carlo/payment-steps';
import { seededRandom } from '@/lib/random';
import { given } from '../statistics/given';

const DRAWS = { count: 20_000, seed: 'credit' };
const FULL = [{ fromPurity: 0, share: 1 }];

/** The same mass in every draw and month. */
const fixedMass = (kg: number, refrigerants: string[], horizon: number): Paths => ({
  count: 1,
  refrigerants,
  horizon,
  kg: new Float64Array(refrigerants.length * horizon).fill(kg),
});
const terms = (changes: Partial<CreditTerms> = {}): CreditTerms => ({
  prices: new Map([['R-22', { centsPerKg: 400, monthlyLogSd: 0 }]]),
  priceCorrelation: 0.5,
  purities: new Map([['R-22', Array.from({ length: 10 }, () => 0.99)]]),
  steps: FULL,
  delaysMonths: [0],
  ...changes,
});

test('without chance it is the product, to the cent', () => {
  const { months, sum } = given(forecastCredit(fixedMass(10, ['R-22'], 3), terms(), DRAWS));
  expect(months.map(({ meanCents }) => meanCents)).toEqual([4000, 4000, 4000]);
  expect(sum).toEqual({ meanCents: 12_000, p10Cents: 12_000, p50Cents: 12_000, p90Cents: 12_000 });
});

test('a delay moves money to later months, and past the horizon', () => {
  const { months, sum } = given(forecastCredit(fixedMass(10, ['R-22'], 3), terms({ delaysMonths: [2] }), DRAWS));
  expect(months.map(({ meanCents }) => meanCents)).toEqual([0, 0, 4000]);
  expect(sum.meanCents).toBe(4000);
});

// Exact: purity Beta(60, 1.5), nothing below 95 %, 0.7 from there, all from 98 %; 300 at $4 gives $938, though the mean
// purity times the price would say $1,171.
test('steps are applied to each draw, not to the mean purity', () => {
  const steps = [
    { fromPurity: 0, share: 0 },
    { fromPurity: 0.95, share: 0.7 },
    { fromPurity: 0.98, share: 1 },
  ];
  const results = Array.from({ length: 2000 }, (_, at) => betaQuantile((at + 0.5) / 2000, 60, 1.5));
  const exact = 120_000 * expectedPayment(steps, 60, 1.5).meanShare;
  const purities = new Map([['R-22', results]]);
  const { sum, meanErrorCents } = given(forecastCredit(fixedMass(300, ['R-22'], 1), terms({ steps, purities }), DRAWS));
  expect(exact).toBeCloseTo(93_794, 0);
  expect(Math.abs(sum.meanCents - exact)).toBeLessThan(4 * meanErrorCents + 100);
  expect(sum.p10Cents).toBe(0);
});

// Exact second moments of Σ mass × price with log-normal prices whose logarithms correlate by 0.5.
test('the spread of two correlated prices has its exact standard deviation', () => {
  const monthlyLogSd = 0.3;
  const prices = new Map([
    ['R-22', { centsPerKg: 400, monthlyLogSd }],
    ['R-410A', { centsPerKg: 300, monthlyLogSd }],
  ]);
  const priceVariation = Math.sqrt(Math.expm1(monthlyLogSd ** 2));
  const mass = { mean: 100, standardDeviation: 0 };
  const exact = portfolioMoments(
    [400, 300].map((price) => ({ mass, price, priceVariation })),
    0.5,
  );
  const { sum, meanErrorCents, varianceShares } = given(
    forecastCredit(fixedMass(100, ['R-22', 'R-410A'], 1), terms({ prices }), DRAWS),
  );
  expect(Math.abs(sum.meanCents - exact.mean)).toBeLessThan(4 * meanErrorCents);
  expect((meanErrorCents * Math.sqrt(DRAWS.count)) / exact.standardDeviation).toBeCloseTo(1, 1);
  expect(varianceShares.price).toBeCloseTo(1, 6);
  expect(varianceShares.mass).toBe(0);
});

describe('what is not known', () => {
  test('a refrigerant without a price earns nothing and is named', () => {
    const { sum, unpriced } = given(forecastCredit(fixedMass(10, ['R-12', 'R-22'], 1), terms(), DRAWS));
    expect(unpriced).toEqual(['R-12']);
    expect(sum.meanCents).toBe(4000);
  });

  test('too few lab results are told', () => {
    const few = terms({ purities: new Map([['R-22', [0.99]]]) });
    expect(forecastCredit(fixedMass(1, ['R-22'], 1), few, DRAWS)).toEqual({
      enough: false,
      needs: 10,
      has: 1,
      of: 'lab results',
    });
  });

  test('terms that are none are refused', () => {
    const paths = fixedMass(1, ['R-22'], 1);
    expect(() => forecastCredit(paths, terms({ delaysMonths: [] }), DRAWS)).toThrow(RangeError);
    expect(() => forecastCredit(paths, terms({ priceCorrelation: 2 }), DRAWS)).toThrow(RangeError);
    expect(() => forecastCredit(paths, terms({ purities: new Map([['R-22', [99]]]) }), DRAWS)).toThrow('purity');
  });
});

describe('how prices move', () => {
  test('24 quotes give the last one and the spread of their monthly moves', () => {
    const random = seededRandom('quotes');
    const quotes = [300];
    for (let month = 1; month < 400; month++) {
      quotes.push((quotes.at(-1) ?? 300) * Math.exp(random.normal(0, 0.06)));
    }
    const { centsPerKg, monthlyLogSd } = given(outlookFromQuotes(quotes));
    expect(centsPerKg).toBe(quotes.at(-1));
    expect(monthlyLogSd).toBeCloseTo(0.06, 2);
    expect(outlookFromQuotes(quotes.slice(0, 23))).toEqual({ enough: false, needs: 24, has: 23, of: 'monthly quotes' });
  });

  // By hand: ln(6/3) ÷ (2 × 1.28155) = 0.27043 over 4 months is 0.13522 a month.
  test('a low and a high are read as one chance in ten either way', () => {
    expect(outlookFromRange(400, 300, 600, 4).monthlyLogSd).toBeCloseTo(0.13522, 5);
    expect(() => outlookFromRange(400, 600, 300, 4)).toThrow(RangeError);
  });
});
