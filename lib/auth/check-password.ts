import 'server-only';
import { eq, sql } from 'drizzle-orm';
import { withKnowledge } from '@/db/client';
import { people } from '@/db/schema/people';
import { countSignInTry, forgetSignInTries } from './limits';
import { passwordMatches } from './passwords';
import { openSession } from './sessions';

/** The last hop is what the nearest proxy, or Next itself, saw; what stands before it anybody can write. */
const addressOf = (headers: Record<string, string> | undefined) =>
  headers?.['x-forwarded-for']?.split(',').at(-1)?.trim() || headers?.['x-real-ip'] || 'local';

/**
 * Opens a session for who knows the password; null when the two do not belong together. Takes the same time for unknown
 * addresses. Throws 429 after too many tries.
 */
export const checkPassword = async (
  email: string,
  password: string,
  headers: Record<string, string> | undefined,
): Promise<{ id: string; sessionToken: string } | null> => {
  const address = addressOf(headers);
  await countSignInTry(email, address);
  const [person] = await withKnowledge({ sign_in_email: email }, (tx) =>
    tx
      .select()
      .from(people)
      .where(eq(sql`lower(${people.email})`, email.toLowerCase())),
  );
  if (!(await passwordMatches(person?.passwordHash, password)) || !person) return null;
  await forgetSignInTries(email, address);
  const sessionToken = await openSession(person.id, headers?.['user-agent'] ?? null);
  return { id: person.id, sessionToken };
};
