'use client';

import { type ReactNode, useState } from 'react';
import type { Coaching } from '@/analytics/coaching/contract';
import { useCoachings } from '@/analytics/coaching/hook';
import { TextButton } from '@/components/ui/button';
import { Sheet } from '@/components/ui/sheet';
import { Failed, Loading } from '@/components/ui/states';
import { useMay } from '@/components/viewer-context';
import { CoachingForm } from './coaching-form';
import { CoachingItem } from './coaching-item';

type CoachingSheetProps = {
  technicianId: string;
  /** The company's local day, with which a new coaching begins. */
  today: string;
  /** What the records say has changed since a coaching began. */
  changeSince: (coaching: Coaching) => ReactNode;
};

/** What was agreed with a technician, the latest first, and the place to write down more. */
export const CoachingSheet = ({ technicianId, today, changeSince }: CoachingSheetProps) => {
  const mayWrite = useMay('coaching:write');
  const [writing, setWriting] = useState(false);
  const { data, error, refetch } = useCoachings(technicianId);
  const list = () => {
    if (error && !data) return <Failed error={error} onRetry={() => void refetch()} />;
    if (!data) return <Loading label="Reading the coachings" minHeight={72} />;
    if (!data.items.length && !writing) return <p className="text-ink-2">Nothing has been agreed yet.</p>;
    return (
      <ol className="flex flex-col gap-3">
        {data.items.map((coaching) => (
          <CoachingItem key={coaching.id} coaching={coaching} today={today} change={changeSince(coaching)} />
        ))}
      </ol>
    );
  };
  return (
    <Sheet
      title="Coaching"
      aside="what was agreed, and what changed since"
      tools={mayWrite && !writing ? <TextButton onClick={() => setWriting(true)}>Agree on something</TextButton> : null}
    >
      {writing ? (
        <div className="mb-4">
          <CoachingForm technicianId={technicianId} coaching={null} today={today} onDone={() => setWriting(false)} />
        </div>
      ) : null}
      {list()}
    </Sheet>
  );
};
