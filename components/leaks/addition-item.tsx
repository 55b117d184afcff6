'use client';

import { useState } from 'react';
import type { Addition } from '@/analytics/charge-additions/contract';
import { useRemoveAddition } from '@/analytics/charge-additions/hook';
import { Button, TextButton } from '@/components/ui/button';
import { Field, TextInput } from '@/components/ui/field';
import { useMay } from '@/components/viewer-context';
import { formatDay } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';
import { ADDITION_REASON_NAMES } from '@/lib/wording';
import { AdditionForm } from './addition-form';

const RemoveForm = ({ addition, onDone }: { addition: Addition; onDone: () => void }) => {
  const [why, setWhy] = useState('');
  const { mutate, error, isPending } = useRemoveAddition();
  return (
    <form
      noValidate
      className="flex max-w-2xl flex-wrap items-end gap-3 print:hidden"
      onSubmit={(event) => {
        event.preventDefault();
        mutate({ addition, why }, { onSuccess: onDone });
      }}
    >
      <Field
        label="Why it is taken away"
        hint="It leaves the leak rates and stays in the history."
        error={error?.message}
        required
        className="grow"
      >
        <TextInput value={why} onChange={(event) => setWhy(event.target.value)} />
      </Field>
      <Button type="submit" tone="danger" disabled={isPending}>
        Take it away
      </Button>
      <Button onClick={onDone}>Keep it</Button>
    </form>
  );
};

/** One addition with who wrote it down; corrected and taken away in place. */
export const AdditionItem = ({ addition, unit }: { addition: Addition; unit: DisplayUnit }) => {
  const mayWrite = useMay('leaks:write');
  const [mode, setMode] = useState<'read' | 'correct' | 'remove'>('read');
  const close = () => setMode('read');
  const { addedOn, enteredMass, massUnit, reason, leaksVerifiedOn, notes, additionRef, writtenBy } = addition;
  if (mode === 'correct')
    return (
      <li>
        <AdditionForm applianceId={addition.applianceId} addition={addition} unit={unit} onDone={close} />
      </li>
    );
  return (
    <li className="border-b border-rule-2 py-2 last:border-b-0">
      <p>
        <span className="font-semibold">{formatDay(addedOn)}</span>: <span className="font-mono">{enteredMass}</span>{' '}
        {massUnit}, {ADDITION_REASON_NAMES[reason]}
        {leaksVerifiedOn ? `; leaks tested as repaired on ${formatDay(leaksVerifiedOn)}` : ''}
      </p>
      {notes ? <p className="max-w-prose break-words text-ink-2">{notes}</p> : null}
      <p className="flex flex-wrap gap-x-4 text-sm text-ink-2">
        <span>{[additionRef, writtenBy].filter(Boolean).join(', ')}</span>
        {mayWrite && mode === 'read' ? (
          <span className="flex gap-x-4 print:hidden">
            <TextButton onClick={() => setMode('correct')}>Correct</TextButton>
            <TextButton onClick={() => setMode('remove')}>Take away</TextButton>
          </span>
        ) : null}
      </p>
      {mode === 'remove' ? <RemoveForm addition={addition} onDone={close} /> : null}
    </li>
  );
};
