'use client';

import { type FormEvent, useState } from 'react';
import type { RecordDetail } from '@/analytics/records/contract';
import { useKnownNames } from '@/analytics/records/hook';
import { Button } from '@/components/ui/button';
import { Field, TextInput } from '@/components/ui/field';
import { useViewer } from '@/components/viewer-context';
import { ApiError } from '@/lib/api/client';
import { plural } from '@/lib/format';
import { emptyTexts, type RecordField } from '@/lib/recoveries/fields';
import { type Clash, clashesOf, rebased } from './conflict';
import { ConflictNotice } from './conflict-notice';
import { FaultSummary } from './fault-summary';
import { LiveYieldLine } from './live-yield';
import { NewNames, unknownNames } from './new-names';
import { RecordFields } from './record-fields';
import { changedFields, fetchRecord, NOTHING_REFUSED, refusalOf, sendCorrection } from './write';

type CorrectionFormProps = { record: RecordDetail; onSaved: () => void; onCancel: () => void };

const LEAST_REASON = 3;

/** Corrects a record in place: only changed fields are sent, with the reason. A newer version loses nothing typed. */
export const CorrectionForm = ({ record, onSaved, onCancel }: CorrectionFormProps) => {
  const { massUnit, role } = useViewer();
  const [base, setBase] = useState(record);
  const began = emptyTexts(base.entered);
  const [texts, setTexts] = useState(began);
  const [reason, setReason] = useState('');
  const [refusal, setRefusal] = useState(NOTHING_REFUSED);
  const [conflict, setConflict] = useState<{ sentence: string; clashes: Clash[] } | null>(null);
  const [confirmed, setConfirmed] = useState(false);
  const [sending, setSending] = useState(false);
  const { data: names } = useKnownNames(texts.site);
  const changes = changedFields(began, texts);
  const count = Object.keys(changes).length;
  const reasonMissing = reason.trim().length < LEAST_REASON;

  const takeNewer = async (sentence: string) => {
    const newer = await fetchRecord(base.id);
    const theirs = emptyTexts(newer.entered);
    setConflict({ sentence, clashes: clashesOf(began, theirs, texts) });
    setTexts(rebased(began, theirs, texts));
    setBase(newer);
    setRefusal(NOTHING_REFUSED);
  };
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    setSending(true);
    try {
      await sendCorrection(base, { reason, changes, createNames: confirmed });
      onSaved();
    } catch (error) {
      const newer = error instanceof ApiError && error.status === 409 && error.errors.length === 0;
      await (newer ? takeNewer(error.message) : Promise.reject(error)).catch((other: unknown) =>
        setRefusal(refusalOf(other)),
      );
      setSending(false);
    }
  };

  return (
    <form onSubmit={submit} noValidate>
      {conflict ? <ConflictNotice {...conflict} /> : null}
      <RecordFields
        texts={texts}
        onChange={(field: RecordField, value) => setTexts({ ...texts, [field]: value })}
        errors={refusal.errors}
        names={names}
        ownName={role === 'technician' ? began.technician : undefined}
        before={{ 'Vacuum and hold': <LiveYieldLine texts={texts} unit={massUnit} /> }}
      />
      <NewNames texts={texts} fields={unknownNames(texts, names)} confirmed={confirmed} onConfirm={setConfirmed} />
      <Field
        label="Why the record is corrected"
        hint="It stands in the history beside your name"
        error={refusal.errors.reason}
        required
        className="mb-5"
      >
        <TextInput
          value={reason}
          maxLength={500}
          onChange={(event) => setReason(event.target.value)}
          className="h-12"
        />
      </Field>
      <FaultSummary {...refusal} />
      <div className="flex flex-wrap items-center gap-3">
        <Button type="submit" tone="primary" disabled={sending || count === 0 || reasonMissing} className="min-h-12">
          {sending ? 'Saving' : 'Save the correction'}
        </Button>
        <Button onClick={onCancel} className="min-h-12">
          Leave it as it is
        </Button>
        <p aria-live="polite" className="text-sm text-ink-2">
          {count === 0
            ? 'Nothing is changed yet.'
            : `${plural(count, 'field', 'fields')} changed.${reasonMissing ? ' Say why, then save.' : ''}`}
        </p>
      </div>
    </form>
  );
};
