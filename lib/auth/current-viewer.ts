import 'server-only';
import { cookies, headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { decode } from 'next-auth/jwt';
import { cache } from 'react';
import { env } from '@/lib/env';
import { type Action, may } from './permissions';
import { SESSION_COOKIES } from './session-cookie';
import { viewerOfSession } from './sessions';
import type { Viewer } from './viewer';

/** The session token out of next-auth's encrypted cookie, or null. */
export const sessionTokenOf = async (cookie: (name: string) => string | undefined): Promise<string | null> => {
  for (const name of SESSION_COOKIES) {
    const value = cookie(name);
    const decoded = value ? await decode({ token: value, secret: env().NEXTAUTH_SECRET }).catch(() => null) : null;
    if (decoded?.sessionToken) return decoded.sessionToken;
  }
  return null;
};

/** The session token of the page being rendered or the action being run. */
export const currentSessionToken = async (): Promise<string | null> => {
  const jar = await cookies();
  return sessionTokenOf((name) => jar.get(name)?.value);
};

/** Who looks at this page; null when nobody is signed in. Read once a render. */
export const currentViewer = cache(async (): Promise<Viewer | null> => {
  const token = await currentSessionToken();
  return token ? viewerOfSession(token) : null;
});

/** The viewer of a page or action; sends everybody else to the sign-in page, which leads back here. */
export const requireViewer = async (): Promise<Viewer> => {
  const viewer = await currentViewer();
  if (viewer) return viewer;
  const path = (await headers()).get('x-path') ?? '/';
  redirect(`/sign-in?next=${encodeURIComponent(path)}`);
};

/** The viewer and whether he may: pages show a sentence instead of the screen when not. */
export const viewerFor = async (action: Action): Promise<{ viewer: Viewer; allowed: boolean }> => {
  const viewer = await requireViewer();
  return { viewer, allowed: may(viewer.role, action) };
};
