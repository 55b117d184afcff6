import fc from 'fast-check';
import { beforeAll, expect, test } from 'vitest';
import { type MonthSums, sumsByMonth, sumsByRecord } from '@/analytics/monthly-trends/months';
import { rowsByMonth, rowsByRecord } from '@/analytics/monthly-trends/rows';
import { DIMENSIONS, type Scope, UNSTATED } from '@/analytics/scope';
import { readCompany } from '@/db/client';
import { APPLIANCE_CATEGORIES, JOB_TYPES } from '@/lib/vocabulary';
import { newCompany } from '../support/company';
import { type TestRecord, writeRecords } from '../support/records';

const REFRIGERANTS = ['R-410A', 'R-22', 'R-404A'];
const PEOPLE = ['Ann Lee', 'Bo Ray', UNSTATED];
const PLACES = ['East', 'West'];
const company = await newCompany();

const pick = <T>(items: readonly T[]) => fc.constantFrom(...items);
const month = fc
  .tuple(fc.integer({ min: 2024, max: 2026 }), fc.integer({ min: 1, max: 12 }))
  .map(([year, no]) => `${year}-${String(no).padStart(2, '0')}`);
const record: fc.Arbitrary<TestRecord> = fc.record({
  on: fc.tuple(month, fc.integer({ min: 1, max: 28 })).map(([m, day]) => `${m}-${String(day).padStart(2, '0')}`),
  kg: fc.integer({ min: 0, max: 20_000_000 }).map((mg) => (mg / 1_000_000).toFixed(6)),
  chargeKg: fc.integer({ min: 1, max: 30_000 }).map((g) => (g / 1000).toFixed(3)),
  refrigerant: pick(REFRIGERANTS),
  technician: pick(PEOPLE),
  site: pick(PLACES),
  branch: pick([...PLACES, null]),
  category: pick([...APPLIANCE_CATEGORIES, null]),
  jobType: pick([...JOB_TYPES, null]),
  excluded: fc.integer({ min: 0, max: 9 }).map((n) => n === 0),
});

beforeAll(async () => {
  await writeRecords(company.scope, fc.sample(record, { numRuns: 600, seed: 7 }));
});

const narrowing = {
  refrigerant: fc.subarray(REFRIGERANTS, { minLength: 1 }),
  technician: fc.subarray(PEOPLE, { minLength: 1 }),
  site: fc.subarray(PLACES, { minLength: 1 }),
  branch: fc.subarray([...PLACES, UNSTATED], { minLength: 1 }),
  category: fc.subarray([...APPLIANCE_CATEGORIES, UNSTATED], { minLength: 1 }),
  jobType: fc.subarray([...JOB_TYPES, UNSTATED], { minLength: 1 }),
};

const question = pick(DIMENSIONS).chain((by) =>
  fc.record({
    by: fc.constant(by),
    scope: fc.record(
      { from: month.filter((m) => m < '2025-06'), to: month.filter((m) => m >= '2025-06'), [by]: narrowing[by] },
      { requiredKeys: [] },
    ) as fc.Arbitrary<Scope>,
  }),
);

test('views summed by month and the records themselves give the same rows', async () => {
  await fc.assert(
    fc.asyncProperty(question, async ({ by, scope }) => {
      const [fromViews, fromRecords] = await readCompany(company.scope, async (tx) => [
        await rowsByMonth(tx, scope, by),
        await rowsByRecord(tx, scope, by),
      ]);
      expect(fromViews.map(({ co2e: _, ...row }) => row)).toEqual(fromRecords.map(({ co2e: _, ...row }) => row));
      // CO2-equivalents are sums of floating point numbers: the order of adding may show in the last digits.
      for (const [index, row] of fromViews.entries())
        expect(row.co2e).toBeCloseTo(fromRecords[index]?.co2e ?? Number.NaN, 2);
    }),
    { numRuns: 60, seed: 11 },
  );
});

test('months that stand ready and the records themselves give the same sums', async () => {
  const plain = (sums: MonthSums[]) =>
    sums.map(({ co2e, totalYield, ...rest }) => ({ ...rest, co2e: Math.round(co2e * 10) }));
  const range = fc.record(
    { from: month.filter((m) => m < '2025-06'), to: month.filter((m) => m >= '2025-06') },
    { requiredKeys: [] },
  );
  await fc.assert(
    fc.asyncProperty(range, async (scope) => {
      const [ready, fromRecords] = await readCompany(company.scope, async (tx) => [
        await sumsByMonth(tx, scope),
        await sumsByRecord(tx, scope),
      ]);
      expect(ready.length).toBeGreaterThan(1);
      expect(plain(ready)).toEqual(plain(fromRecords));
      for (const [index, row] of ready.entries())
        expect(row.totalYield).toBeCloseTo(fromRecords[index]?.totalYield ?? Number.NaN, 12);
    }),
    { numRuns: 20, seed: 12 },
  );
});
