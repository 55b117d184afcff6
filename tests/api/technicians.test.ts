import { beforeAll, expect, test } from 'vitest';
import { technicianRecoveries } from '@/analytics/technicians/contract';
import { GET } from '@/app/api/technicians/route';
import { apiRequest, newCompany } from '../support/company';
import { writeRecords } from '../support/records';

const ours = await newCompany();
const theirs = await newCompany();

beforeAll(async () => {
  await writeRecords(ours.scope, [
    { on: '2026-01-10', technician: 'bo ray', kg: '1.0005', chargeKg: '2' },
    { on: '2026-02-10', technician: 'bo ray', kg: '2.0005', chargeKg: '2.5' },
    { on: '2026-03-10', technician: 'bo ray', kg: '0', chargeKg: '50', excluded: true },
    { on: '2026-02-11', technician: 'Ann Lee', kg: '3', chargeKg: '4' },
  ]);
  await writeRecords(theirs.scope, [{ on: '2026-02-11', technician: 'Cal Fox', kg: '3' }]);
});

const ask = async (query = '', company = ours) => {
  const response = await GET(apiRequest(`/api/technicians${query}`, await company.token('trainer')), undefined);
  expect(response.status).toBe(200);
  return technicianRecoveries.response.parse(await response.json()).items;
};

test('adds up each technician by name, entry errors left out', async () => {
  const [ann, bo, ...others] = await ask();
  expect(others).toEqual([]);
  expect(ann).toMatchObject({
    technician: 'Ann Lee',
    recoveries: 1,
    recoveredMass: 3,
    fullCharge: 4,
    totalYield: 0.75,
  });
  // 1.0005 + 2.0005 = 3.001 exactly; ratio of sums 3.001 / 4.5, median of 0.50025 and 0.8002.
  expect(bo).toMatchObject({
    technician: 'bo ray',
    recoveries: 2,
    recoveredMass: 3.001,
    firstRecoveredOn: '2026-01-10',
    lastRecoveredOn: '2026-02-10',
  });
  expect(bo?.totalYield).toBeCloseTo(3.001 / 4.5, 12);
  expect(bo?.medianYield).toBeCloseTo((0.50025 + 0.8002) / 2, 12);
});

test('keeps to the scope and to the company', async () => {
  expect((await ask('?to=2026-01')).map((item) => item.technician)).toEqual(['bo ray']);
  expect((await ask('', theirs)).map((item) => item.technician)).toEqual(['Cal Fox']);
});

test('office and technicians may not, a reversed range is refused', async () => {
  for (const role of ['office', 'technician'] as const)
    expect((await GET(apiRequest('/api/technicians', await ours.token(role)), undefined)).status).toBe(403);
  const reversed = apiRequest('/api/technicians?from=2026-02&to=2026-01', await ours.token('owner'));
  expect((await GET(reversed, undefined)).status).toBe(400);
});
