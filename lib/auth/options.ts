import 'server-only';
import type { NextAuthOptions } from 'next-auth';
import CredentialsProvider from 'next-auth/providers/credentials';
import { env } from '@/lib/env';
import { AppError } from '@/lib/errors';
import { checkPassword } from './check-password';
import { SESSION_SECONDS } from './session-cookie';
import { endSession } from './sessions';

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

/**
 * next-auth carries one thing in its encrypted cookie: the token of a session in our table. Who that is, and whether
 * the session still lives, is read from the table at each request (sessions.ts).
 */
export const authOptions = (): NextAuthOptions => ({
  secret: env().NEXTAUTH_SECRET,
  session: { strategy: 'jwt', maxAge: SESSION_SECONDS },
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
