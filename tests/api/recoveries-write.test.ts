import { sql } from 'drizzle-orm';
import { beforeAll, expect, test } from 'vitest';
import type { RecordDetail, RecordHistory } from '@/analytics/records/contract';
import { GET as getHistoryRoute } from '@/app/api/recoveries/[id]/history/route';
import { GET, PATCH } from '@/app/api/recoveries/[id]/route';
import { POST } from '@/app/api/recoveries/route';
import { withCompany } from '@/db/client';
import { apiRequest, newCompany } from '../support/company';
import { newPlaces, type Places } from '../support/ticket-records';

let company: Awaited<ReturnType<typeof newCompany>>;
let places: Places;
let token: string;
let count = 0;

const body = (fields: Record<string, unknown> = {}) => ({
  recordRef: `W-${++count}`,
  recoveredAt: '2026-03-10',
  technician: 'Robin Vale',
  site: 'Mill Street School',
  appliance: 'RTU-1',
  refrigerant: 'R-410A',
  nameplateCharge: '12.5',
  startWeight: '17.5',
  endWeight: '28.2',
  massUnit: 'lb',
  ...fields,
});
const send = (method: string, content: unknown, headers: Record<string, string> = {}): RequestInit => ({
  method,
  body: JSON.stringify(content),
  headers: { 'content-type': 'application/json', ...headers },
});
const post = (content: unknown, headers: Record<string, string> = {}, asToken = token) =>
  POST(apiRequest('/api/recoveries', asToken, send('POST', content, headers)), undefined);
const at = (id: string) => ({ params: Promise.resolve({ id }) });
const patch = (id: string, content: unknown, asToken = token) =>
  PATCH(apiRequest(`/api/recoveries/${id}`, asToken, send('PATCH', content)), at(id));
const get = (id: string, asToken = token) => GET(apiRequest(`/api/recoveries/${id}`, asToken), at(id));
const written = async (fields: Record<string, unknown> = {}): Promise<RecordDetail> => {
  const response = await post(body(fields));
  expect(response.status).toBe(201);
  return (await response.json()) as RecordDetail;
};
const faults = async (response: Response): Promise<Record<string, string>> => {
  expect(response.status).toBe(400);
  const { errors } = (await response.json()) as { errors: { path: string; message: string }[] };
  return Object.fromEntries(errors.map(({ path, message }) => [path, message]));
};

beforeAll(async () => {
  company = await newCompany();
  token = await company.token('owner');
  places = await newPlaces(company.scope);
});

// 1 lb = 0.45359237 kg exactly (NIST SP 811, appendix B.8): 12.5 lb = 5.670 kg, 10.7 lb = 4.853 kg.
test('a record is written in the units typed and read in kilograms', async () => {
  const record = await written({ finalVacuum: 29, vacuumUnit: 'inhg', holdMinutes: 5, cylinder: 'C-100' });
  expect(record).toMatchObject({
    fullCharge: 5.67,
    recoveredMass: 4.853,
    startWeight: 7.938,
    massUnit: 'lb',
    cylinder: 'C-100',
    version: 1,
    source: null,
    entered: { nameplateCharge: '12.5', startWeight: '17.5', recoveredMass: '', finalVacuum: '29', holdRise: '' },
  });
  expect(record.yield).toBeCloseTo(10.7 / 12.5, 9);
  // 101.325 kPa - 29 x 3.386389 kPa (NIST SP 811: conventional inch of mercury)
  expect(record.finalVacuumKpaAbs).toBeCloseTo(3.119719, 6);
  expect(await (await get(record.id)).json()).toEqual(record);
});

test('masses without a unit are kilograms, as everywhere in the API', async () => {
  const record = await written({
    massUnit: undefined,
    startWeight: undefined,
    endWeight: undefined,
    recoveredMass: 4.2,
  });
  expect(record).toMatchObject({ recoveredMass: 4.2, massUnit: 'kg' });
});

