import 'server-only';
import { and, eq, gt, isNull, sql } from 'drizzle-orm';
import { addSettings, withKnowledge } from '@/db/client';
import { passwordLinks, people, sessions } from '@/db/schema/people';
import { hashPassword } from './passwords';
import { hashToken } from './tokens';

const usable = (token: string) =>
  and(
    eq(passwordLinks.tokenHash, hashToken(token)),
    isNull(passwordLinks.usedAt),
    gt(passwordLinks.expiresAt, sql`now()`),
  );

/** Whose password this link sets; null when it was used or has expired. */
export const personOfLink = (token: string): Promise<{ id: string; name: string; email: string } | null> =>
  withKnowledge({ link_hash: hashToken(token) }, async (tx) => {
    const [link] = await tx.select({ personId: passwordLinks.personId }).from(passwordLinks).where(usable(token));
    if (!link) return null;
    await addSettings(tx, { person_id: link.personId });
    const [person] = await tx.select().from(people).where(eq(people.id, link.personId));
    return person ? { id: person.id, name: person.name, email: person.email } : null;
  });

/** Sets the password, uses the link up and ends every session of the person at once; false when the link no longer holds. */
export const setPasswordByLink = async (token: string, password: string): Promise<boolean> => {
  const passwordHash = await hashPassword(password);
  return withKnowledge({ link_hash: hashToken(token) }, async (tx) => {
    const [link] = await tx.select({ personId: passwordLinks.personId }).from(passwordLinks).where(usable(token));
    if (!link) return false;
    await addSettings(tx, { person_id: link.personId });
    // Of two uses at once the second waits for the first here, and then finds the link used.
    const used = await tx
      .update(passwordLinks)
      .set({ usedAt: sql`now()` })
      .where(usable(token))
      .returning({ personId: passwordLinks.personId });
    if (used.length === 0) return false;
    await tx.update(people).set({ passwordHash }).where(eq(people.id, link.personId));
    await tx.delete(sessions).where(eq(sessions.personId, link.personId));
    return true;
  });
};
