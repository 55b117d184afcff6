import { clsx } from 'clsx';
import type { Ref } from 'react';
import type { FlaggedRecord } from '@/analytics/flags/by-record';
import { Button, TextButton } from '@/components/ui/button';
import { useMay } from '@/components/viewer-context';
import type { DisplayUnit, FlagDecision } from '@/lib/vocabulary';
import { AssignForm } from './assign-form';
import { DecideBar } from './decide-bar';
import { DecidedLine } from './decided-line';
import { FlagFacts } from './flag-facts';
import { FlagPicture } from './flag-picture';
import { FlagReasons } from './flag-reasons';

/** What is being done with a record of the list. */
export type FlagTask = 'decide' | 'assign' | null;

type FlagItemProps = {
  record: FlaggedRecord;
  unit: DisplayUnit;
  task: FlagTask;
  /** Leaves out what the page around says already. */
  facts?: boolean;
  itemRef?: Ref<HTMLLIElement>;
  onTask: (task: FlagTask) => void;
  onDecided: (record: FlaggedRecord, decision: FlagDecision) => void;
  onReopened?: () => void;
};

/** One record that needs a look: which, why with numbers and a picture, and what to say about it. */
export const FlagItem = ({
  record,
  unit,
  task,
  facts = true,
  itemRef,
  onTask,
  onDecided,
  onReopened,
}: FlagItemProps) => {
  const mayDecide = useMay('flags:decide');
  const { lead, reasons } = record;
  const isOpen = lead.state === 'open';
  const verbs =
    isOpen && mayDecide && !task ? (
      <p className="flex flex-wrap items-center gap-x-5 gap-y-2 print:hidden">
        <Button onClick={() => onTask('decide')}>Decide</Button>
        <TextButton onClick={() => onTask('assign')}>
          {lead.assignedTo || lead.note ? 'Change who looks' : 'Ask somebody'}
        </TextButton>
      </p>
    ) : null;
  return (
    <li
      ref={itemRef}
      tabIndex={-1}
      aria-label={`${lead.recordRef}, ${isOpen ? 'open' : 'decided'}`}
      className={clsx('border-b border-rule-2 py-4 last:border-b-0', 'focus-visible:outline-offset-4')}
    >
      <div
        className={clsx(
          'grid gap-x-8 gap-y-2.5 md:items-start',
          facts
            ? 'md:grid-cols-[minmax(0,1fr)_minmax(0,1.5fr)_minmax(0,14rem)]'
            : 'md:grid-cols-[minmax(0,1.5fr)_minmax(0,14rem)]',
        )}
      >
        {facts ? (
          <div className="flex min-w-0 flex-col gap-3">
            <FlagFacts flag={lead} unit={unit} />
            <div className="max-md:hidden">{verbs}</div>
          </div>
        ) : null}
        <FlagReasons reasons={reasons} />
        <FlagPicture flag={lead} />
      </div>
      {lead.assignedTo || lead.note ? (
        <p className="mt-2 text-sm">
          {lead.assignedTo ? <span className="font-medium">For {lead.assignedTo.name}</span> : null}
          {lead.assignedTo && lead.note ? ': ' : ''}
          {lead.note ? <span className="text-ink-2">“{lead.note}”</span> : null}
        </p>
      ) : null}
      {isOpen ? null : <DecidedLine record={record} {...(onReopened ? { onReopened } : {})} />}
      {verbs ? <div className={clsx('mt-3', facts && 'md:hidden')}>{verbs}</div> : null}
      {task === 'decide' ? (
        <DecideBar
          flagId={lead.id}
          recordRef={lead.recordRef}
          onDecided={(decision) => onDecided(record, decision)}
          onLeave={() => onTask(null)}
        />
      ) : null}
      {task === 'assign' ? <AssignForm flag={lead} onDone={() => onTask(null)} /> : null}
    </li>
  );
};
