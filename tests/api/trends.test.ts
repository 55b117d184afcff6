import { beforeAll, expect, test } from 'vitest';
import type { MonthlyTrends } from '@/analytics/monthly-trends/contract';
import { monthlyTrends } from '@/analytics/monthly-trends/contract';
import { getMonthlyTrends } from '@/analytics/monthly-trends/query';
import { GET } from '@/app/api/trends/monthly/route';
import { readCompany } from '@/db/client';
import { apiRequest, newCompany } from '../support/company';
import { writeRecords } from '../support/records';

const ours = await newCompany();
const theirs = await newCompany();
let owner = '';

const ask = async (query = '', token = owner): Promise<MonthlyTrends> => {
  const response = await GET(apiRequest(`/api/trends/monthly${query}`, token), undefined);
  expect(response.status).toBe(200);
  return monthlyTrends.response.parse(await response.json());
};
const problem = async (query: string, token = owner) => {
  const response = await GET(apiRequest(`/api/trends/monthly${query}`, token), undefined);
  expect(response.headers.get('content-type')).toBe('application/problem+json');
  return { status: response.status, body: await response.json() };
};

beforeAll(async () => {
  owner = await ours.token('owner');
  // 1.0004 + 1.0004 = 2.0008 kg: rounding each to the gram first would give 2.000.
  await writeRecords(ours.scope, [
    { on: '2025-03-01', kg: '4', branch: 'East', category: 'comfort_cooling', jobType: 'repair' },
    { on: '2026-02-28', kg: '1.0004', chargeKg: '2', refrigerant: 'R-22', technician: 'Ann Lee' },
    { on: '2026-03-01', kg: '1.0004', chargeKg: '2', refrigerant: 'R-22' },
    { on: '2026-03-31', kg: '1.0004', chargeKg: '4', refrigerant: 'R-22', site: 'South Yard' },
    { on: '2026-03-15', kg: '8', branch: 'East', category: 'small_appliance', jobType: 'disposal' },
    { on: '2026-03-16', kg: '700', excluded: true },
    { on: '2026-04-01', kg: '5' },
  ]);
  await writeRecords(theirs.scope, [{ on: '2026-03-10', kg: '999' }]);
});

test('sums by month and refrigerant exactly, rounded to the gram once', async () => {
  const { rows, months, totals, excluded, by } = await ask();
  expect(by).toBe('refrigerant');
  expect(rows.map((r) => [r.month, r.key, r.recoveredMass, r.recoveries])).toEqual([
    ['2025-03', 'R-410A', 4, 1],
    ['2026-02', 'R-22', 1, 1],
    ['2026-03', 'R-22', 2.001, 2],
    ['2026-03', 'R-410A', 8, 1],
    ['2026-04', 'R-410A', 5, 1],
  ]);
  // Median of 1.0004/2 and 1.0004/4; the yield of March is (1.0004 + 1.0004 + 8) / (2 + 4 + 10).
  expect(rows[2]?.medianYield).toBeCloseTo((0.5002 + 0.2501) / 2, 12);
  const march = months.find((m) => m.month === '2026-03');
  expect(march?.totalYield).toBeCloseTo(10.0008 / 16, 12);
  expect(march?.medianYield).toBeCloseTo(0.5002, 12);
  expect(march?.yearBefore).toBe(4);
  expect(months.find((m) => m.month === '2026-04')?.yearBefore).toBe(0);
  expect(months.find((m) => m.month === '2025-03')?.yearBefore).toBeNull();
  expect(totals).toMatchObject({ recoveredMass: 20.001, recoveries: 6 });
  expect(excluded).toBe(1);
});

test('counts CO2-equivalent with the AR4 potentials of the catalogue', async () => {
  // 40 CFR 98 table A-1 (AR4): HCFC-22 1810; R-410A = half HFC-32 (675) and half HFC-125 (3500) = 2087.5.
  const { rows } = await ask('?from=2026-03&to=2026-03');
  expect(rows.find((r) => r.key === 'R-22')?.co2e).toBeCloseTo(2.0008 * 1810, 2);
  expect(rows.find((r) => r.key === 'R-410A')?.co2e).toBeCloseTo(8 * 2087.5, 0);
});

test('counts holds and levels among the records that state them, from months and from records alike', async () => {
  const company = await newCompany();
  await writeRecords(company.scope, [
    // 40 CFR 82.156 Table 1: R-22 below 200 lb must reach 0 inHg, 101.3 kPa absolute.
    { on: '2026-03-01', kg: '1', refrigerant: 'R-22', holdMinutes: 10, vacuumKpaAbs: '101.3' },
    { on: '2026-03-02', kg: '1', refrigerant: 'R-22', holdMinutes: 0, vacuumKpaAbs: '120' },
    { on: '2026-03-03', kg: '1', refrigerant: 'R-22' },
    { on: '2026-03-04', kg: '1', refrigerant: 'R-22', holdMinutes: 9, vacuumKpaAbs: '50', excluded: true },
  ]);
  const token = await company.token('owner');
  for (const query of ['', '?refrigerant=R-22&site=North%20Yard'])
    expect((await ask(query, token)).months[0]).toMatchObject({
      holdStated: 2,
      held: 1,
      vacuumStated: 2,
      downToLevel: 1,
    });
});

test('ends are inclusive in the address and half-open inside', async () => {
  const march = await ask('?from=2026-03&to=2026-03');
  expect(march.totals.recoveries).toBe(3);
  const days = await ask('?from=2026-03-15&to=2026-03-31');
  expect(days.totals.recoveries).toBe(2);
  expect(days.cutMonths).toEqual(['2026-03']);
  expect((await ask('?from=2026-03-01&to=2026-03-31')).cutMonths).toEqual([]);
});