test('spellings of one refrigerant are one', async () => {
  expect((await written({ refrigerant: '410a' })).refrigerant).toBe('R-410A');
  expect((await written({ refrigerant: 'R22' })).refrigerant).toBe('R-22');
});

test('a time of day is an instant in the company’s zone, its date the local one', async () => {
  // New York is at UTC-4 in July: 22:30 there is the next day in UTC.
  expect(await written({ recoveredAt: '2026-07-01T22:30' })).toMatchObject({
    recoveredOn: '2026-07-01',
    recoveredAt: '2026-07-02T02:30:00.000Z',
    entered: { recoveredAt: '2026-07-01T22:30:00' },
  });
});

test.each([
  [{ recordRef: '' }, 'recordRef', 'missing'],
  [{ recoveredAt: '10.03.2026' }, 'recoveredAt', 'no date'],
  [{ recoveredAt: '2026-02-30' }, 'recoveredAt', 'no date'],
  [{ recoveredAt: '2999-01-01' }, 'recoveredAt', 'after today'],
  [{ refrigerant: 'R-9999' }, 'refrigerant', 'R-9999'],
  [{ nameplateCharge: '0' }, 'nameplateCharge', 'above zero'],
  [{ nameplateCharge: '12,5' }, 'nameplateCharge', 'no mass'],
  [{ nameplateCharge: '-3' }, 'nameplateCharge', 'below zero'],
  [{ nameplateCharge: '1e9' }, 'nameplateCharge', 'no mass'],
  [{ nameplateCharge: '999999999999' }, 'nameplateCharge', 'tonnes'],
  [{ massUnit: 'stone' }, 'massUnit', 'stone'],
  [{ massUnit: 'lb-oz', nameplateCharge: '12-16' }, 'nameplateCharge', 'no mass'],
  [{ endWeight: '17.4' }, 'endWeight', 'below the start'],
  [{ endWeight: '' }, 'recoveredMass', 'both weights'],
  [{ startWeight: '', endWeight: '' }, 'recoveredMass', 'Neither'],
  [{ recoveredMass: '11.0' }, 'recoveredMass', '10.7 lb'],
  [{ finalVacuum: '29' }, 'finalVacuum', 'unit'],
  [{ finalVacuum: '31', vacuumUnit: 'inhg' }, 'finalVacuum', 'lies between'],
  [{ finalVacuum: '-20', vacuumUnit: 'inhg' }, 'finalVacuum', 'lies between'],
  [{ holdRise: '99999999999', vacuumUnit: 'psig' }, 'holdRise', 'impossible'],
  [{ holdMinutes: '-1' }, 'holdMinutes', 'impossible'],
  [{ jobType: 'party' }, 'jobType', 'repair'],
  [{ manufacturedOn: 'last year' }, 'manufacturedOn', 'no date'],
  [{ notes: 'nul \0 inside' }, 'notes', 'no text'],
  [{ site: 'x'.repeat(201) }, 'site', 'longer'],
  [{ technician: 'Sam Unknown' }, 'technician', 'not known yet'],
  [{ appliance: 'RTU-2' }, 'appliance', 'not known yet'],
  [{ color: 'red' }, '', 'color'],
])('%j is refused at its field', async (fields, path, sentence) => {
  expect((await faults(await post(body(fields))))[path]).toContain(sentence);
});

test('weights and recovered mass agree within one step of the scale', async () => {
  expect((await written({ recoveredMass: '10.8' })).recoveredMass).toBe(4.899);
  expect(await faults(await post(body({ recoveredMass: '11.0' })))).toHaveProperty('recoveredMass');
  const whole = { startWeight: 10, endWeight: 14, recoveredMass: 5, massUnit: 'kg', nameplateCharge: 9 };
  expect(await faults(await post(body(whole)))).toHaveProperty('recoveredMass');
});

