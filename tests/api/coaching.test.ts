import { expect, test } from 'vitest';
import { coachingList, coachingSchema } from '@/analytics/coaching/contract';
import { getCoachings } from '@/analytics/coaching/query';
import { DELETE, PATCH } from '@/app/api/coaching/[id]/route';
import { GET, POST } from '@/app/api/coaching/route';
import { withCompany } from '@/db/client';
import { technicians } from '@/db/schema/places';
import { apiRequest, newCompany } from '../support/company';
import { entriesOf } from '../support/history';

const company = await newCompany();
const token = await company.token('trainer');
const foreign = await (await newCompany()).token('owner');

const named = (name: string) =>
  withCompany(company.scope, async (tx) => {
    const values = { companyId: company.companyId, name };
    const [row] = await tx.insert(technicians).values(values).returning({ id: technicians.id });
    if (!row) throw new Error('A technician that was written has no id');
    return row.id;
  });
const technicianId = await named('Ada Brandt');
const colleagueId = await named('Bo Ferris');

const sent = (method: string, body: unknown) => ({ method, body: JSON.stringify(body) });
const context = (id: string) => ({ params: Promise.resolve({ id }) });
const list = async (query = '', who = token) =>
  coachingList.response.parse(await (await GET(apiRequest(`/api/coaching${query}`, who), undefined)).json()).items;
const write = async (body: unknown, who = token) => {
  const response = await POST(apiRequest('/api/coaching', who, sent('POST', body)), undefined);
  return { status: response.status, body: await response.json() };
};
const change = async (id: string, body: unknown, who = token) => {
  const response = await PATCH(apiRequest(`/api/coaching/${id}`, who, sent('PATCH', body)), context(id));
  return { status: response.status, body: await response.json() };
};
const remove = async (id: string, query: string) =>
  (await DELETE(apiRequest(`/api/coaching/${id}${query}`, token, { method: 'DELETE' }), context(id))).status;

test('a coaching is written, ended with an outcome, opened again and taken away', async () => {
  const begun = coachingSchema.parse(
    (await write({ technicianId, startedOn: '2026-03-02', plan: ' Wait out the hold ' })).body,
  );
  expect(begun).toMatchObject({ plan: 'Wait out the hold', endedOn: null, outcome: null, version: 1 });
  await write({ technicianId: colleagueId, startedOn: '2026-04-01', plan: 'Core tools out' });
  expect((await list(`?technicianId=${technicianId}`)).map(({ plan }) => plan)).toEqual(['Wait out the hold']);
  expect((await list()).map(({ plan }) => plan)).toEqual(['Core tools out', 'Wait out the hold']);

  const ended = { endedOn: '2026-06-01', outcome: 'Holds are made' };
  expect((await change(begun.id, { version: 1, ...ended })).body).toMatchObject({ ...ended, version: 2 });
  expect((await change(begun.id, { version: 1, plan: 'late' })).status).toBe(409);
  const reopened = await change(begun.id, { version: 2, endedOn: null, outcome: null });
  expect(reopened.body).toMatchObject({ endedOn: null, outcome: null, plan: 'Wait out the hold', version: 3 });
  expect(await remove(begun.id, '?version=2')).toBe(409);
  expect(await remove(begun.id, '?version=3')).toBe(200);
  expect(await list(`?technicianId=${technicianId}`)).toEqual([]);
  const gone = await entriesOf(company.companyId, 'coaching', 'delete');
  expect(gone.map(({ before }) => before?.plan)).toEqual(['Wait out the hold']);
});

test('another company neither sees nor changes a coaching', async () => {
  const mine = coachingSchema.parse((await write({ technicianId, startedOn: '2026-05-01', plan: 'Mine' })).body);
  expect(await list('', foreign)).toEqual([]);
  expect((await change(mine.id, { version: 1, plan: 'x' }, foreign)).status).toBe(404);
  expect((await write({ technicianId, startedOn: '2026-05-01', plan: 'x' }, foreign)).status).toBe(400);
});

test('a technician reads what was agreed with him and nothing of his colleagues', async () => {
  const own = await withCompany({ ...company.scope, technicianId: colleagueId }, (tx) => getCoachings(tx, {}));
  expect(new Set(own.items.map((item) => item.technicianId))).toEqual(new Set([colleagueId]));
});

test.each([
  [{ technicianId, startedOn: '2026-02-30', plan: 'x' }, 'startedOn'],
  [{ technicianId, startedOn: '2026-02-02', plan: '  ' }, 'plan'],
  [{ technicianId, startedOn: '2026-02-02', plan: 'x'.repeat(2001) }, 'plan'],
  [{ technicianId: 'Ada', startedOn: '2026-02-02', plan: 'x' }, 'technicianId'],
])('%j is refused where it is wrong', async (body, path) => {
  const { status, body: problem } = await write(body);
  expect(status).toBe(400);
  expect(problem.errors.map((error: { path: string }) => error.path)).toContain(path);
});

test.each([
  [{ endedOn: '2026-01-01', outcome: 'Before it began' }, 'endedOn'],
  [{ endedOn: '2026-09-01' }, 'outcome'],
  [{ outcome: 'No day' }, 'endedOn'],
  [{ endedOn: '2026-09-01', outcome: null }, 'outcome'],
])('an end of %j is refused where it is wrong', async (end, path) => {
  const begun = coachingSchema.parse((await write({ technicianId, startedOn: '2026-08-01', plan: 'A plan' })).body);
  const { status, body: problem } = await change(begun.id, { version: 1, ...end });
  expect(status).toBe(400);
  expect(problem.errors.map((error: { path: string }) => error.path)).toContain(path);
});
