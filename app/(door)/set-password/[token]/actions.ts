'use server';

import { redirect } from 'next/navigation';
import { personOfLink, setPasswordByLink } from '@/lib/auth/password-links';
import { LEAST_PASSWORD_LENGTH } from '@/lib/auth/passwords';

/** Hashing costs time by length; nobody types more. */
const MOST_PASSWORD_LENGTH = 200;

/** What is wrong with what was typed, in a sentence. */
export type SetPasswordState = { error: string | null };

/** Sets the password that a one-time link allows and leads to the sign-in page; gives a sentence when it may not. */
export const setPassword = async (
  token: string,
  _before: SetPasswordState,
  form: FormData,
): Promise<SetPasswordState> => {
  const password = String(form.get('password') ?? '');
  if (password.length < LEAST_PASSWORD_LENGTH)
    return { error: `Use at least ${LEAST_PASSWORD_LENGTH} characters; these are ${password.length}.` };
  if (password.length > MOST_PASSWORD_LENGTH) return { error: `Use at most ${MOST_PASSWORD_LENGTH} characters.` };
  const person = await personOfLink(token);
  if (person && password.toLowerCase().includes(person.email.toLowerCase()))
    return { error: 'Leave your e-mail address out of the password: it is the first thing somebody would try.' };
  if (!person || !(await setPasswordByLink(token, password)))
    return { error: 'This link was used or has expired meanwhile. Ask the owner of your company for a new one.' };
  redirect(`/sign-in?password=set&email=${encodeURIComponent(person.email)}`);
};
