import { beforeAll, expect, test } from 'vitest';
import { GET } from '@/app/api/trends/monthly/route';
import { endSession } from '@/lib/auth/sessions';
import { newCompany } from '../support/company';
import { writeRecords } from '../support/records';
import { newPerson, signIn } from '../support/session';

const { companyId, scope } = await newCompany();
let cookie = '';
let sessionToken = '';

const ask = (headers: Record<string, string> = {}): Promise<Response> =>
  GET(new Request('http://127.0.0.1:3000/api/trends/monthly', { headers: { cookie, ...headers } }), undefined);

beforeAll(async () => {
  await writeRecords(scope, [{ on: '2026-03-01', kg: '4' }]);
  const { personId } = await newPerson(companyId, 'owner');
  ({ cookie, sessionToken } = await signIn(personId));
});

// Next drops a handler's content-encoding and compresses what it sends: a packed answer would reach the browser packed twice.
test('an answer leaves the handler as plain JSON, whatever codings are taken', async () => {
  const packed = await ask({ 'accept-encoding': 'br, gzip' });
  expect(packed.headers.get('content-encoding')).toBeNull();
  expect(await packed.json()).toEqual(await (await ask()).json());
});

// RFC 9110, 13.1.2: If-None-Match.
test('who holds the answer is told so until a record changes', async () => {
  const etag = (await ask()).headers.get('etag') ?? '';
  const again = await ask({ 'if-none-match': etag });
  expect([again.status, await again.text()]).toEqual([304, '']);
  await writeRecords(scope, [{ on: '2026-04-01', kg: '5' }]);
  const changed = await ask({ 'if-none-match': etag });
  expect(changed.status).toBe(200);
  expect(await changed.json()).toMatchObject({ totals: { recoveredMass: 9, recoveries: 2 } });
});

test('a kept answer does not outlast the session that asks for it', async () => {
  const etag = (await ask()).headers.get('etag') ?? '';
  await endSession(sessionToken);
  expect((await ask({ 'if-none-match': etag })).status).toBe(401);
});