test('every fault is told at once', async () => {
  const told = await faults(await post(body({ recordRef: '', nameplateCharge: 'lots', jobType: 'party' })));
  expect(Object.keys(told).sort()).toEqual(['jobType', 'nameplateCharge', 'recordRef']);
});

test('what is no JSON object is refused with 400', async () => {
  const response = await POST(apiRequest('/api/recoveries', token, { method: 'POST', body: '{' }), undefined);
  expect(response.status).toBe(400);
});

test('unknown names are created once somebody confirms them', async () => {
  const names = { technician: 'Pat New', site: 'New Hall', appliance: 'AC 1', branch: 'East', cylinder: 'C-7' };
  expect(Object.keys(await faults(await post(body(names)))).sort()).toEqual([
    'branch',
    'cylinder',
    'site',
    'technician',
  ]);
  expect(await written({ ...names, createNames: true })).toMatchObject(names);
  // Letters lowered and white space folded, two spellings are one name.
  expect(await written({ ...names, technician: ' pat  NEW ' })).toMatchObject(names);
});

test('a record ref is taken once in a company, and free in another', async () => {
  const { recordRef } = await written();
  const again = await post(body({ recordRef }));
  expect(again.status).toBe(409);
  expect(await again.json()).toMatchObject({ errors: [{ path: 'recordRef' }] });
  const other = await newCompany();
  await newPlaces(other.scope);
  expect((await post(body({ recordRef }), {}, await other.token('owner'))).status).toBe(201);
});

test('the same Idempotency-Key writes one record, also when two come at once', async () => {
  const content = body();
  const key = { 'idempotency-key': 'phone-1' };
  const responses = await Promise.all([post(content, key), post(content, key)]);
  const records = (await Promise.all(responses.map((response) => response.json()))) as RecordDetail[];
  expect(responses.map((response) => response.status)).toEqual([201, 201]);
  expect(records[0]?.id).toBe(records[1]?.id);
  const third = await post(content, key);
  expect(third.headers.get('idempotency-replayed')).toBe('true');
  expect(((await third.json()) as RecordDetail).id).toBe(records[0]?.id);
  expect((await post(body(), key)).status).toBe(409);
  expect((await post(body(), { 'idempotency-key': 'x'.repeat(256) })).status).toBe(400);
});

test('a correction changes only what it names, and the history tells it', async () => {
  const record = await written({ notes: 'first' });
  const corrected = await patch(record.id, {
    version: 1,
    reason: 'Ounces were read as pounds',
    changes: { nameplateCharge: '14.5', massUnit: 'oz', startWeight: '1.0', endWeight: 9, site: 'mill street school' },
  });
  expect(corrected.status).toBe(200);
  const now = (await corrected.json()) as RecordDetail;
  expect(now).toMatchObject({ version: 2, massUnit: 'oz', recoveredMass: 0.227, notes: 'first' });
  const response = await getHistoryRoute(apiRequest('/x', token), at(record.id));
  const { items } = (await response.json()) as RecordHistory;
  expect(items.map(({ action, reason, who }) => ({ action, reason, who }))).toEqual([
    { action: 'update', reason: 'Ounces were read as pounds', who: 'program “test owner”' },
    { action: 'insert', reason: null, who: 'program “test owner”' },
  ]);
  expect(items[0]?.changes).toEqual([
    { field: 'nameplateCharge', before: '12.5 lb', after: '14.5 oz' },
    { field: 'startWeight', before: '17.5 lb', after: '1.0 oz' },
    { field: 'endWeight', before: '28.2 lb', after: '9 oz' },
    { field: 'recoveredMass', before: '10.7 lb', after: '8 oz' },
    { field: 'massUnit', before: 'lb', after: 'oz' },
  ]);
  expect(items[1]?.changes).toContainEqual({ field: 'technician', before: null, after: 'Robin Vale' });
  const broken = await withCompany(company.scope, (tx) => tx.execute(sql`select history_break() as entry`));
  expect(broken.rows).toEqual([{ entry: null }]);
});

