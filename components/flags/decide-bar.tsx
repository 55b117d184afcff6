'use client';

import { useState } from 'react';
import { useDecide } from '@/analytics/flags/hook';
import { Button } from '@/components/ui/button';
import { Field, TextInput } from '@/components/ui/field';
import { FLAG_NOTE_LENGTH } from '@/lib/flags/limits';
import { DECISION_WORDS } from '@/lib/flags/words';
import { FLAG_DECISIONS, type FlagDecision } from '@/lib/vocabulary';

type DecideBarProps = {
  flagId: string;
  recordRef: string;
  onDecided: (decision: FlagDecision) => void;
  onLeave: () => void;
};

/** What the record was: one button each, digits press them, with a note if there is something to say. */
export const DecideBar = ({ flagId, recordRef, onDecided, onLeave }: DecideBarProps) => {
  const [note, setNote] = useState('');
  const { mutate, isPending, error } = useDecide();
  const decide = (decision: FlagDecision) =>
    mutate({ id: flagId, decision, note }, { onSuccess: () => onDecided(decision) });
  return (
    <fieldset
      className="mt-3 border-t-2 border-ink pt-3 print:hidden"
      disabled={isPending}
      onKeyDown={(event) => {
        if (event.key === 'Escape') onLeave();
        const chosen = FLAG_DECISIONS[Number(event.key) - 1];
        if (chosen && !(event.target instanceof HTMLInputElement)) decide(chosen);
      }}
    >
      <legend className="sr-only">What {recordRef} was</legend>
      <div className="grid gap-2 sm:grid-cols-2 lg:grid-cols-3">
        {FLAG_DECISIONS.map((decision, index) => (
          <Button
            key={decision}
            // The bar opens because somebody asked to decide.
            autoFocus={index === 0}
            onClick={() => decide(decision)}
            className="w-full flex-col items-start! gap-0.5! py-2 text-left!"
          >
            <span>
              <span aria-hidden="true" className="mr-2 font-mono text-sm text-ink-3 pointer-coarse:hidden">
                {index + 1}
              </span>
              {DECISION_WORDS[decision].name}
            </span>
            <span className="text-xs font-normal text-ink-2">{DECISION_WORDS[decision].follows}</span>
          </Button>
        ))}
      </div>
      <Field label="Note, if there is something to say" className="mt-3 max-w-xl">
        <TextInput value={note} maxLength={FLAG_NOTE_LENGTH} onChange={(event) => setNote(event.target.value)} />
      </Field>
      {error ? (
        <p role="alert" className="mt-2 text-sm font-medium text-danger">
          {error.message}
        </p>
      ) : null}
      <Button className="mt-3" onClick={onLeave}>
        Leave it open
      </Button>
    </fieldset>
  );
};
