'use client';

import { type FormEvent, useState } from 'react';
import type { Coaching } from '@/analytics/coaching/contract';
import { type CoachingDraft, useSaveCoaching } from '@/analytics/coaching/hook';
import { Button } from '@/components/ui/button';
import { Field, TextArea, TextInput } from '@/components/ui/field';
import { ApiError } from '@/lib/api/client';
import { COACHING_LENGTH } from '@/lib/coaching/limits';

type CoachingFormProps = {
  technicianId: string;
  /** The coaching to be changed; null writes a new one. */
  coaching: Coaching | null;
  today: string;
  onDone: () => void;
};

const faultsOf = (error: Error | null): Record<string, string> =>
  error instanceof ApiError ? Object.fromEntries(error.errors.map(({ path, message }) => [path, message])) : {};

const begun = (coaching: Coaching | null, today: string): CoachingDraft => ({
  startedOn: coaching?.startedOn ?? today,
  plan: coaching?.plan ?? '',
  endedOn: coaching?.endedOn ?? '',
  outcome: coaching?.outcome ?? '',
});

/** Writes down what was agreed, and later what came of it. What was typed stays until it is saved. */
export const CoachingForm = ({ technicianId, coaching, today, onDone }: CoachingFormProps) => {
  const [draft, setDraft] = useState(() => begun(coaching, today));
  const { mutate, error, isPending } = useSaveCoaching(technicianId);
  const faults = faultsOf(error);
  const set = (part: Partial<CoachingDraft>) => setDraft({ ...draft, ...part });
  const submit = (event: FormEvent) => {
    event.preventDefault();
    mutate({ draft, coaching }, { onSuccess: onDone });
  };
  return (
    <form onSubmit={submit} noValidate className="grid max-w-2xl gap-3 border-t-2 border-ink pt-3 print:hidden">
      <Field
        label="From this day on"
        hint="A change is looked for from here."
        error={faults.startedOn}
        className="max-w-60"
      >
        <TextInput
          type="date"
          value={draft.startedOn}
          onChange={(event) => set({ startedOn: event.currentTarget.value })}
        />
      </Field>
      <Field label="What was agreed" hint="The technician reads it too." error={faults.plan}>
        <TextArea
          value={draft.plan}
          maxLength={COACHING_LENGTH}
          onChange={(event) => set({ plan: event.currentTarget.value })}
        />
      </Field>
      {coaching ? (
        <>
          <Field
            label="Looked at again on"
            hint="Leave it empty while the coaching runs."
            error={faults.endedOn}
            className="max-w-60"
          >
            <TextInput
              type="date"
              value={draft.endedOn}
              onChange={(event) => set({ endedOn: event.currentTarget.value })}
            />
          </Field>
          <Field label="What came of it" error={faults.outcome}>
            <TextArea
              value={draft.outcome}
              maxLength={COACHING_LENGTH}
              onChange={(event) => set({ outcome: event.currentTarget.value })}
            />
          </Field>
        </>
      ) : null}
      {error && !Object.keys(faults).length ? (
        <p role="alert" className="text-sm font-medium text-danger">
          {error.message}
        </p>
      ) : null}
      <div className="flex flex-wrap gap-3">
        <Button type="submit" tone="primary" disabled={isPending}>
          {isPending ? 'Saving' : 'Save'}
        </Button>
        <Button onClick={onDone}>Leave it</Button>
      </div>
    </form>
  );
};
