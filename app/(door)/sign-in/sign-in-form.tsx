'use client';

import { useActionState, useEffect, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field, TextInput } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { signIn } from './actions';

/** E-mail and password; what was typed as e-mail stays when the two are refused. */
export const SignInForm = ({ nextPath, email }: { nextPath: string; email: string }) => {
  const [state, act, busy] = useActionState(signIn, { failure: null, email, leadTo: null });
  const [scripted, setScripted] = useState(false);
  useEffect(() => setScripted(true), []);
  useEffect(() => {
    if (state.leadTo) window.location.assign(state.leadTo);
  }, [state.leadTo]);
  return (
    <form action={act} className="mt-6 flex flex-col gap-5">
      <input type="hidden" name="next" value={nextPath} />
      {scripted ? <input type="hidden" name="scripted" value="yes" /> : null}
      <Field label="E-mail" required>
        <TextInput name="email" type="email" autoComplete="username" defaultValue={state.email} key={state.email} />
      </Field>
      <Field label="Password" required>
        <TextInput name="password" type="password" autoComplete="current-password" />
      </Field>
      {state.failure ? (
        <Notice tone="danger" announce>
          {state.failure}
        </Notice>
      ) : null}
      <Button type="submit" tone="primary" disabled={busy || state.leadTo !== null}>
        {busy || state.leadTo !== null ? 'Signing in' : 'Sign in'}
      </Button>
    </form>
  );
};
