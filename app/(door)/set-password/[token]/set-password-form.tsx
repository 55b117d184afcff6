'use client';

import { useActionState, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Checkbox, Field, TextInput } from '@/components/ui/field';
import type { SetPasswordState } from './actions';

type SetPasswordFormProps = {
  email: string;
  leastLength: number;
  setPassword: (before: SetPasswordState, form: FormData) => Promise<SetPasswordState>;
};

/** One field that can be made readable, instead of typing the same dots twice. */
export const SetPasswordForm = ({ email, leastLength, setPassword }: SetPasswordFormProps) => {
  const [state, act, busy] = useActionState(setPassword, { error: null });
  const [password, setTyped] = useState('');
  const [readable, setReadable] = useState(false);
  return (
    <form action={act} className="mt-6 flex flex-col gap-4">
      {/* Tells password managers whose password this is. */}
      <input type="text" name="username" value={email} autoComplete="username" readOnly hidden />
      <Field
        label="New password"
        hint={`At least ${leastLength} characters. A few plain words in a row are good.`}
        error={state.error}
        required
      >
        <TextInput
          name="password"
          type={readable ? 'text' : 'password'}
          autoComplete="new-password"
          value={password}
          onChange={(event) => setTyped(event.target.value)}
        />
      </Field>
      <Checkbox label="Show what I type" checked={readable} onChange={(event) => setReadable(event.target.checked)} />
      <Button type="submit" tone="primary" disabled={busy}>
        {busy ? 'Setting the password' : 'Set the password'}
      </Button>
    </form>
  );
};
