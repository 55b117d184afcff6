import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, test } from 'vitest';
import { may } from '@/lib/auth/permissions';
import { ROLES, type Role } from '@/lib/vocabulary';
import { findHandlers } from '../support/discover';
import { type FilledCompany, filledCompany } from '../support/filled-company';
import { ROUTES, type RouteRule } from '../support/route-table';

type Guarded = Exclude<RouteRule, { open: string }>;

const handlers = await findHandlers();
const guarded = handlers.flatMap((found) => {
  const rule = ROUTES[found.name];
  return rule && 'action' in rule ? [{ ...found, rule }] : [];
});
type Case = (typeof guarded)[number];
const withId = guarded.filter(({ path }) => path.includes('['));

let ours: FilledCompany;
let theirs: FilledCompany;
const tokens = {} as Record<Role, string>;
beforeAll(async () => {
  ours = await filledCompany('Ours', '900');
  theirs = await filledCompany('Theirs', '800');
  for (const role of ROLES)
    tokens[role] = await ours.token(role, role === 'technician' ? ours.ids.technicianId : undefined);
});

const call = async ({ path, method, handler, rule }: Case, authorization: string | null, id = rule.id?.(ours)) => {
  const sent = rule.send?.(ours);
  const address = path.replace(/\[\w+\]/, id ?? '');
  const request = new Request(`http://127.0.0.1:3000${address}${rule.search ?? ''}`, {
    method,
    headers: { ...sent?.headers, ...(authorization === null ? {} : { authorization }) },
    ...(sent ? { body: sent.body } : {}),
  });
  const response = await handler(request, { params: Promise.resolve(id ? { id } : {}) });
  return { response, status: response.status, text: await response.text() };
};
const callAs = (one: Case, role: Role, id?: string) => call(one, `Bearer ${tokens[role]}`, id);
const rolesThatMay = ({ action }: Guarded) => ROLES.filter((role) => may(role, action));

test('every handler on disk is in the table of routes, and nothing else is', () => {
  expect(handlers.map(({ name }) => name).sort()).toEqual(Object.keys(ROUTES).sort());
});

test('every route with an id in its path says whose id', () => {
  expect(withId.filter(({ rule }) => !rule.id).map(({ name }) => name)).toEqual([]);
  expect(withId.length).toBeGreaterThan(0);
});

describe.each(guarded)('$name', (one) => {
  test.each([
    ['no credentials', null],
    ['a token that nobody gave', 'Bearer tb_api_made-up'],
    ['another scheme', 'Basic b3duZXI6cGFzc3dvcmQ='],
    ['an empty token', 'Bearer '],
  ])('refuses %s with 401', async (_what, authorization) => {
    const { response, status, text } = await call(one, authorization);
    expect(status).toBe(401);
    expect(response.headers.get('content-type')).toBe('application/problem+json');
    expect(JSON.parse(text)).toMatchObject({ status: 401, title: expect.any(String), detail: expect.any(String) });
  });

  test.each(ROLES)('answers the role %s as the permissions say', async (role) => {
    const { status, text } = await callAs(one, role);
    expect(status, text).toBe(may(role, one.rule.action) ? one.rule.status : 403);
  });

  test('says nothing of the other company to anybody', async () => {
    for (const role of ROLES) {
      const { text } = await callAs(one, role);
      expect(text).not.toContain('Theirs');
      for (const id of [theirs.companyId, theirs.personId, ...Object.values(theirs.ids)])
        expect(text).not.toContain(id);
    }
  });
});

describe.each(withId)('$name', (one) => {
  test('gives 404 for an id of the other company, word for word as for one that nobody has', async () => {
    const foreignId = one.rule.id?.(theirs) ?? '';
    for (const role of rolesThatMay(one.rule)) {
      const foreign = await callAs(one, role, foreignId);
      const unknown = await callAs(one, role, randomUUID());
      expect(foreign.status).toBe(404);
      expect(foreign.text).toBe(unknown.text);
    }
  });

  test('gives 404 for what is no id at all', async () => {
    for (const role of rolesThatMay(one.rule)) expect((await callAs(one, role, "1' or '1'='1")).status).toBe(404);
  });
});

describe.each(withId.filter(({ rule }) => rule.colleagues))('$name', (one) => {
  test('gives a technician 404 for a colleague’s record', async () => {
    expect((await callAs(one, 'technician', one.rule.colleagues?.(ours))).status).toBe(404);
    expect((await callAs(one, 'technician')).status).toBe(one.rule.status);
  });
});

describe.each(guarded.filter(({ rule }) => rule.records))('$name', (one) => {
  test('is about the 24 records of the own company, or a technician’s own 3', async () => {
    for (const role of rolesThatMay(one.rule)) {
      const { text } = await callAs(one, role);
      // The table says of each answer where its number of records stands.
      expect(one.rule.records?.(JSON.parse(text) as never), role).toBe(role === 'technician' ? 3 : 24);
    }
  });
});
