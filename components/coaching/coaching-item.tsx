'use client';

import { type ReactNode, useState } from 'react';
import type { Coaching } from '@/analytics/coaching/contract';
import { useDeleteCoaching } from '@/analytics/coaching/hook';
import { TextButton } from '@/components/ui/button';
import { useMay } from '@/components/viewer-context';
import { formatDay } from '@/lib/format';
import { CoachingForm } from './coaching-form';

type CoachingItemProps = {
  coaching: Coaching;
  today: string;
  /** What the records say has changed since, where they can say it. */
  change: ReactNode;
};

/** One coaching: when, what was agreed, what changed since, what came of it; changed and taken away in place. */
export const CoachingItem = ({ coaching, today, change }: CoachingItemProps) => {
  const mayWrite = useMay('coaching:write');
  const [mode, setMode] = useState<'read' | 'change' | 'remove'>('read');
  const { mutate: remove, error, isPending } = useDeleteCoaching();
  const { technicianId, startedOn, plan, endedOn, outcome, writtenBy } = coaching;
  if (mode === 'change')
    return (
      <li>
        <CoachingForm technicianId={technicianId} coaching={coaching} today={today} onDone={() => setMode('read')} />
      </li>
    );
  return (
    <li className="grid gap-x-6 gap-y-1 border-t border-rule-2 pt-3 first:border-t-0 first:pt-0 sm:grid-cols-[8.5rem_minmax(0,1fr)]">
      <p className="font-semibold tabular-nums">{formatDay(startedOn)}</p>
      <div className="flex max-w-prose min-w-0 flex-col gap-1.5 break-words">
        <p className="whitespace-pre-line">{plan}</p>
        {change ? <div className="text-ink-2">{change}</div> : null}
        {endedOn ? (
          <p className="whitespace-pre-line">
            <span className="font-semibold">{formatDay(endedOn)}:</span> {outcome}
          </p>
        ) : null}
        <p className="flex flex-wrap gap-x-4 text-sm text-ink-2">
          <span>{writtenBy}</span>
          {mayWrite && mode === 'read' ? (
            <span className="flex gap-x-4 print:hidden">
              <TextButton onClick={() => setMode('change')}>{endedOn ? 'Change' : 'Change or end it'}</TextButton>
              <TextButton onClick={() => setMode('remove')}>Take away</TextButton>
            </span>
          ) : null}
          {mode === 'remove' ? (
            <span className="flex flex-wrap gap-x-4 print:hidden">
              Take this coaching away? It stays in the history.
              <TextButton disabled={isPending} onClick={() => remove(coaching)}>
                Yes, take it away
              </TextButton>
              <TextButton onClick={() => setMode('read')}>Keep it</TextButton>
            </span>
          ) : null}
        </p>
        {error ? (
          <p role="alert" className="text-sm font-medium text-danger">
            {error.message}
          </p>
        ) : null}
      </div>
    </li>
  );
};
