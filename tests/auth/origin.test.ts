import { expect, test } from 'vitest';
import { json, withViewer } from '@/lib/api/route';
import { newCompany } from '../support/company';
import { newPerson, signIn } from '../support/session';

const write = withViewer('records:write', async () => json({ written: true }));

const company = await newCompany();
const { cookie } = await signIn((await newPerson(company.companyId, 'office')).personId);

const statusFrom = async (origin: string | null, init: { method?: string; headers?: Record<string, string> } = {}) => {
  const headers = { cookie, ...(origin === null ? {} : { origin }), ...init.headers };
  return (await write(new Request('http://127.0.0.1:3000/api/x', { method: 'POST', ...init, headers }), {})).status;
};

test('a write with a cookie is taken from the own origin', async () => {
  expect(await statusFrom('http://127.0.0.1:3000')).toBe(200);
});

test.each([
  ['another site', 'https://elsewhere.example'],
  ['another port', 'http://127.0.0.1:3001'],
  ['a name that only begins like ours', 'http://127.0.0.1:3000.elsewhere.example'],
  ['an opaque origin', 'null'],
  ['what is no address', '127.0.0.1:3000'],
])('a write with a cookie is refused from %s', async (_what, origin) => {
  expect(await statusFrom(origin)).toBe(403);
});

test('a write with a cookie and without an origin is refused', async () => {
  expect(await statusFrom(null)).toBe(403);
});

test.each(['PUT', 'PATCH', 'DELETE'])('%s is a write too', async (method) => {
  expect(await statusFrom('https://elsewhere.example', { method })).toBe(403);
});

test('reading is taken without an origin', async () => {
  expect(await statusFrom(null, { method: 'GET' })).toBe(200);
});

test('a program with a token has no origin and needs none', async () => {
  const authorization = `Bearer ${await company.token('office')}`;
  expect(await statusFrom(null, { headers: { authorization, cookie: '' } })).toBe(200);
});
