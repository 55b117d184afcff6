import { beforeAll, expect, test } from 'vitest';
import { applianceRecoveries } from '@/analytics/appliances/contract';
import { GET } from '@/app/api/appliances/route';
import { apiRequest, newCompany } from '../support/company';
import { type TestRecord, writeRecords } from '../support/records';

const ours = await newCompany();
const theirs = await newCompany();

/** Like jobs with yields of 0.80, 0.81 … 0.99. */
const likeJobs: TestRecord[] = Array.from({ length: 20 }, (_, index) => ({
  on: '2026-01-05',
  site: 'Cold Store',
  appliance: 'Rack',
  kg: (8 + index / 10).toFixed(1),
  refrigerant: 'R-404A',
}));

beforeAll(async () => {
  await writeRecords(ours.scope, [
    ...likeJobs,
    // Far below them: with these two the lower quartile stays near 0.84 and the fence near 0.69.
    { on: '2026-02-10', site: 'Mill 10', appliance: 'RTU-1', kg: '1', refrigerant: 'R-404A' },
    { on: '2026-04-10', site: 'Mill 10', appliance: 'RTU-1', kg: '2', refrigerant: 'R-404A' },
    // Converted since, with a nameplate of 12 kg.
    {
      on: '2026-06-10',
      site: 'Mill 10',
      appliance: 'RTU-1',
      kg: '9',
      chargeKg: '12',
      refrigerant: 'R-454B',
      category: 'comfort_cooling',
    },
    { on: '2026-07-10', site: 'Mill 10', appliance: 'RTU-1', kg: '0', excluded: true },
    // Another unit of the same name.
    { on: '2026-06-11', site: 'Mill 2', appliance: 'RTU-1', kg: '3', chargeKg: '4' },
  ]);
  await writeRecords(theirs.scope, [{ on: '2026-02-11', site: 'Depot', kg: '3' }]);
});

const ask = async (query = '', company = ours) => {
  const response = await GET(apiRequest(`/api/appliances${query}`, await company.token('office')), undefined);
  expect(response.status).toBe(200);
  return applianceRecoveries.response.parse(await response.json()).items;
};

test('adds up each appliance by site and name, and says what it last was', async () => {
  const items = await ask();
  expect(items.map(({ site, appliance }) => [site, appliance])).toEqual([
    ['Cold Store', 'Rack'],
    ['Mill 2', 'RTU-1'],
    ['Mill 10', 'RTU-1'],
  ]);
  // 1 + 2 + 9 of 10 + 10 + 12 kg; yields 0.1, 0.2 and 0.75.
  expect(items[2]).toMatchObject({
    recoveries: 3,
    recoveredMass: 12,
    fullCharge: 32,
    totalYield: 0.375,
    medianYield: 0.2,
    refrigerant: 'R-454B',
    category: 'comfort_cooling',
    unitCharge: 12,
    lowRecoveries: 2,
    firstRecoveredOn: '2026-02-10',
    lastRecoveredOn: '2026-06-10',
  });
  expect(items[1]).toMatchObject({ recoveries: 1, category: 'unstated', unitCharge: 4, lowRecoveries: 0 });
});

test('keeps to the scope and to the company', async () => {
  const march = await ask('?to=2026-03&site=Mill+10');
  expect(march).toHaveLength(1);
  expect(march[0]).toMatchObject({ refrigerant: 'R-404A', unitCharge: 10, lowRecoveries: 1 });
  expect((await ask('?site=Mill+10&appliance=RTU-1')).map((item) => item.recoveries)).toEqual([3]);
  expect((await ask('?site=Cold+Store&site=Mill+10&except=site')).map((item) => item.site)).toEqual(['Mill 2']);
  // What states nothing is not left out with what states something.
  expect((await ask('?category=comfort_cooling&except=category&site=Mill+10')).map((i) => i.recoveries)).toEqual([2]);
  expect((await ask('', theirs)).map((item) => item.site)).toEqual(['Depot']);
});

test('auditors and technicians may not, an unknown part to leave out is refused', async () => {
  for (const role of ['auditor', 'technician'] as const)
    expect((await GET(apiRequest('/api/appliances', await ours.token(role)), undefined)).status).toBe(403);
  const unknown = apiRequest('/api/appliances?except=color', await ours.token('owner'));
  expect((await GET(unknown, undefined)).status).toBe(400);
});
