import fc from 'fast-check';
import { expect, test } from 'vitest';
import { annualizedRate } from '@/analytics/leak-rate/annualizing';
import { daysBefore } from '@/analytics/leak-rate/days';
import { leakRates } from '@/analytics/leak-rate/leak-rates';
import { rateUncertainty, weighingUncertainty } from '@/analytics/leak-rate/uncertainty';
import { added, lb } from './additions';

const percents = (rated: ReturnType<typeof leakRates>) => rated?.map(({ rate }) => rate?.percent.toFixed(1));

// 40 CFR 82.152 "leak rate", annualizing method, worked by hand: 20 ÷ 200 × 365 ÷ 146.
test('20 lb into 200 lb after 146 days is 25.0 % a year', () => {
  const rated = leakRates([added('2026-01-01', 5), added('2026-05-27', 20)], lb(200), 'annualizing');
  expect(percents(rated)?.at(-1)).toBe('25.0');
});

// The same definition: the shorter of the days since the last addition and 365, so 20 ÷ 200.
test('the same after 500 days is 10.0 %', () => {
  const rated = leakRates([added('2024-06-01', 5), added('2025-10-14', 20)], lb(200), 'annualizing');
  expect(percents(rated)?.at(-1)).toBe('10.0');
});

// 40 CFR 82.152 "leak rate", rolling average method: (15 + 10 + 5) ÷ 200.
test('15, 10 and 5 lb within 365 days into 200 lb roll to 15.0 %', () => {
  const additions = [added('2025-09-01', 15), added('2026-01-10', 10), added('2026-08-31', 5)];
  expect(percents(leakRates(additions, lb(200), 'rolling_average'))).toEqual(['7.5', '12.5', '15.0']);
});

test('a period of 365 days ends with the day of the addition', () => {
  const rates = (first: string) =>
    percents(leakRates([added(first, 20), added('2026-07-01', 20)], lb(200), 'rolling_average'));
  expect(rates(daysBefore('2026-07-01', 364))?.at(-1)).toBe('20.0');
  expect(rates(daysBefore('2026-07-01', 365))?.at(-1)).toBe('10.0');
});

test('a follow-up test that shows all leaks repaired begins the rolling period anew', () => {
  const additions = [added('2026-02-01', 30, { leaksVerifiedOn: '2026-02-08' }), added('2026-06-01', 8)];
  const [first, second] = leakRates(additions, lb(200), 'rolling_average') ?? [];
  expect(first?.rate?.percent).toBeCloseTo(15, 9);
  expect(second?.rate).toMatchObject({ after: '2026-02-08', leaksVerifiedOn: '2026-02-08' });
  expect(second?.rate?.percent).toBeCloseTo(4, 9);
});

test('a test on the day of an addition came after it', () => {
  const rated = leakRates([added('2026-02-01', 30, { leaksVerifiedOn: '2026-02-01' })], lb(200), 'rolling_average');
  expect(percents(rated)).toEqual(['15.0']);
});

test('additions of one day are one event, never divided by zero days', () => {
  const additions = [added('2026-01-01', 5), added('2026-05-27', 12), added('2026-05-27', 8)];
  const rated = leakRates(additions, lb(200), 'annualizing');
  expect(rated).toHaveLength(2);
  expect(percents(rated)?.at(-1)).toBe('25.0');
  expect(rated?.at(-1)?.additionIds).toHaveLength(2);
});

test('the first addition is marked and takes the whole 365 days', () => {
  const [first] = leakRates([added('2026-05-27', 20)], lb(200), 'annualizing') ?? [];
  expect(first?.rate?.after).toBeNull();
  expect(first?.rate?.percent).toBeCloseTo(10, 9);
});

test.each(['initial_charge', 'retrofit', 'seasonal_variance'] as const)('%s is no leak and gets no rate', (reason) => {
  const additions = [added('2026-03-01', 200, { reason }), added('2026-05-30', 10)];
  const annual = leakRates(additions, lb(200), 'annualizing');
  expect(annual?.[0]?.rate).toBeNull();
  // 90 days after refrigerant was last added, whatever for: 10 ÷ 200 × 365 ÷ 90.
  expect(percents(annual)?.at(-1)).toBe('20.3');
  expect(percents(leakRates(additions, lb(200), 'rolling_average'))).toEqual([undefined, '5.0']);
});

test('without a full charge there is no rate', () => {
  for (const charge of [null, 0, -3]) expect(leakRates([added('2026-05-27', 20)], charge, 'annualizing')).toBeNull();
});

test('what is no mass, day or period is refused', () => {
  expect(() => leakRates([added('2026-05-27', 0)], lb(200), 'annualizing')).toThrow(RangeError);
  expect(() => leakRates([added('soon', 2), added('later', 2)], lb(200), 'annualizing')).toThrow(RangeError);
  expect(() => annualizedRate(1, 10, 0)).toThrow(RangeError);
  expect(() => annualizedRate(1, 0, 30)).toThrow(RangeError);
  expect(() => annualizedRate(-1, 10, 30)).toThrow(RangeError);
});

test('the order in which additions are written down does not matter', () => {
  const day = fc.integer({ min: 0, max: 2000 }).map((days) => daysBefore('2026-07-01', days));
  const additions = fc.array(fc.tuple(day, fc.integer({ min: 1, max: 90 })), { minLength: 1, maxLength: 12 });
  fc.assert(
    fc.property(additions, fc.constantFrom('annualizing' as const, 'rolling_average' as const), (list, method) => {
      const made = list.map(([on, pounds]) => added(on, pounds));
      const rates = (order: typeof made) =>
        leakRates(order, lb(100), method)?.map(({ addedOn, rate }) => [addedOn, rate?.percent.toFixed(6)]);
      expect(rates([...made].reverse())).toEqual(rates(made));
    }),
  );
});

// JCGM 100:2008 by R 4.2.2: two readings, step 0.1, repeatability 0.05 each, nothing held up in hoses.
test('two readings of a scale that shows tenths are good to 0.0816 of its unit', () => {
  expect(weighingUncertainty(0.1)).toBeCloseTo(0.08164965809277261, 15);
});

// JCGM 100:2008, 5.1.6, worked by hand: 10 % × √(0.1² + 0.05²).
test('relative uncertainties of the addition and of the charge add up as squares', () => {
  expect(rateUncertainty(10, { kg: 2, uncertaintyKg: 0.2 }, 0.05)).toBeCloseTo(1.118033988749895, 12);
  expect(rateUncertainty(0, { kg: 0, uncertaintyKg: 0 })).toBe(0);
});
