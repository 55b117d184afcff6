'use client';

import { signIn } from 'next-auth/react';
import { type FormEvent, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field, TextInput } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { plural } from '@/lib/format';

const UNREACHABLE = 'The server could not be reached. Check the connection and try again.';

/** The sentence for what next-auth reported; `wait:N` comes from the limit on tries. */
const refusal = (error: string): string => {
  const seconds = Number(/^wait:(\d+)$/.exec(error)?.[1]);
  if (seconds) {
    const minutes = Math.ceil(seconds / 60);
    return `There were too many tries. Wait ${plural(minutes, 'minute', 'minutes')}, then try again.`;
  }
  return error === 'CredentialsSignin'
    ? 'This e-mail address and password do not belong together.'
    : 'Signing in failed on our side. Try again in a moment.';
};

/** E-mail and password; what was typed as e-mail stays when the two are refused. */
export const SignInForm = ({ nextPath, email }: { nextPath: string; email: string }) => {
  const [failure, setFailure] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);

  const submit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = event.currentTarget;
    const typed = new FormData(form);
    setBusy(true);
    setFailure(null);
    const answer = await signIn('credentials', {
      redirect: false,
      email: String(typed.get('email')).trim(),
      password: String(typed.get('password')),
    }).catch(() => null);
    if (answer?.ok && !answer.error) {
      // A full load, so that nothing of an earlier session stays in the page.
      window.location.assign(nextPath);
      return;
    }
    setBusy(false);
    setFailure(answer?.error ? refusal(answer.error) : UNREACHABLE);
    const password = form.elements.namedItem('password');
    if (password instanceof HTMLInputElement) password.select();
  };

  return (
    // Posted, should somebody be faster than the script: a password must never get into an address.
    <form method="post" onSubmit={submit} className="mt-6 flex flex-col gap-5">
      <Field label="E-mail" required>
        <TextInput name="email" type="email" autoComplete="username" defaultValue={email} />
      </Field>
      <Field label="Password" required>
        <TextInput name="password" type="password" autoComplete="current-password" />
      </Field>
      {failure ? (
        <Notice tone="danger" announce>
          {failure}
        </Notice>
      ) : null}
      <Button type="submit" tone="primary" disabled={busy}>
        {busy ? 'Signing in' : 'Sign in'}
      </Button>
    </form>
  );
};
