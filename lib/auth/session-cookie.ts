import 'server-only';
import { encode } from 'next-auth/jwt';
import { env } from '@/lib/env';

/** How long the browser keeps the cookie; the session's own end stands in its row. */
export const SESSION_SECONDS = 14 * 24 * 60 * 60;

/** Names of next-auth's session cookie, without and with TLS in front. */
export const SESSION_COOKIES = ['next-auth.session-token', '__Secure-next-auth.session-token'] as const;

/** next-auth's own cookie for a session that was opened without its endpoint: same name, same encryption. */
export const sessionCookie = async (sessionToken: string) => {
  const secure = env().NEXTAUTH_URL.startsWith('https:');
  const value = await encode({ token: { sessionToken }, secret: env().NEXTAUTH_SECRET, maxAge: SESSION_SECONDS });
  return {
    name: SESSION_COOKIES[secure ? 1 : 0],
    value,
    httpOnly: true,
    sameSite: 'lax' as const,
    secure,
    path: '/',
    maxAge: SESSION_SECONDS,
  };
};
