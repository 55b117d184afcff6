import { beforeAll, describe, expect, test } from 'vitest';
import { trendsComparison } from '@/analytics/trends-comparison/contract';
import { getTrendsComparison } from '@/analytics/trends-comparison/query';
import { GET } from '@/app/api/trends/comparison/route';
import { readCompany } from '@/db/client';
import type { FlagRule } from '@/lib/vocabulary';
import { apiRequest, newCompany } from '../support/company';
import { putFlags } from '../support/flags';
import { writeRecords } from '../support/records';

const ours = await newCompany();
const theirs = await newCompany();
/** 9 December 2026 is the day of these tests: December is running. */
const TODAY = '2026-12-09';

const compare = async (query: Record<string, string | string[]> = {}, company = ours) => {
  const parsed = trendsComparison.query.parse(query);
  const answer = await readCompany(company.scope, (tx) => getTrendsComparison(tx, parsed, TODAY));
  return trendsComparison.response.parse(answer);
};
const compared = async (query: Record<string, string | string[]> = {}) => {
  const { comparison } = await compare(query);
  if (!comparison) throw new Error('There is nothing to compare');
  return comparison;
};

beforeAll(async () => {
  await writeRecords(ours.scope, [
    { on: '2025-11-05', kg: '10', chargeKg: '20', refrigerant: 'R-22', holdMinutes: 10, vacuumKpaAbs: '101.325' },
    { on: '2025-11-28', kg: '6', chargeKg: '8', refrigerant: 'R-410A', holdMinutes: 0, vacuumKpaAbs: '50' },
    { on: '2025-12-09', kg: '3', chargeKg: '5', refrigerant: 'R-22' },
    // The tenth is not among the same days.
    { on: '2025-12-10', kg: '50', chargeKg: '60', refrigerant: 'R-22' },
    { on: '2026-11-30', kg: '4', chargeKg: '10', refrigerant: 'R-22', vacuumKpaAbs: '110' },
    { on: '2026-11-30', kg: '2', chargeKg: '4', refrigerant: 'R-123', vacuumKpaAbs: '5' },
    { on: '2026-11-12', kg: '500', excluded: true },
    { on: '2026-12-09', kg: '9', chargeKg: '10', refrigerant: 'R-410A', holdMinutes: 5, vacuumKpaAbs: '80' },
    { on: '2026-12-10', kg: '7', refrigerant: 'R-22' },
  ]);
  await writeRecords(theirs.scope, [
    { on: '2025-11-05', kg: '999' },
    { on: '2026-11-05', kg: '888' },
  ]);
});

test('both sides have their figures, the running month only its days', async () => {
  const { now, before, sameDays, shortened } = await compared({ from: '2026-11' });
  expect({ sameDays, shortened }).toEqual({ sameDays: true, shortened: null });
  // By hand: 4 + 2 + 9 kg of charges 10 + 4 + 10; square root of 16 + 4 + 81; yields 0.4, 0.5, 0.9.
  expect(now).toMatchObject({ from: '2026-11-01', to: '2026-12-09', recoveredMass: 15, recoveries: 3, excluded: 1 });
  expect(now.massStandardError).toBeCloseTo(Math.sqrt(101), 3);
  expect(now.totalYield).toBeCloseTo(15 / 24, 12);
  expect(now.medianYield).toBeCloseTo(0.5, 12);
  // By hand: 10 + 6 + 3 kg of 20 + 8 + 5; yields 0.5, 0.75, 0.6.
  expect(before).toMatchObject({ from: '2025-11-01', to: '2025-12-09', recoveredMass: 19, recoveries: 3, excluded: 0 });
  expect(before.massStandardError).toBeCloseTo(Math.sqrt(145), 3);
  expect(before.totalYield).toBeCloseTo(19 / 33, 12);
  expect(before.medianYield).toBeCloseTo(0.6, 12);
});

test('holds and levels are shares of the records that state them', async () => {
  const { now, before } = await compared({ from: '2026-11' });
  expect(now).toMatchObject({ holdStated: 1, held: 1, heldShare: 1 });
  expect(before).toMatchObject({ holdStated: 2, held: 1, heldShare: 0.5 });
  // 40 CFR 82.156 Table 1: R-22 and R-410A below 200 lb 0 inHg (101.3 kPa), R-123 25 mm Hg absolute (3.3 kPa).
  expect(now).toMatchObject({ vacuumStated: 3, downToLevel: 1 });
  expect(now.downToLevelShare).toBeCloseTo(1 / 3, 12);
  expect(before).toMatchObject({ vacuumStated: 2, downToLevel: 2, downToLevelShare: 1 });
});

test('CO2-equivalent is of the named report, and what that lacks is told', async () => {
  // AR4: R-22 1810, R-123 77, R-410A (675 + 3500) / 2. AR6: R-22 1960, R-410A 2256, R-123 not in the catalogue.
  const ar4 = (await compared({ from: '2026-11' })).now;
  expect(ar4.co2e).toBeCloseTo(4 * 1810 + 2 * 77 + 9 * 2087.5, 3);
  expect(ar4.massWithoutGwp).toBe(0);
  const ar6 = (await compared({ from: '2026-11', gwp: 'ar6' })).now;
  expect(ar6.co2e).toBeCloseTo(4 * 1960 + 9 * 2256, 3);
  expect(ar6.massWithoutGwp).toBe(2);
});

