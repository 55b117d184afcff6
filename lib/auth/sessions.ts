import 'server-only';
import { eq, sql } from 'drizzle-orm';
import { withKnowledge, withPerson } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { memberships, sessions } from '@/db/schema/people';
import { sessionByHash } from '@/db/who-asks';
import { hashToken, newToken } from './tokens';
import type { AskingViewer, Membership } from './viewer';

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

/**
 * Who this session token is, read anew at each request by one statement; null when it was ended, has expired or is in
 * no company.
 */
export const viewerOfSession = async (token: string): Promise<AskingViewer | null> => {
  const found = await sessionByHash(hashToken(token));
  const here = found?.memberships.find((membership) => membership.companyId === found.companyId);
  if (!found || !here) return null;
  const { personId, name, email, memberships: all, revision } = found;
  return { kind: 'person', actor: personId, name, email, ...here, memberships: all, revision };
};

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
