import { beforeAll, expect, test } from 'vitest';
import { siteRecoveries } from '@/analytics/sites/contract';
import { GET } from '@/app/api/sites/route';
import { apiRequest, newCompany } from '../support/company';
import { writeRecords } from '../support/records';

const ours = await newCompany();
const theirs = await newCompany();

beforeAll(async () => {
  await writeRecords(ours.scope, [
    { on: '2026-01-10', site: 'Site 10', appliance: 'RTU-1', kg: '2', chargeKg: '4', refrigerant: 'R-22' },
    { on: '2026-02-10', site: 'Site 10', appliance: 'RTU-1', kg: '3', chargeKg: '4' },
    { on: '2026-03-10', site: 'Site 10', appliance: 'RTU-2', kg: '4', chargeKg: '4' },
    { on: '2026-04-10', site: 'Site 10', appliance: 'RTU-3', kg: '9', chargeKg: '4', excluded: true },
    { on: '2026-02-11', site: 'Site 2', kg: '3', chargeKg: '5' },
  ]);
  await writeRecords(theirs.scope, [{ on: '2026-02-11', site: 'Depot', kg: '3' }]);
});

const ask = async (query = '', company = ours) => {
  const response = await GET(apiRequest(`/api/sites${query}`, await company.token('office')), undefined);
  expect(response.status).toBe(200);
  return siteRecoveries.response.parse(await response.json()).items;
};

test('adds up each site in the order people read, entry errors left out', async () => {
  const items = await ask();
  expect(items.map((item) => item.site)).toEqual(['Site 2', 'Site 10']);
  expect(items[1]).toMatchObject({
    recoveries: 3,
    appliances: 2,
    recoveredMass: 9,
    fullCharge: 12,
    totalYield: 0.75,
    medianYield: 0.75,
    lowRecoveries: 0,
    firstRecoveredOn: '2026-01-10',
    lastRecoveredOn: '2026-03-10',
  });
});

test('keeps to the scope and to the company', async () => {
  expect((await ask('?refrigerant=R-22')).map((item) => [item.site, item.recoveries])).toEqual([['Site 10', 1]]);
  expect((await ask('', theirs)).map((item) => item.site)).toEqual(['Depot']);
});

test('auditors and technicians may not', async () => {
  for (const role of ['auditor', 'technician'] as const)
    expect((await GET(apiRequest('/api/sites', await ours.token(role)), undefined)).status).toBe(403);
});
