import { randomUUID } from 'node:crypto';
import { beforeAll, expect, test } from 'vitest';
import { additionChanges, additionSchema, additionsList } from '@/analytics/charge-additions/contract';
import { DELETE, PATCH } from '@/app/api/charge-additions/[id]/route';
import { GET as getChanges } from '@/app/api/charge-additions/changes/route';
import { GET as getList } from '@/app/api/charge-additions/route';
import { apiRequest, newCompany } from '../../support/company';
import { entriesOf, firstBroken } from '../../support/history';
import { add, sent } from '../../support/leaks';
import { newPlaces } from '../../support/ticket-records';

const ours = await newCompany();
const theirs = await newCompany();
let token = '';
let applianceId = '';
beforeAll(async () => {
  token = await ours.token('office');
  applianceId = (await newPlaces(ours.scope)).applianceId;
});

const at = (id: string) => ({ params: Promise.resolve({ id }) });
const body = (rest: Record<string, unknown> = {}) => ({
  applianceId,
  addedOn: '2026-05-27',
  addedCharge: '12.50',
  massUnit: 'lb',
  reason: 'leak_top_up',
  ...rest,
});
const written = async (rest: Record<string, unknown> = {}) =>
  additionSchema.parse(await (await add(token, body(rest))).json());
const faults = async (response: Response): Promise<string[]> => {
  expect(response.status).toBe(400);
  const { errors }: { errors: { path: string }[] } = await response.json();
  return errors.map(({ path }) => path);
};

test('keeps the exact mass and what was typed', async () => {
  const addition = await written();
  // 12.50 lb × 0.45359237 kg (exact), to the gram.
  expect(addition).toMatchObject({ addedCharge: 5.67, enteredMass: '12.50', massUnit: 'lb', version: 1 });
  const [entry] = (await entriesOf(ours.companyId, 'charge_additions', 'insert')).slice(-1);
  expect(entry?.after?.added_charge_kg).toBe(5.669904625);
});

test('reads pounds and ounces', async () => {
  // 12 lb 6 oz = 12.375 lb = 5.613205579 kg, worked by hand.
  expect((await written({ addedCharge: '12-6', massUnit: 'lb-oz' })).addedCharge).toBe(5.613);
});

test.each([
  [{ addedCharge: '0' }, 'addedCharge'],
  [{ addedCharge: '-3' }, 'addedCharge'],
  [{ addedCharge: 'a lot' }, 'addedCharge'],
  [{ addedCharge: '3-17', massUnit: 'lb-oz' }, 'addedCharge'],
  [{ addedOn: '2999-01-01' }, 'addedOn'],
  [{ addedOn: '2026-02-30' }, 'addedOn'],
  [{ leaksVerifiedOn: '2026-05-26' }, 'leaksVerifiedOn'],
  [{ reason: 'because' }, 'reason'],
  [{ applianceId: randomUUID() }, 'applianceId'],
  [{ notes: 'x'.repeat(501) }, 'notes'],
])('refuses %j at its field', async (wrong, path) => {
  expect(await faults(await add(token, body(wrong)))).toContain(path);
});

test('an appliance of another company is no appliance', async () => {
  const foreign = (await newPlaces(theirs.scope)).applianceId;
  expect(await faults(await add(token, body({ applianceId: foreign })))).toEqual(['applianceId']);
});

test('the same key writes once, and refuses something else', async () => {
  const key = { 'idempotency-key': randomUUID() };
  const first = additionSchema.parse(await (await add(token, body(), key)).json());
  const again = await add(token, body(), key);
  expect(again.headers.get('idempotency-replayed')).toBe('true');
  expect(additionSchema.parse(await again.json()).id).toBe(first.id);
  expect((await add(token, body({ addedCharge: '9' }), key)).status).toBe(409);
});

test('a ref is taken once', async () => {
  await written({ additionRef: 'WO-17' });
  expect((await add(token, body({ additionRef: 'WO-17' }))).status).toBe(409);
});

test('a correction names the version, says why and stays in the history', async () => {
  const { id, version } = await written();
  const change = (rest: object) =>
    PATCH(sent(`/api/charge-additions/${id}`, token, { version, why: 'misread the scale', ...rest }, 'PATCH'), at(id));
  expect(await faults(await change({ addedCharge: '3' }))).toEqual(['massUnit']);
  const corrected = additionSchema.parse(await (await change({ addedCharge: '3', massUnit: 'kg' })).json());
  expect(corrected).toMatchObject({ addedCharge: 3, massUnit: 'kg', addedOn: '2026-05-27', version: 2 });
  expect((await change({ notes: 'late' })).status).toBe(409);
  const response = await getChanges(
    apiRequest(`/api/charge-additions/changes?appliance=${applianceId}`, token),
    undefined,
  );
  const [last] = additionChanges.response.parse(await response.json()).items;
  expect(last).toMatchObject({ action: 'update', why: 'misread the scale', additionId: id });
  expect([last?.before?.addedCharge, last?.after?.addedCharge]).toEqual(['12.50 lb', '3 kg']);
});

test('a removal says why; what it said stays in the history', async () => {
  const { id } = await written({ notes: 'twice' });
  const remove = (query: string) =>
    DELETE(apiRequest(`/api/charge-additions/${id}?${query}`, token, { method: 'DELETE' }), at(id));
  expect((await remove('version=1')).status).toBe(400);
  expect((await remove('version=1&why=typed+twice')).status).toBe(200);
  expect((await remove('version=1&why=typed+twice')).status).toBe(404);
  const [gone] = (await entriesOf(ours.companyId, 'charge_additions', 'delete')).slice(-1);
  expect(gone).toMatchObject({ row_id: id, reason: 'typed twice', before: { notes: 'twice' } });
  expect(await firstBroken(ours.companyId)).toBeNull();
});

test('lists page by page, the newest first', async () => {
  const company = await newCompany();
  const office = await company.token('office');
  const place = await newPlaces(company.scope);
  for (const day of ['2026-01-05', '2026-03-05', '2026-02-05'])
    await add(office, body({ applianceId: place.applianceId, addedOn: day }));
  const page = async (query: string) =>
    additionsList.response.parse(
      await (await getList(apiRequest(`/api/charge-additions?${query}`, office), undefined)).json(),
    );
  const first = await page('limit=2');
  expect(first.items.map(({ addedOn }) => addedOn)).toEqual(['2026-03-05', '2026-02-05']);
  const second = await page(`limit=2&cursor=${first.nextCursor}`);
  expect(second).toMatchObject({ items: [{ addedOn: '2026-01-05' }], nextCursor: null });
  expect((await page('from=2026-02&to=2026-02')).items).toHaveLength(1);
  expect((await page(`site=${place.siteId}`)).items).toHaveLength(3);
  expect((await page(`appliance=${randomUUID()}`)).items).toHaveLength(0);
});
