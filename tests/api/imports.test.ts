import { randomUUID } from 'node:crypto';
import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { POST as apply } from '@/app/api/imports/[id]/apply/route';
import { POST as preview } from '@/app/api/imports/[id]/preview/route';
import { GET as getRefused } from '@/app/api/imports/[id]/rejected.csv/route';
import { GET as getImport } from '@/app/api/imports/[id]/route';
import { POST as undo } from '@/app/api/imports/[id]/undo/route';
import { GET as list, POST as upload } from '@/app/api/imports/route';
import { withCompany } from '@/db/client';
import { importListSchema } from '@/lib/imports/contract';
import { MOST_FILE_BYTES } from '@/lib/imports/multipart';
import { type RunningWorker, startWorker } from '@/lib/jobs/worker';
import { apiRequest, newCompany } from '../support/company';
import { at, look, send, settled, takeBack, takeIn } from '../support/imports';
import { recoveryFile } from '../support/recovery-file';
import { countOf, tableContents } from '../support/tables';

const FILE = [...recoveryFile(40)].join('');

let worker: RunningWorker;
let company: Awaited<ReturnType<typeof newCompany>>;
let token: string;
beforeAll(async () => {
  worker = startWorker();
  company = await newCompany();
  token = await company.token('office');
});
afterAll(() => worker.stop());

test('a file is promised at once and taken in by the queue', async () => {
  const response = await send(token, FILE, { fileName: 'Täglich 2014.csv' });
  expect(response.status).toBe(202);
  const { id } = (await response.json()) as { id: string };
  const view = await settled(token, id);
  expect(view).toMatchObject({ status: 'done', rowsRead: 40, rowsTotal: 40, added: 40, updated: 0, unchanged: 0 });
  expect(view).toMatchObject({ rejected: 0, fileName: 'Täglich 2014.csv', fileSize: FILE.length, failure: null });
  expect(view.summary?.newNames.branches).toEqual({ count: 3, examples: expect.arrayContaining(['Branch 0']) });
  expect(await countOf(company.companyId, 'recoveries')).toBe(40);
});

test('a preview tells what would come and changes no record; then the file is taken in', async () => {
  const other = await newCompany();
  const otherToken = await other.token('owner');
  const before = await tableContents(other.companyId);
  const seen = await takeIn(otherToken, FILE, { dryRun: true });
  expect(seen).toMatchObject({ status: 'done', dryRun: true, rowsRead: 40, added: 40 });
  expect(await tableContents(other.companyId)).toEqual(before);
  expect((await takeBack(otherToken, seen.id)).status).toBe(409);
  const again = await preview(
    apiRequest(`/api/imports/${seen.id}/preview`, otherToken, { method: 'POST', body: '{"mapping":{}}' }),
    at(seen.id),
  );
  expect(again.status).toBe(202);
  expect(await settled(otherToken, seen.id)).toMatchObject({ status: 'done', dryRun: true, added: 40 });
  const taken = await apply(apiRequest(`/api/imports/${seen.id}/apply`, otherToken, { method: 'POST' }), at(seen.id));
  expect(taken.status).toBe(202);
  expect(await settled(otherToken, seen.id)).toMatchObject({ status: 'done', dryRun: false, added: 40 });
  expect(await countOf(other.companyId, 'recoveries')).toBe(40);
  const twice = await apply(apiRequest(`/api/imports/${seen.id}/apply`, otherToken, { method: 'POST' }), at(seen.id));
  expect(twice.status).toBe(409);
});

test('an undone import cannot be undone again', async () => {
  const other = await newCompany();
  const otherToken = await other.token('operations');
  const { id } = await takeIn(otherToken, FILE);
  const response = await takeBack(otherToken, id);
  expect(response.status).toBe(200);
  expect(await response.json()).toMatchObject({ id, status: 'undone', added: 40 });
  expect(await countOf(other.companyId, 'recoveries')).toBe(0);
  expect((await takeBack(otherToken, id)).status).toBe(409);
});

test('the history tells who took a file in and who took it back, and its chain is whole', async () => {
  const other = await newCompany();
  const [office, owner] = [await other.token('office'), await other.token('owner')];
  const { id } = await takeIn(office, FILE, { fileName: 'May.csv' });
  expect((await takeBack(owner, id)).status).toBe(200);
  const { rows } = await withCompany(other.scope, (tx) =>
    tx.execute(sql`
      select action, reason, count(*)::int as entries, count(distinct actor)::int as actors,
             bool_and(actor like 'token %') as by_token, (select history_break() is null) as whole
      from history where table_name = 'recoveries' group by action, reason order by action desc`),
  );
  expect(rows).toEqual([
    { action: 'insert', reason: 'import of May.csv', entries: 40, actors: 1, by_token: true, whole: true },
    { action: 'delete', reason: `undo of import ${id}`, entries: 40, actors: 1, by_token: true, whole: true },
  ]);
});

