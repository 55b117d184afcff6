'use client';

import { type FormEvent, useId, useState } from 'react';
import type { Addition } from '@/analytics/charge-additions/contract';
import { type AdditionDraft, useSaveAddition } from '@/analytics/charge-additions/hook';
import { Button } from '@/components/ui/button';
import { Field, Select, TextArea, TextInput } from '@/components/ui/field';
import { ApiError } from '@/lib/api/client';
import { ADDITION_NOTE_LENGTH } from '@/lib/charge-additions/limits';
import { ADDITION_REASONS, type DisplayUnit, MASS_UNITS } from '@/lib/vocabulary';
import { ADDITION_REASON_NAMES } from '@/lib/wording';

const faultsOf = (error: Error | null): Record<string, string> =>
  error instanceof ApiError ? Object.fromEntries(error.errors.map(({ path, message }) => [path, message])) : {};

const draftOf = (addition: Addition | null, unit: DisplayUnit): AdditionDraft => ({
  addedOn: addition?.addedOn ?? '',
  addedCharge: addition?.enteredMass ?? '',
  massUnit: addition?.massUnit ?? unit,
  reason: addition?.reason ?? 'leak_top_up',
  leaksVerifiedOn: addition?.leaksVerifiedOn ?? '',
  notes: addition?.notes ?? '',
});

/** One of a closed list as the select of the form gives it back. */
const oneOf = <Word extends string>(words: readonly Word[], value: string, before: Word): Word =>
  words.find((word) => word === value) ?? before;

type AdditionFormProps = {
  applianceId: string;
  /** The addition to be corrected; null writes a new one. */
  addition: Addition | null;
  unit: DisplayUnit;
  onDone: () => void;
};

/** Writes an addition down, or corrects one. What was typed stays until it is saved. */
export const AdditionForm = ({ applianceId, addition, unit, onDone }: AdditionFormProps) => {
  const [draft, setDraft] = useState(() => draftOf(addition, unit));
  const [why, setWhy] = useState('');
  const key = useId();
  const [opened] = useState(() => Date.now());
  const { mutate, error, isPending } = useSaveAddition(applianceId);
  const faults = faultsOf(error);
  const set = (part: Partial<AdditionDraft>) => setDraft({ ...draft, ...part });
  const submit = (event: FormEvent) => {
    event.preventDefault();
    // Another figure is another addition, so it gets another key.
    const idempotencyKey = `${key} ${opened} ${JSON.stringify(draft)}`.slice(0, 255);
    mutate({ draft, correct: addition && { addition, why }, key: idempotencyKey }, { onSuccess: onDone });
  };
  return (
    <form
      onSubmit={submit}
      noValidate
      className="grid max-w-2xl gap-3 border-t-2 border-ink bg-sheet pt-3 print:hidden"
    >
      <div className="grid gap-3 sm:grid-cols-3">
        <Field label="Added on" required error={faults.addedOn}>
          <TextInput type="date" value={draft.addedOn} onChange={(event) => set({ addedOn: event.target.value })} />
        </Field>
        <Field label="Added mass" required error={faults.addedCharge}>
          <TextInput
            inputMode="decimal"
            className="font-mono"
            value={draft.addedCharge}
            onChange={(event) => set({ addedCharge: event.target.value })}
          />
        </Field>
        <Field label="Unit" error={faults.massUnit}>
          <Select
            value={draft.massUnit}
            onChange={(event) => set({ massUnit: oneOf(MASS_UNITS, event.target.value, draft.massUnit) })}
          >
            {MASS_UNITS.map((word) => (
              <option key={word}>{word}</option>
            ))}
          </Select>
        </Field>
      </div>
      <div className="grid gap-3 sm:grid-cols-2">
        <Field label="Why it was added" error={faults.reason}>
          <Select
            value={draft.reason}
            onChange={(event) => set({ reason: oneOf(ADDITION_REASONS, event.target.value, draft.reason) })}
          >
            {ADDITION_REASONS.map((reason) => (
              <option key={reason} value={reason}>
                {ADDITION_REASON_NAMES[reason]}
              </option>
            ))}
          </Select>
        </Field>
        <Field
          label="Leaks tested as repaired on"
          aside={<span className="text-sm text-ink-2">if known</span>}
          error={faults.leaksVerifiedOn}
        >
          <TextInput
            type="date"
            value={draft.leaksVerifiedOn}
            onChange={(event) => set({ leaksVerifiedOn: event.target.value })}
          />
        </Field>
      </div>
      <Field label="Notes" error={faults.notes}>
        <TextArea
          value={draft.notes}
          maxLength={ADDITION_NOTE_LENGTH}
          onChange={(event) => set({ notes: event.target.value })}
        />
      </Field>
      {addition ? (
        <Field label="Why it is corrected" required error={faults.why}>
          <TextInput value={why} maxLength={ADDITION_NOTE_LENGTH} onChange={(event) => setWhy(event.target.value)} />
        </Field>
      ) : null}
      {error && !Object.keys(faults).length ? (
        <p role="alert" className="text-sm font-medium text-danger">
          {error.message}
        </p>
      ) : null}
      <div className="flex flex-wrap gap-3">
        <Button type="submit" tone="primary" disabled={isPending}>
          {isPending ? 'Saving' : addition ? 'Save the correction' : 'Save the addition'}
        </Button>
        <Button onClick={onDone}>Leave it</Button>
      </div>
    </form>
  );
};