test('a correction of an older version is refused, and says who was faster', async () => {
  const record = await written();
  const change = (notes: string) => ({ version: 1, reason: 'a note', changes: { notes } });
  expect((await patch(record.id, change('one'))).status).toBe(200);
  const late = await patch(record.id, change('two'));
  expect(late.status).toBe(409);
  expect((await late.json()) as { detail: string }).toMatchObject({
    detail: expect.stringMatching(/^Program “test owner” changed this record on \d{4}-\d\d-\d\d at \d\d:\d\d since/),
  });
  expect(await (await get(record.id)).json()).toMatchObject({ notes: 'one', version: 2 });
});

test('of two corrections at once only one is taken', async () => {
  const { id } = await written();
  const both = ['one', 'two'].map((notes) => patch(id, { version: 1, reason: 'a note', changes: { notes } }));
  expect((await Promise.all(both)).map((response) => response.status).sort()).toEqual([200, 409]);
});

test.each([
  [{ version: 1, changes: { notes: 'x' } }, 'reason'],
  [{ version: 1, reason: ' a ', changes: { notes: 'x' } }, 'reason'],
  [{ version: 1, reason: 'because', changes: {} }, 'changes'],
  [{ reason: 'because', changes: { notes: 'x' } }, 'version'],
  [{ version: 1, reason: 'because', changes: { weight: '3' } }, 'changes'],
  [{ version: 1, reason: 'because', changes: { nameplateCharge: '' } }, 'nameplateCharge'],
])('correction %j is refused at %s', async (content, path) => {
  const { id } = await written();
  expect(await faults(await patch(id, content))).toHaveProperty(path);
});

test('a field is emptied with null', async () => {
  const { id } = await written({ cylinder: 'C-100', notes: 'x' });
  const response = await patch(id, { version: 1, reason: 'wrong note', changes: { cylinder: null, notes: '' } });
  expect(await response.json()).toMatchObject({ cylinder: null, notes: null });
});

test('what belongs to another company, or to nobody, is not there', async () => {
  const { id } = await written();
  const other = await (await newCompany()).token('owner');
  const change = { version: 1, reason: 'mischief', changes: { notes: 'x' } };
  expect((await get(id, other)).status).toBe(404);
  expect((await patch(id, change, other)).status).toBe(404);
  expect((await getHistoryRoute(apiRequest('/x', other), at(id))).status).toBe(404);
  for (const nobody of ['7', '00000000-0000-4000-8000-000000000000', "' or true --"])
    expect((await get(nobody)).status).toBe(404);
});

test('a technician writes and corrects his own records, and no other’s', async () => {
  const own = await company.token('technician', places.technicianId);
  const mine = await post(body({ technician: undefined }), {}, own);
  expect(mine.status).toBe(201);
  const record = (await mine.json()) as RecordDetail;
  expect(record.technician).toBe('Robin Vale');
  const change = { version: 1, reason: 'note', changes: { notes: 'mine' } };
  expect((await patch(record.id, change, own)).status).toBe(200);
  expect(await faults(await post(body({ technician: 'Kim Arden' }), {}, own))).toHaveProperty('technician');
  const others = await written({ technician: 'Kim Arden' });
  expect((await get(others.id, own)).status).toBe(404);
  expect((await patch(others.id, change, own)).status).toBe(404);
  const away = { version: 2, reason: 'note', changes: { technician: 'Kim Arden' } };
  expect(await faults(await patch(record.id, away, own))).toHaveProperty('technician');
  expect((await post(body(), {}, await company.token('technician'))).status).toBe(403);
});

test.each(['trainer', 'auditor'] as const)('a %s reads records and writes none', async (role) => {
  const reader = await company.token(role);
  const { id } = await written();
  expect((await get(id, reader)).status).toBe(200);
  expect((await post(body(), {}, reader)).status).toBe(403);
  expect((await patch(id, { version: 1, reason: 'note', changes: { notes: 'x' } }, reader)).status).toBe(403);
});
