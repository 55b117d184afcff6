'use client';

import { useQueryClient } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { type FormEvent, useState } from 'react';
import { useKnownNames } from '@/analytics/records/hook';
import { Button, TextButton } from '@/components/ui/button';
import { useViewer } from '@/components/viewer-context';
import type { RecordField, RecordTexts } from '@/lib/recoveries/fields';
import { Cautions } from './cautions';
import { CylinderCaution } from './cylinder-caution';
import { FaultSummary } from './fault-summary';
import { withApplianceFilledIn } from './fill-in';
import { LiveYieldLine } from './live-yield';
import { NewNames, unknownNames } from './new-names';
import { RecordFields } from './record-fields';
import { useDraft } from './use-draft';
import { NOTHING_REFUSED, refusalOf, sendNewRecord } from './write';

type RecordFormProps = { empty: RecordTexts; ownName: string | undefined };

/** Writes one record: cautions, the job, the charge, the scale, vacuum and hold. Nothing typed is lost. */
export const RecordForm = ({ empty, ownName }: RecordFormProps) => {
  const viewer = useViewer();
  const router = useRouter();
  const queries = useQueryClient();
  const draft = useDraft(`draft record of ${viewer.companyId} ${viewer.name}`, empty);
  const [refusal, setRefusal] = useState(NOTHING_REFUSED);
  const [confirmed, setConfirmed] = useState(false);
  const [sending, setSending] = useState(false);
  const { data: names } = useKnownNames(draft.texts.site);
  const texts = ownName ? { ...draft.texts, technician: ownName } : draft.texts;
  const unknown = unknownNames(texts, names);

  const change = (field: RecordField, value: string) => {
    const next = { ...draft.texts, [field]: value };
    draft.change(field === 'appliance' ? withApplianceFilledIn(next, names) : next);
  };
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    setSending(true);
    try {
      const record = await sendNewRecord(texts, confirmed, draft.key);
      draft.clear();
      await queries.invalidateQueries();
      router.push(`/records/${record.id}`);
    } catch (error) {
      setRefusal(refusalOf(error));
      setSending(false);
    }
  };

  return (
    <form onSubmit={submit} noValidate className="max-w-3xl bg-sheet px-4 pt-5 pb-6 sm:px-6">
      {draft.found ? (
        <p className="mb-4 text-ink-2">
          This is what you had typed before. <TextButton onClick={draft.clear}>Begin anew</TextButton>
        </p>
      ) : null}
      <RecordFields
        texts={texts}
        onChange={change}
        errors={refusal.errors}
        names={names}
        ownName={ownName}
        before={{
          'The scale': <Cautions />,
          'Vacuum and hold': (
            <>
              <CylinderCaution texts={texts} known={names?.cylinders ?? []} />
              <LiveYieldLine texts={texts} unit={viewer.massUnit} />
            </>
          ),
        }}
      />
      <NewNames texts={texts} fields={unknown} confirmed={confirmed} onConfirm={setConfirmed} />
      <FaultSummary {...refusal} />
      <Button type="submit" tone="primary" disabled={sending} className="min-h-12 w-full sm:w-auto sm:px-8">
        {sending ? 'Saving' : 'Save the record'}
      </Button>
    </form>
  );
};