test('the difference has the range that chance gives a sum of jobs', async () => {
  const { difference, ratio, clear } = await compared({ from: '2026-11' });
  // Compound Poisson: the variance of each sum is the sum of its squared masses, 101 and 145.
  const reach = 1.959963984540054 * Math.sqrt(101 + 145);
  expect(difference.mass).toBe(-4);
  expect(difference.low).toBeCloseTo(-4 - reach, 2);
  expect(difference.high).toBeCloseTo(-4 + reach, 2);
  const factor = Math.exp(1.959963984540054 * Math.sqrt(101 / 15 ** 2 + 145 / 19 ** 2));
  expect(ratio?.value).toBeCloseTo(15 / 19, 6);
  expect(ratio?.low).toBeCloseTo(15 / 19 / factor, 4);
  expect(ratio?.high).toBeCloseTo((15 / 19) * factor, 3);
  expect(clear).toBe(false);
});

test('what moved most comes first, also what only one side has', async () => {
  const { movers, otherKeys } = await compared({ from: '2026-11' });
  expect(movers).toEqual([
    { key: 'R-22', now: 4, before: 13, difference: -9 },
    { key: 'R-410A', now: 9, before: 6, difference: 3 },
    { key: 'R-123', now: 2, before: 0, difference: 2 },
  ]);
  expect(otherKeys).toEqual({ keys: 0, difference: 0 });
  const byJob = await compared({ from: '2026-11', by: 'jobType' });
  expect(byJob.movers).toEqual([{ key: 'unstated', now: 15, before: 19, difference: -4 }]);
});

test('the months that stand ready and the records say the same', async () => {
  // Every record is at North Yard: naming it narrows nothing, but leaves only the records to answer.
  for (const gwp of ['ar4', 'ar6'])
    expect(await compared({ from: '2026-11', gwp, site: 'North Yard' })).toEqual(
      await compared({ from: '2026-11', gwp }),
    );
});

test('another period is compared like for like', async () => {
  const { now, before } = await compared({ from: '2026-12', versus: '2025-11' });
  expect(now).toMatchObject({ from: '2026-12-01', to: '2026-12-09', recoveredMass: 9 });
  expect(before).toMatchObject({ from: '2025-11-01', to: '2025-11-09', recoveredMass: 10 });
});

test('a side without recoveries is nothing, not an error', async () => {
  const { before, ratio, clear } = await compared({ from: '2026-12', versus: '2026-10' });
  expect(before).toMatchObject({ recoveredMass: 0, recoveries: 0, totalYield: null, medianYield: null });
  expect(before).toMatchObject({ heldShare: null, downToLevelShare: null, flaggedShare: null, co2e: 0 });
  expect({ ratio, clear }).toEqual({ ratio: null, clear: false });
});

test('flagged records are counted on both sides', async () => {
  const company = await newCompany();
  const month = (on: string) => Array.from({ length: 4 }, (_, n) => ({ on, kg: '8', ref: `${on} ${n}` }));
  const ids = await writeRecords(company.scope, [...month('2025-06-15'), ...month('2026-06-15')]);
  const flag = (ref: string, rule: FlagRule, certainty: number) => ({
    recoveryId: ids.get(ref) ?? '',
    rule,
    certainty,
  });
  await putFlags(company.companyId, [
    flag('2025-06-15 0', 'unit_slip', 0.9),
    flag('2026-06-15 0', 'stopped_early', 0.5),
    // Two reasons are one record.
    flag('2026-06-15 1', 'stopped_early', 0.7),
    flag('2026-06-15 1', 'hold_missing', 0.8),
    // Too unsure, and no fault.
    flag('2026-06-15 2', 'unit_slip', 0.49),
    flag('2026-06-15 3', 'short_on_arrival', 0.99),
  ]);
  const { comparison } = await compare({ from: '2026-06', to: '2026-06' }, company);
  expect(comparison?.now).toMatchObject({ flagged: 2, flaggedShare: 0.5 });
  expect(comparison?.before).toMatchObject({ flagged: 1, flaggedShare: 0.25 });
});

describe('over HTTP', () => {
  const get = async (query: string, token: string) => {
    const response = await GET(apiRequest(`/api/trends/comparison${query}`, token), undefined);
    return { status: response.status, body: await response.json() };
  };

  test('another company never shows', async () => {
    const { status, body } = await get('?from=2026-11&to=2026-11', await ours.token('owner'));
    expect(status).toBe(200);
    expect(body.comparison.now.recoveredMass).toBe(6);
    const foreign = await get('?from=2026-11&to=2026-11', await theirs.token('operations'));
    expect(foreign.body.comparison).toMatchObject({
      now: { recoveredMass: 888 },
      before: { recoveredMass: 999 },
    });
  });

  test('an empty company has nothing to compare', async () => {
    const empty = await newCompany();
    const { status, body } = await get('', await empty.token('owner'));
    expect([status, body.comparison]).toEqual([200, null]);
  });

  test('bad input is refused with its path', async () => {
    const owner = await ours.token('owner');
    for (const [query, path] of [
      ['?versus=2024', 'versus'],
      ['?versus=2024-05..2024-04', 'versus'],
      ['?versus=2024-02-30', 'versus'],
      ['?versus=2024-01&versus=2024-02', 'versus'],
      ['?gwp=ar5', 'gwp'],
      ['?by=colour', 'by'],
      ['?from=2026-04&to=2026-03', 'to'],
    ] as const) {
      const { status, body } = await get(query, owner);
      expect([query, status, body.errors?.[0]?.path]).toEqual([query, 400, path]);
    }
  });
});
