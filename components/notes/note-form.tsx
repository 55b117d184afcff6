'use client';

import { type FormEvent, useState } from 'react';
import type { Note } from '@/analytics/notes/contract';
import { type NoteDraft, useSaveNote } from '@/analytics/notes/hook';
import { Button } from '@/components/ui/button';
import { Field, TextArea, TextInput } from '@/components/ui/field';
import { ApiError } from '@/lib/api/client';
import { NOTE_LENGTH } from '@/lib/notes/limits';

type NoteFormProps = {
  /** The note to be changed; null writes a new one. */
  note: Note | null;
  draft: NoteDraft;
  onDone: () => void;
};

const faultsOf = (error: Error | null): Record<string, string> =>
  error instanceof ApiError ? Object.fromEntries(error.errors.map(({ path, message }) => [path, message])) : {};

/** Writes or changes a note where it stands. What was typed stays until it is saved. */
export const NoteForm = ({ note, draft: began, onDone }: NoteFormProps) => {
  const [draft, setDraft] = useState(began);
  const { mutate, error, isPending } = useSaveNote();
  const faults = faultsOf(error);
  const submit = (event: FormEvent) => {
    event.preventDefault();
    mutate({ draft, note }, { onSuccess: onDone });
  };
  return (
    <form
      onSubmit={submit}
      noValidate
      className="grid max-w-2xl gap-3 border-t-2 border-ink bg-sheet pt-3 print:hidden"
    >
      <div className="grid gap-3 sm:grid-cols-2">
        <Field label="From" error={faults.from}>
          <TextInput
            type="date"
            value={draft.from}
            onChange={(event) => setDraft({ ...draft, from: event.target.value })}
          />
        </Field>
        <Field label="To, included" error={faults.to}>
          <TextInput
            type="date"
            value={draft.to}
            onChange={(event) => setDraft({ ...draft, to: event.target.value })}
          />
        </Field>
      </div>
      <Field
        label="What is to be known"
        hint="A cause, a change, an event: everybody who sees Trends reads it."
        error={faults.text}
      >
        <TextArea
          value={draft.text}
          maxLength={NOTE_LENGTH}
          // The form opens because somebody asked to write.
          autoFocus
          onChange={(event) => setDraft({ ...draft, text: event.target.value })}
        />
      </Field>
      {error && !Object.keys(faults).length ? (
        <p role="alert" className="text-sm font-medium text-danger">
          {error.message}
        </p>
      ) : null}
      <div className="flex flex-wrap gap-3">
        <Button type="submit" tone="primary" disabled={isPending}>
          {isPending ? 'Saving' : 'Save the note'}
        </Button>
        <Button onClick={onDone}>Leave it</Button>
      </div>
    </form>
  );
};
