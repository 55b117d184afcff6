import 'server-only';
import { and, eq, gt, sql } from 'drizzle-orm';
import { addSettings, withKnowledge, withPerson } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { memberships, people, sessions } from '@/db/schema/people';
import { hashToken, newToken } from './tokens';
import type { Membership, Viewer } from './viewer';

/** A session ends by itself after this, whatever happens. */
const SESSION_DAYS = 14;

const membershipsOf = async (
  tx: Parameters<Parameters<typeof withPerson>[1]>[0],
  personId: string,
): Promise<Membership[]> =>
  tx
    .select({
      companyId: memberships.companyId,
      companyName: companies.name,
      role: memberships.role,
      technicianId: memberships.technicianId,
      timeZone: companies.timeZone,
      massUnit: companies.massUnit,
    })
    .from(memberships)
    .innerJoin(companies, eq(companies.id, memberships.companyId))
    .where(eq(memberships.personId, personId))
    .orderBy(companies.name);

/** Opens a session for a person whose password was right; gives the token that the cookie will carry. */
export const openSession = (personId: string, userAgent: string | null): Promise<string> =>
  withPerson(personId, async (tx) => {
    const token = newToken('tb_session');
    const [first] = await membershipsOf(tx, personId);
    await tx.insert(sessions).values({
      tokenHash: hashToken(token),
      personId,
      companyId: first?.companyId ?? null,
      expiresAt: sql`now() + make_interval(days => ${SESSION_DAYS})`,
      userAgent: userAgent?.slice(0, 200) ?? null,
    });
    return token;
  });

/** Who this session token is, read anew at each request; null when it was ended, has expired or is in no company. */
export const viewerOfSession = (token: string): Promise<Viewer | null> =>
  withKnowledge({ session_hash: hashToken(token) }, async (tx) => {
    const [session] = await tx
      .select({ personId: sessions.personId, companyId: sessions.companyId })
      .from(sessions)
      .where(and(eq(sessions.tokenHash, hashToken(token)), gt(sessions.expiresAt, sql`now()`)));
    if (!session) return null;
    await addSettings(tx, { person_id: session.personId });
    const [person] = await tx
      .select({ name: people.name, email: people.email })
      .from(people)
      .where(eq(people.id, session.personId));
    const all = await membershipsOf(tx, session.personId);
    const here = all.find((m) => m.companyId === session.companyId) ?? all[0];
    if (!person || !here) return null;
    return {
      kind: 'person',
      actor: session.personId,
      name: person.name,
      email: person.email,
      ...here,
      memberships: all,
    };
  });

/** Ends one session: a copy of its cookie opens nothing any more. */
export const endSession = async (token: string): Promise<void> => {
  const viewer = await withKnowledge({ session_hash: hashToken(token) }, (tx) =>
    tx
      .select({ personId: sessions.personId })
      .from(sessions)
      .where(eq(sessions.tokenHash, hashToken(token))),
  );
  const personId = viewer[0]?.personId;
  if (personId) await withPerson(personId, (tx) => tx.delete(sessions).where(eq(sessions.tokenHash, hashToken(token))));
};

/** Moves a session to another company of the same person; false when he does not belong to it. */
export const switchCompany = (token: string, personId: string, companyId: string): Promise<boolean> =>
  withPerson(personId, async (tx) => {
    const all = await membershipsOf(tx, personId);
    if (!all.some((m) => m.companyId === companyId)) return false;
    await tx
      .update(sessions)
      .set({ companyId })
      .where(eq(sessions.tokenHash, hashToken(token)));
    return true;
  });
