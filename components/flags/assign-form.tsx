'use client';

import { type FormEvent, useState } from 'react';
import type { Flag } from '@/analytics/flags/contract';
import { useAssign, useAssignable } from '@/analytics/flags/hook';
import { Button } from '@/components/ui/button';
import { Field, Select, TextInput } from '@/components/ui/field';
import { FLAG_NOTE_LENGTH } from '@/lib/flags/limits';

/** Asks somebody to look at a record, with what he ought to know. */
export const AssignForm = ({ flag, onDone }: { flag: Flag; onDone: () => void }) => {
  const people = useAssignable(true);
  const [assignedTo, setAssignedTo] = useState(flag.assignedTo?.id ?? '');
  const [note, setNote] = useState(flag.note ?? '');
  const { mutate, isPending, error } = useAssign();
  const submit = (event: FormEvent) => {
    event.preventDefault();
    mutate({ id: flag.id, assignedTo: assignedTo || null, note }, { onSuccess: onDone });
  };
  return (
    <form
      onSubmit={submit}
      className="mt-3 grid max-w-2xl gap-3 border-t-2 border-ink pt-3 sm:grid-cols-2 print:hidden"
    >
      <Field label="Who is asked to look">
        <Select value={assignedTo} autoFocus onChange={(event) => setAssignedTo(event.target.value)}>
          <option value="">Nobody in particular</option>
          {(people.data?.items ?? []).map(({ id, name }) => (
            <option key={id} value={id}>
              {name}
            </option>
          ))}
        </Select>
      </Field>
      <Field label="What to look at">
        <TextInput value={note} maxLength={FLAG_NOTE_LENGTH} onChange={(event) => setNote(event.target.value)} />
      </Field>
      {error ? (
        <p role="alert" className="text-sm font-medium text-danger sm:col-span-2">
          {error.message}
        </p>
      ) : null}
      <div className="flex flex-wrap gap-3 sm:col-span-2">
        <Button type="submit" tone="primary" disabled={isPending}>
          {isPending ? 'Saving' : 'Save'}
        </Button>
        <Button onClick={onDone}>Leave it</Button>
      </div>
    </form>
  );
};