test('the same Idempotency-Key is the same upload, also when it comes twice at once', async () => {
  const headers = { 'idempotency-key': randomUUID() };
  const answers = await Promise.all([send(token, FILE, { headers }), send(token, FILE, { headers })]);
  expect(answers.map(({ status }) => status)).toEqual([202, 202]);
  const [first, second] = await Promise.all(answers.map((answer) => answer.json()));
  expect(second).toEqual(first);
  expect((await send(token, `${FILE}\n`, { headers })).status).toBe(409);
  await settled(token, (first as { id: string }).id);
});

test('the list has pages, newest first', async () => {
  const page = async (query: string) =>
    importListSchema.parse(await (await list(apiRequest(`/api/imports${query}`, token), {})).json());
  const whole = await page('');
  const ids: string[] = [];
  for (let cursor: string | null = ''; cursor !== null; ) {
    const part: Awaited<ReturnType<typeof page>> = await page(`?limit=1${cursor ? `&cursor=${cursor}` : ''}`);
    ids.push(...part.items.map(({ id }) => id));
    cursor = part.nextCursor;
  }
  expect(ids).toEqual(whole.items.map(({ id }) => id));
  expect(ids.length).toBeGreaterThan(1);
  expect((await list(apiRequest('/api/imports?cursor=nonsense', token), {})).status).toBe(400);
});

test('what is no upload is refused with a sentence', async () => {
  const post = (body: BodyInit, headers: Record<string, string> = {}) =>
    upload(apiRequest('/api/imports', token, { method: 'POST', body, headers }), {});
  const form = (entries: Record<string, string | Blob>) => {
    const data = new FormData();
    for (const [name, value] of Object.entries(entries)) data.set(name, value);
    return data;
  };
  const file = new Blob([FILE]);
  expect((await post('{}', { 'content-type': 'application/json' })).status).toBe(400);
  expect((await post('--x\r\ngarbage', { 'content-type': 'multipart/form-data; boundary=x' })).status).toBe(400);
  expect((await post(form({ note: 'no file here' }))).status).toBe(400);
  expect((await post(form({ file, mapping: '{' }))).status).toBe(400);
  expect((await post(form({ file, mapping: '{"delimiter":"|"}' }))).status).toBe(400);
  expect((await post(form({ file, dryRun: 'perhaps' }))).status).toBe(400);
  const empty = await post(form({ file: new Blob([]) }));
  expect(empty.status).toBe(422);
  expect(await empty.json()).toMatchObject({ status: 422, detail: expect.stringContaining('empty') });
  const headers = { 'content-length': String(MOST_FILE_BYTES * 2) };
  expect((await post(form({ file }), headers)).status).toBe(413);
});

test('a file over the limit is refused while it streams, without a length told before', async () => {
  const piece = new TextEncoder().encode([...recoveryFile(1000)].join(''));
  const head = '--x\r\nContent-Disposition: form-data; name="file"; filename="a.csv"\r\n\r\n';
  let sent = 0;
  const body = new ReadableStream<Uint8Array>({
    pull: (controller) => {
      controller.enqueue(sent === 0 ? new TextEncoder().encode(head) : piece);
      sent += piece.length;
      if (sent > MOST_FILE_BYTES * 1.5) controller.close();
    },
  });
  const init = { method: 'POST', body, duplex: 'half', headers: { 'content-type': 'multipart/form-data; boundary=x' } };
  const response = await upload(apiRequest('/api/imports', token, init), {});
  expect(response.status).toBe(413);
  expect(sent).toBeLessThan(MOST_FILE_BYTES * 1.2);
});

test('another company’s import, an unknown id and no id at all look the same', async () => {
  const { id } = await takeIn(token, FILE);
  const stranger = await (await newCompany()).token('owner');
  for (const wanted of [id, randomUUID(), 'nonsense']) {
    const get = apiRequest(`/api/imports/${wanted}`, stranger);
    const post = apiRequest(`/api/imports/${wanted}`, stranger, { method: 'POST', body: '{}' });
    const answers = [
      await getImport(get, at(wanted)),
      await getRefused(get, at(wanted)),
      await undo(post.clone(), at(wanted)),
      await preview(post.clone(), at(wanted)),
      await apply(post.clone(), at(wanted)),
    ];
    expect(answers.map(({ status }) => status)).toEqual([404, 404, 404, 404, 404]);
  }
  expect((await importListOf(stranger)).items).toEqual([]);
  expect(await look(token, id)).toMatchObject({ status: 'done' });
});

const importListOf = async (bearer: string) =>
  importListSchema.parse(await (await list(apiRequest('/api/imports', bearer), {})).json());

test('who may not manage imports is told so', async () => {
  for (const role of ['trainer', 'technician', 'auditor'] as const)
    expect((await send(await company.token(role), FILE)).status).toBe(403);
  expect((await upload(apiRequest('/api/imports', undefined, { method: 'POST' }), {})).status).toBe(401);
});
