'use server';

import { cookies, headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { checkPassword } from '@/lib/auth/check-password';
import { safeNextPath } from '@/lib/auth/next-path';
import { sessionCookie } from '@/lib/auth/session-cookie';
import { AppError } from '@/lib/errors';
import { plural } from '@/lib/format';
import { log } from '@/lib/log';

/** What the form shows after a refusal: the sentence, and the address as it was typed. `leadTo` once all was right. */
export type SignInState = { failure: string | null; email: string; leadTo: string | null };

const text = (form: FormData, name: string): string => {
  const value = form.get(name);
  return typeof value === 'string' ? value : '';
};

const refusal = (error: unknown): string => {
  if (error instanceof AppError && error.retryAfterSeconds) {
    const minutes = Math.ceil(error.retryAfterSeconds / 60);
    return `There were too many tries. Wait ${plural(minutes, 'minute', 'minutes')}, then try again.`;
  }
  log.error({ err: error }, 'sign-in failed');
  return 'Signing in failed on our side. Try again in a moment.';
};

/** Signs in and leads on. A server action, so that the form works before, and without, the page's script. */
export const signIn = async (_state: SignInState, form: FormData): Promise<SignInState> => {
  const email = text(form, 'email').trim();
  try {
    const opened = await checkPassword(email, text(form, 'password'), Object.fromEntries(await headers()));
    if (!opened) return { failure: 'This e-mail address and password do not belong together.', email, leadTo: null };
    (await cookies()).set(await sessionCookie(opened.sessionToken));
  } catch (error) {
    return { failure: refusal(error), email, leadTo: null };
  }
  const leadTo = safeNextPath(text(form, 'next'));
  // With its script at work the page loads the next one whole: nothing of an earlier session stays in it, and the
  // keyboard begins at its top.
  if (form.get('scripted')) return { failure: null, email, leadTo };
  redirect(leadTo);
};
