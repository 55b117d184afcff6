'use client';

import { type FormEvent, startTransition, useActionState } from 'react';
import { type ActionState, UNTOUCHED } from './action-state';

/**
 * A server action under a form that keeps what was typed and chosen. React empties the fields of a form given to
 * `action`, also after a refusal, and would show another choice than the one that is sent.
 */
export const useFormAction = (action: (before: ActionState, form: FormData) => Promise<ActionState>) => {
  const [state, act, busy] = useActionState(action, UNTOUCHED);
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = new FormData(event.currentTarget);
    startTransition(() => act(form));
  };
  return { state, submit, busy };
};
