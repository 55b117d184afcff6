import { beforeAll, expect, test } from 'vitest';
import type { RecordList } from '@/analytics/records/contract';
import { GET } from '@/app/api/recoveries/route';
import { apiRequest, newCompany } from '../support/company';
import { addRecoveries, newPlaces, type Places } from '../support/ticket-records';

let company: Awaited<ReturnType<typeof newCompany>>;
let places: Places;
let token: string;

const ask = (search: string, asToken = token) => GET(apiRequest(`/api/recoveries${search}`, asToken), undefined);
const list = async (search: string, asToken = token): Promise<RecordList> => {
  const response = await ask(search, asToken);
  expect(response.status).toBe(200);
  return (await response.json()) as RecordList;
};
const refs = async (search: string) => (await list(search)).items.map((item) => item.recordRef);

beforeAll(async () => {
  company = await newCompany();
  token = await company.token('owner');
  places = await newPlaces(company.scope);
  await addRecoveries(company.scope, places, [
    { recordRef: 'A-2', recoveredOn: '2026-01-31', refrigerant: 'R-22', recoveredMassKg: '2', category: 'other' },
    { recordRef: 'A-10', recoveredOn: '2026-02-01', recoveredMassKg: '10', branchId: places.branchId },
    { recordRef: 'A-1', recoveredOn: '2026-02-28', technicianId: places.otherTechnicianId, notes: '100% dry' },
    {
      recordRef: '50%_off',
      recoveredOn: '2026-03-01',
      recoveredAt: '2026-03-01T15:30:00-05:00',
      recoveredMassKg: '3.4567891',
    },
  ]);
});

test('the newest record comes first, with masses to the gram and yield over full charge', async () => {
  const { items, total, nextCursor, previousCursor } = await list('');
  expect(total).toBe(4);
  expect([nextCursor, previousCursor]).toEqual([null, null]);
  expect(items[0]).toMatchObject({
    recordRef: '50%_off',
    recoveredOn: '2026-03-01',
    recoveredAt: '2026-03-01T20:30:00.000Z',
    technician: 'Robin Vale',
    site: 'Mill Street School',
    appliance: 'RTU-1',
    branch: null,
    fullCharge: 10,
    recoveredMass: 3.457,
    version: 1,
  });
  expect(items[0]?.yield).toBeCloseTo(0.34567891, 10);
});

test('refs are ordered by the worth of their digits', async () => {
  expect(await refs('?sort=recordRef')).toEqual(['50%_off', 'A-1', 'A-2', 'A-10']);
});

test('masses are ordered as numbers, both ways round', async () => {
  expect(await refs('?sort=-recoveredMass')).toEqual(['A-10', 'A-1', '50%_off', 'A-2']);
  expect(await refs('?sort=recoveredMass')).toEqual(['A-2', '50%_off', 'A-1', 'A-10']);
});

test('records that do not state the sort value come last in both directions', async () => {
  expect((await refs('?sort=branch'))[0]).toBe('A-10');
  expect((await refs('?sort=-branch'))[0]).toBe('A-10');
});

test('dates are inclusive, and a month means all of its days', async () => {
  expect(await refs('?from=2026-02&to=2026-02&sort=recoveredOn')).toEqual(['A-10', 'A-1']);
  expect(await refs('?from=2026-01-31&to=2026-02-01&sort=recoveredOn')).toEqual(['A-2', 'A-10']);
});

test('every dimension narrows, repeated values widen, and unstated is a value', async () => {
  expect(await refs('?refrigerant=R-22')).toEqual(['A-2']);
  expect((await refs('?refrigerant=R-22&refrigerant=R-410A')).length).toBe(4);
  expect(await refs('?technician=Kim%20Arden')).toEqual(['A-1']);
  expect(await refs('?branch=North')).toEqual(['A-10']);
  expect((await refs('?category=unstated')).length).toBe(3);
});

test('a search looks in ref, technician, site and appliance, and takes % and _ as they are', async () => {
  expect(await refs('?q=arden')).toEqual(['A-1']);
  expect((await refs('?q=mill')).length).toBe(4);
  expect((await refs('?q=rtu')).length).toBe(4);
  expect(await refs(`?q=${encodeURIComponent('%_')}`)).toEqual(['50%_off']);
});

test.each([
  ['?sort=weight', 'sort'],
  ['?limit=0', 'limit'],
  ['?limit=501', 'limit'],
  ['?limit=ten', 'limit'],
  ['?from=2026-13', 'from'],
  ['?from=2026-05&to=2026-04', 'to'],
  ['?importId=7', 'importId'],
  ['?cursor=nonsense', 'cursor'],
  ['?q=%00', 'q'],
])('%s is refused with 400 at %s', async (search, path) => {
  const response = await ask(search);
  expect(response.status).toBe(400);
  expect(await response.json()).toMatchObject({ errors: [{ path }] });
});

test('an auditor reads, nobody reads without a token', async () => {
  expect((await list('', await company.token('auditor'))).items).toHaveLength(4);
  expect((await ask('', '')).status).toBe(401);
});

test('a technician sees his own records only, and an unlinked one none', async () => {
  const own = await list('', await company.token('technician', places.otherTechnicianId));
  expect(own.items.map((item) => item.recordRef)).toEqual(['A-1']);
  expect(own.total).toBe(1);
  expect((await list('', await company.token('technician'))).items).toEqual([]);
});

test('another company sees none of it', async () => {
  const other = await newCompany();
  expect(await list('', await other.token('owner'))).toMatchObject({ items: [], total: 0 });
});
