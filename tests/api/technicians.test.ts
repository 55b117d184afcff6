import { beforeAll, expect, test } from 'vitest';
import { technicianRecoveries } from '@/analytics/technicians/contract';
import { GET } from '@/app/api/technicians/route';
import { crewOf, crewWith } from '../analytics/technician-comparison/crew';
import { apiRequest, newCompany } from '../support/company';
import { writeRecords } from '../support/records';

const ours = await newCompany();
const theirs = await newCompany();
const large = await newCompany();

/** Eleven people of whom Cleo leaves ten points more than the others, as records of a company. */
const crew = crewOf(crewWith({ id: 'Cleo', leaves: 0.1 }), 21);

beforeAll(async () => {
  await writeRecords(ours.scope, [
    { on: '2026-01-10', technician: 'bo ray', kg: '1.0005', chargeKg: '2' },
    { on: '2026-02-10', technician: 'bo ray', kg: '2.0005', chargeKg: '2.5' },
    { on: '2026-03-10', technician: 'bo ray', kg: '0', chargeKg: '50', excluded: true },
    { on: '2026-02-11', technician: 'Ann Lee', kg: '3', chargeKg: '4' },
  ]);
  await writeRecords(
    large.scope,
    crew.map((job) => ({
      on: job.recoveredOn,
      technician: job.technicianId,
      kg: job.recoveredMassKg.toFixed(6),
      chargeKg: '5',
      category: 'comfort_cooling' as const,
      jobType: job.jobType === 'repair' ? ('repair' as const) : ('service' as const),
      vacuumKpaAbs: (job.finalVacuumKpaAbs ?? 0).toFixed(6),
    })),
  );
  await writeRecords(theirs.scope, [{ on: '2026-02-11', technician: 'Cal Fox', kg: '3' }]);
});

const ask = async (query = '', company = ours) => {
  const response = await GET(apiRequest(`/api/technicians${query}`, await company.token('trainer')), undefined);
  expect(response.status).toBe(200);
  return technicianRecoveries.response.parse(await response.json()).items;
};
const named = (items: Awaited<ReturnType<typeof ask>>, name: string) =>
  items.find(({ technician }) => technician === name);

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

test('one who is clearly below is called so, with range, masses and the reason in words', async () => {
  const items = await ask('', large);
  expect(items.filter(({ verdict }) => verdict === 'below').map(({ technician }) => technician)).toEqual(['Cleo']);
  const cleo = named(items, 'Cleo');
  const own = crew.filter(({ technicianId }) => technicianId === 'Cleo');
  expect(cleo).toMatchObject({ recoveries: own.length, look: true, restsOn: 'usual pull' });
  expect(cleo?.observedMass).toBeCloseTo(
    own.reduce((sum, job) => sum + Number(job.recoveredMassKg.toFixed(6)), 0),
    3,
  );
  expect(cleo?.observedMass).toBeLessThan(0.95 * (cleo?.expectedMass ?? 0));
  expect(cleo?.low).toBeLessThan(cleo?.effect ?? 0);
  expect(cleo?.high).toBeLessThan(0);
  expect(cleo?.why).toContain('Cleo recovers');
});

test('naming technicians chooses who is shown, not with whom they are compared', async () => {
  const all = await ask('', large);
  const [cleo, ...others] = await ask('?technician=Cleo', large);
  expect(others).toEqual([]);
  expect(cleo).toEqual(named(all, 'Cleo'));
  expect((await ask('?technician=Cleo&except=technician', large)).map(({ technician }) => technician)).not.toContain(
    'Cleo',
  );
});

test('of few jobs nothing is said but what they add up to', async () => {
  expect(await ask()).toMatchObject([
    { technician: 'Ann Lee', verdict: 'too few', effect: null, low: null, high: null, look: false, observedMass: 3 },
    { technician: 'bo ray', verdict: 'too few', effect: null, low: null, high: null, look: false, observedMass: 3.001 },
  ]);
});

test('a later beginning does not make newcomers of those who were there before', async () => {
  const items = await ask('?from=2024-01', large);
  for (const { leftOut, judgedJobs, recoveries } of items) {
    expect(leftOut.firstJobs).toBe(0);
    expect(judgedJobs).toBe(recoveries);
  }
});