test('a scope without the year before still compares with it', async () => {
  const { months } = await ask('?from=2026-03&to=2026-04');
  expect(months.map((m) => [m.month, m.yearBefore])).toEqual([
    ['2026-03', 4],
    ['2026-04', 0],
  ]);
});

test('records that do not state a dimension have a key, and can be asked for', async () => {
  const byBranch = await ask('?by=branch&from=2026-03&to=2026-03');
  expect(byBranch.rows.map((r) => [r.key, r.recoveredMass])).toEqual([
    ['East', 8],
    ['unstated', 2.001],
  ]);
  expect((await ask('?by=category&category=unstated')).totals.recoveries).toBe(4);
  expect((await ask('?by=jobType&branch=unstated&branch=East')).totals.recoveries).toBe(6);
  expect((await ask('?by=site&technician=Ann%20Lee')).rows).toHaveLength(1);
});

test('another company never shows', async () => {
  const { totals } = await ask('', await theirs.token('owner'));
  expect(totals).toMatchObject({ recoveredMass: 999, recoveries: 1 });
});

test('bad input is refused with its path', async () => {
  for (const [query, path] of [
    ['?from=2026-04&to=2026-03', 'to'],
    ['?from=2026-02-31', 'from'],
    ['?from=0000-01', 'from'],
    ['?to=9999-12', 'to'],
    ['?technician=%00', 'technician'],
    ['?from=2026-13', 'from'],
    ['?by=colour', 'by'],
    ['?category=toaster', 'category'],
  ] as const) {
    const { status, body } = await problem(query);
    expect([query, status, body.errors?.[0]?.path]).toEqual([query, 400, path]);
  }
});

test('a technician and an auditor may not', async () => {
  expect((await problem('', await ours.token('technician'))).status).toBe(403);
  expect((await problem('', await ours.token('auditor'))).status).toBe(403);
  expect((await problem('', '')).status).toBe(401);
});

test('an empty company gives no rows and totals that say nothing', async () => {
  const empty = await newCompany();
  const answer = await ask('', await empty.token('owner'));
  expect(answer).toMatchObject({
    rows: [],
    months: [],
    totals: { recoveredMass: 0, recoveries: 0, medianYield: null, totalYield: null },
    excluded: 0,
  });
});

test('the running month is of the company’s zone', async () => {
  // 30 November, 23:30 in Honolulu is 1 December, 22:30 in Auckland and 09:30 UTC.
  const now = new Date('2026-12-01T09:30:00Z');
  const running = (timeZone: string, scope: { from?: string; to?: string } = {}) =>
    readCompany(ours.scope, (tx) => getMonthlyTrends(tx, { by: 'refrigerant', ...scope }, { now, timeZone })).then(
      ({ partialMonth }) => partialMonth,
    );
  expect(await running('Pacific/Honolulu')).toBe('2026-11');
  expect(await running('Pacific/Auckland')).toBe('2026-12');
  expect(await running('Pacific/Auckland', { to: '2026-11' })).toBeNull();
  expect(await running('Pacific/Honolulu', { to: '2026-11' })).toBe('2026-11');
  expect(await running('Pacific/Honolulu', { from: '2026-12' })).toBeNull();
});

test('keys beyond the largest are told together, each month whole, and the records behind them open', async () => {
  const company = await newCompany();
  const sites = ['A', 'B', 'C', 'D', 'E'];
  await writeRecords(company.scope, [
    // A to E recovered 10, 8, 6, 4 and 2 kg in May; E another 0.5 kg in June.
    ...sites.map((site, index) => ({ on: '2026-05-05', site, kg: String(10 - 2 * index) })),
    { on: '2026-06-05', site: 'E', kg: '0.5' },
    { on: '2026-06-06', site: 'A', kg: '1', refrigerant: 'R-22' },
  ]);
  const token = await company.token('owner');
  // Out of the months that stand ready, and out of the records.
  for (const narrowed of ['', '&from=2026-05-01&to=2026-06-29']) {
    const { rows, otherKeys, months } = await ask(`?by=site&keys=2${narrowed}`, token);
    expect(rows.map(({ month, key, recoveredMass }) => [month, key, recoveredMass])).toEqual([
      ['2026-05', 'A', 10],
      ['2026-05', 'B', 8],
      ['2026-06', 'A', 1],
    ]);
    expect(otherKeys?.keys).toBe(3);
    expect(otherKeys?.rows.map(({ month, recoveredMass, recoveries }) => [month, recoveredMass, recoveries])).toEqual([
      ['2026-05', 12, 3],
      ['2026-06', 0.5, 1],
    ]);
    expect(months[0]?.recoveredMass).toBe(30);
  }
  // One that would be left over is named; without the parameter all are.
  expect((await ask('?by=site&keys=4', token)).otherKeys).toBeNull();
  expect((await ask('?by=site', token)).rows).toHaveLength(7);
  expect((await ask('?by=site&keys=1&site=C&site=D&site=E', token)).otherKeys?.keys).toBe(2);
  // The records of the others, as the picture opens them.
  const others = await ask('?by=site&site=A&site=B&except=site', token);
  expect(others.totals).toMatchObject({ recoveredMass: 12.5, recoveries: 4 });
  expect((await problem('?keys=0', token)).status).toBe(400);
});

test('the year before the scope is told with the figures that its months are compared with', async () => {
  const { earlier, months } = await ask('?from=2026-02&to=2026-04');
  expect(earlier.map(({ month, recoveredMass }) => [month, recoveredMass])).toEqual([['2025-03', 4]]);
  expect(months.find(({ month }) => month === '2026-03')?.yearBefore).toBe(4);
  expect((await ask()).earlier).toEqual([]);
});
