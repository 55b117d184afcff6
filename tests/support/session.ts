import { randomUUID } from 'node:crypto';
import { encode } from 'next-auth/jwt';
import { hashPassword } from '@/lib/auth/passwords';
import { addMember } from '@/lib/auth/provision';
import { openSession } from '@/lib/auth/sessions';
import { env } from '@/lib/env';
import type { Role } from '@/lib/vocabulary';

/** The cookie header of a browser that holds this session, sealed as next-auth seals it. */
export const cookieOf = async (sessionToken: string): Promise<string> =>
  `next-auth.session-token=${await encode({ token: { sessionToken }, secret: env().NEXTAUTH_SECRET })}`;

/** A person with a password in a company. */
export const newPerson = async (companyId: string, role: Role, password = `password ${randomUUID()}`) => {
  const email = `${randomUUID()}@example.test`;
  const passwordHash = await hashPassword(password);
  const personId = await addMember(companyId, { email, name: `A ${role}`, role, passwordHash });
  return { personId, email, password };
};

/** Signs a person in; gives the session's token and the cookie header of his browser. */
export const signIn = async (personId: string) => {
  const sessionToken = await openSession(personId, 'a test');
  return { sessionToken, cookie: await cookieOf(sessionToken) };
};
