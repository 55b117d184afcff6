import { and, eq, sql } from 'drizzle-orm';
import { expect, test } from 'vitest';
import { GET as getWork } from '@/app/api/work/route';
import { withCompany, withPerson } from '@/db/client';
import { memberships, sessions } from '@/db/schema/people';
import { setPasswordByLink } from '@/lib/auth/password-links';
import { addMember, createPasswordLink } from '@/lib/auth/provision';
import { endSession, switchCompany, viewerOfSession } from '@/lib/auth/sessions';
import { hashToken } from '@/lib/auth/tokens';
import { newCompany } from '../support/company';
import { cookieOf, newPerson, signIn } from '../support/session';

const statusWith = async (cookie: string): Promise<number> =>
  (await getWork(new Request('http://127.0.0.1:3000/api/work', { headers: { cookie } }), {})).status;

const newSession = async () => {
  const company = await newCompany();
  const person = await newPerson(company.companyId, 'operations');
  return { ...company, ...person, ...(await signIn(person.personId)) };
};

test('a session opens the routes of its person', async () => {
  const { cookie, sessionToken, companyId, email, personId } = await newSession();
  expect(await statusWith(cookie)).toBe(200);
  expect(await viewerOfSession(sessionToken)).toMatchObject({
    kind: 'person',
    actor: personId,
    email,
    companyId,
    role: 'operations',
  });
});

test('a copied cookie opens nothing after sign-out', async () => {
  const { cookie, sessionToken } = await newSession();
  expect(await statusWith(cookie)).toBe(200);
  await endSession(sessionToken);
  expect(await statusWith(cookie)).toBe(401);
});

test('signing out of one browser leaves the other signed in', async () => {
  const { cookie, sessionToken, personId } = await newSession();
  const other = await signIn(personId);
  await endSession(sessionToken);
  expect(await statusWith(cookie)).toBe(401);
  expect(await statusWith(other.cookie)).toBe(200);
});

test('somebody removed from the company is out at his next request', async () => {
  const { cookie, companyId, personId, scope } = await newSession();
  expect(await statusWith(cookie)).toBe(200);
  await withCompany(scope, (tx) =>
    tx.delete(memberships).where(and(eq(memberships.companyId, companyId), eq(memberships.personId, personId))),
  );
  expect(await statusWith(cookie)).toBe(401);
});

test('a new role holds at the next request', async () => {
  const { sessionToken, companyId, email } = await newSession();
  await addMember(companyId, { email, name: 'Whoever', role: 'auditor' });
  expect(await viewerOfSession(sessionToken)).toMatchObject({ role: 'auditor' });
});

test('a new password ends every session of the person and nobody else’s', async () => {
  const { cookie, companyId, personId } = await newSession();
  const other = await signIn(personId);
  const colleague = await signIn((await newPerson(companyId, 'office')).personId);
  expect(await setPasswordByLink(await createPasswordLink(companyId, personId), 'another long password')).toBe(true);
  expect(await statusWith(cookie)).toBe(401);
  expect(await statusWith(other.cookie)).toBe(401);
  expect(await statusWith(colleague.cookie)).toBe(200);
});

test('a session ends by itself when its time is over', async () => {
  const { cookie, sessionToken, personId } = await newSession();
  await withPerson(personId, (tx) =>
    tx
      .update(sessions)
      .set({ expiresAt: sql`now() - interval '1 second'` })
      .where(eq(sessions.tokenHash, hashToken(sessionToken))),
  );
  expect(await statusWith(cookie)).toBe(401);
});

test('a token that was never given, and a cookie nobody sealed, open nothing', async () => {
  expect(await statusWith(await cookieOf(`tb_session_${'A'.repeat(43)}`))).toBe(401);
  expect(await statusWith('next-auth.session-token=made-up')).toBe(401);
});

test('a person in two companies works in one at a time and switches', async () => {
  const { sessionToken, companyId, email, personId } = await newSession();
  const other = await newCompany();
  await addMember(other.companyId, { email, name: 'Whoever', role: 'trainer' });
  expect(await viewerOfSession(sessionToken)).toMatchObject({ companyId, role: 'operations' });
  expect(await switchCompany(sessionToken, personId, other.companyId)).toBe(true);
  const viewer = await viewerOfSession(sessionToken);
  expect(viewer).toMatchObject({ companyId: other.companyId, role: 'trainer' });
  expect(viewer?.kind === 'person' && viewer.memberships.map((m) => m.companyId).sort()).toEqual(
    [companyId, other.companyId].sort(),
  );
});

test('nobody switches to a company he does not belong to', async () => {
  const { sessionToken, companyId, personId } = await newSession();
  const foreign = await newCompany();
  expect(await switchCompany(sessionToken, personId, foreign.companyId)).toBe(false);
  expect(await viewerOfSession(sessionToken)).toMatchObject({ companyId });
});
