import 'server-only';
import { eq, sql } from 'drizzle-orm';
import type { NextAuthOptions } from 'next-auth';
import CredentialsProvider from 'next-auth/providers/credentials';
import { withKnowledge } from '@/db/client';
import { people } from '@/db/schema/people';
import { env } from '@/lib/env';
import { AppError } from '@/lib/errors';
import { countSignInTry, forgetSignInTries } from './limits';
import { passwordMatches } from './passwords';
import { endSession, openSession } from './sessions';

declare module 'next-auth' {
  interface User {
    sessionToken: string;
  }
}
declare module 'next-auth/jwt' {
  interface JWT {
    sessionToken?: string;
  }
}

/** The last hop is what the nearest proxy, or Next itself, saw; what stands before it anybody can write. */
const addressOf = (headers: Record<string, string> | undefined) =>
  headers?.['x-forwarded-for']?.split(',').at(-1)?.trim() || headers?.['x-real-ip'] || 'local';

const checkPassword = async (email: string, password: string, headers: Record<string, string> | undefined) => {
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

/**
 * next-auth carries one thing in its encrypted cookie: the token of a session in our table. Who that is, and whether
 * the session still lives, is read from the table at each request (sessions.ts).
 */
export const authOptions = (): NextAuthOptions => ({
  secret: env().NEXTAUTH_SECRET,
  session: { strategy: 'jwt', maxAge: 14 * 24 * 60 * 60 },
  pages: { signIn: '/sign-in', error: '/sign-in' },
  providers: [
    CredentialsProvider({
      credentials: { email: { type: 'email' }, password: { type: 'password' } },
      authorize: async (credentials, request) => {
        if (!credentials) return null;
        try {
          return await checkPassword(credentials.email, credentials.password, request.headers);
        } catch (error) {
          // next-auth hands the message to the sign-in page as `error`.
          if (error instanceof AppError) throw new Error(`wait:${error.retryAfterSeconds ?? 60}`);
          throw error;
        }
      },
    }),
  ],
  callbacks: {
    jwt: ({ token, user }) => (user ? { sessionToken: user.sessionToken } : token),
    // The browser learns nothing from the session endpoint; pages hand down what they need.
    session: ({ session }) => ({ expires: session.expires }),
  },
  events: {
    signOut: async ({ token }) => {
      if (token?.sessionToken) await endSession(token.sessionToken);
    },
  },
});
