import { expect, test } from 'vitest';
import { noteSchema, notesList } from '@/analytics/notes/contract';
import { DELETE, PATCH } from '@/app/api/notes/[id]/route';
import { GET, POST } from '@/app/api/notes/route';
import { apiRequest, newCompany } from '../support/company';
import { entriesOf } from '../support/history';

const company = await newCompany();
const token = await company.token('operations');
const other = await newCompany();

const sent = (method: string, body: unknown) => ({ method, body: JSON.stringify(body) });
const list = async (query = '', who = token) => {
  const response = await GET(apiRequest(`/api/notes${query}`, who), undefined);
  expect(response.status).toBe(200);
  return notesList.response.parse(await response.json());
};
const pin = async (body: unknown) => {
  const response = await POST(apiRequest('/api/notes', token, sent('POST', body)), undefined);
  return { status: response.status, body: await response.json() };
};
const context = (id: string) => ({ params: Promise.resolve({ id }) });
const change = async (id: string, body: unknown) => {
  const response = await PATCH(apiRequest(`/api/notes/${id}`, token, sent('PATCH', body)), context(id));
  return { status: response.status, body: await response.json() };
};
const remove = async (id: string, query: string) =>
  (await DELETE(apiRequest(`/api/notes/${id}${query}`, token, { method: 'DELETE' }), context(id))).status;

test('a note is pinned, found by the days it touches, changed and taken away', async () => {
  const strike = noteSchema.parse(
    (await pin({ from: '2026-03-30', to: '2026-04-02', text: '  Strike at the reclaimer  ' })).body,
  );
  const pump = noteSchema.parse((await pin({ from: '2026-05-01', text: 'New pumps' })).body);
  expect(strike).toMatchObject({ text: 'Strike at the reclaimer', version: 1, writtenBy: 'program “test operations”' });
  expect([pump.from, pump.to]).toEqual(['2026-05-01', '2026-05-01']);

  const found = async (query: string) => (await list(query)).items.map(({ text }) => text);
  expect(await found('')).toEqual(['Strike at the reclaimer', 'New pumps']);
  // Four days over the end of March: both months show them, the months around do not.
  expect(await found('?from=2026-03&to=2026-03')).toEqual(['Strike at the reclaimer']);
  expect(await found('?from=2026-04-02&to=2026-04-30')).toEqual(['Strike at the reclaimer']);
  expect(await found('?from=2026-04-03&to=2026-04')).toEqual([]);
  expect(await found('?to=2026-03-29')).toEqual([]);
  expect(await found('?from=2026-05')).toEqual(['New pumps']);

  expect((await change(strike.id, { version: 1, to: '2026-04-05' })).body).toMatchObject({
    from: '2026-03-30',
    to: '2026-04-05',
    version: 2,
  });
  expect((await change(strike.id, { version: 1, text: 'Late' })).status).toBe(409);
  expect(await remove(strike.id, '?version=1')).toBe(409);
  expect(await remove(strike.id, '?version=2')).toBe(200);
  expect(await remove(strike.id, '?version=2')).toBe(404);
  expect((await list()).total).toBe(1);
  const gone = await entriesOf(company.companyId, 'notes', 'delete');
  expect(gone.map(({ before }) => before?.text)).toEqual(['Strike at the reclaimer']);
});

test('another company neither sees nor changes a note', async () => {
  const mine = noteSchema.parse((await pin({ from: '2026-06-01', text: 'Mine' })).body);
  const foreign = await other.token('owner');
  expect((await list('', foreign)).items).toEqual([]);
  const attempt = await PATCH(
    apiRequest(`/api/notes/${mine.id}`, foreign, sent('PATCH', { version: 1, text: 'x' })),
    context(mine.id),
  );
  expect(attempt.status).toBe(404);
});

test.each([
  [{ from: '2026-02-30', text: 'x' }, 'from'],
  [{ from: '2026-02', text: 'x' }, 'from'],
  [{ text: 'x' }, 'from'],
  [{ from: '2026-02-02', to: '2026-02-01', text: 'x' }, 'to'],
  [{ from: '2026-02-02', text: '   ' }, 'text'],
  [{ from: '2026-02-02', text: 'x'.repeat(501) }, 'text'],
  [{ from: '2026-02-02', text: 'a\0b' }, 'text'],
  [{ from: '2026-02-02' }, 'text'],
  [{ from: '2026-02-02', text: 'x', colour: 'red' }, ''],
])('refuses %j with its path', async (body, path) => {
  const answer = await pin(body);
  expect([answer.status, answer.body.errors?.[0]?.path]).toEqual([400, path]);
});

test('a change that would turn the days around is refused, whichever end it names', async () => {
  const note = noteSchema.parse((await pin({ from: '2026-07-10', to: '2026-07-12', text: 'Days' })).body);
  for (const [body, path] of [
    [{ version: 1, from: '2026-07-13' }, 'from'],
    [{ version: 1, to: '2026-07-09' }, 'to'],
    [{ version: 1, from: '2026-07-20', to: '2026-07-19' }, 'to'],
  ] as const) {
    const answer = await change(note.id, body);
    expect([answer.status, answer.body.errors?.[0]?.path]).toEqual([400, path]);
  }
  expect(await remove(note.id, '')).toBe(400);
  expect(await remove(note.id, '?version=x')).toBe(400);
});

test('the office reads notes and writes none; technicians and auditors see none', async () => {
  const office = await company.token('office');
  expect((await list('', office)).total).toBeGreaterThan(0);
  const body = sent('POST', { from: '2026-06-01', text: 'x' });
  expect((await POST(apiRequest('/api/notes', office, body), undefined)).status).toBe(403);
  for (const role of ['technician', 'auditor'] as const)
    expect((await GET(apiRequest('/api/notes', await company.token(role)), undefined)).status).toBe(403);
});
