'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field, TextInput } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import type { ActionState } from './action-state';

/** A link or token that is shown this once, with a button that copies it. */
const SecretOnce = ({ secret }: { secret: string }) => {
  const [copied, setCopied] = useState(false);
  return (
    <div className="mt-2 flex items-end gap-2">
      <Field label="To hand over" labelHidden className="flex-1">
        <TextInput readOnly value={secret} className="font-mono text-sm" onFocus={(event) => event.target.select()} />
      </Field>
      <Button
        onClick={() =>
          navigator.clipboard.writeText(secret).then(
            () => setCopied(true),
            () => setCopied(false),
          )
        }
      >
        <span aria-live="polite">{copied ? 'Copied' : 'Copy'}</span>
      </Button>
    </div>
  );
};

/** What came of an action, in words. */
export const Outcome = ({ state }: { state: ActionState }) => {
  if (state.error)
    return (
      <Notice tone="danger" announce>
        {state.error}
      </Notice>
    );
  if (!state.done) return null;
  return (
    <Notice tone="good" announce>
      {state.done}
      {state.secret ? <SecretOnce secret={state.secret} /> : null}
    </Notice>
  );
};
