'use client';

import { decisionOf, type FlaggedRecord } from '@/analytics/flags/by-record';
import { useReopen } from '@/analytics/flags/hook';
import { TextButton } from '@/components/ui/button';
import { useMay, useViewer } from '@/components/viewer-context';
import { DECISION_WORDS } from '@/lib/flags/words';
import { formatInstant } from '@/lib/format';

/** What was decided about a record, by whom, and the way back. */
export const DecidedLine = ({ record, onReopened }: { record: FlaggedRecord; onReopened?: () => void }) => {
  const { timeZone } = useViewer();
  const mayDecide = useMay('flags:decide');
  const { mutate, isPending, error } = useReopen();
  const decided = decisionOf(record);
  if (!decided) return null;
  return (
    <p className="mt-2.5 border-t border-rule-2 pt-2 text-sm">
      <span className="font-semibold">{DECISION_WORDS[decided.decision].name}</span>
      <span className="text-ink-2">
        , {decided.by}, {formatInstant(decided.at, timeZone)}
        {decided.note ? `: “${decided.note}”` : ''}
      </span>{' '}
      {mayDecide ? (
        <TextButton
          className="print:hidden"
          disabled={isPending}
          onClick={() => mutate({ id: record.lead.id }, { onSuccess: () => onReopened?.() })}
        >
          Reopen
        </TextButton>
      ) : null}
      {error ? (
        <span role="alert" className="block font-medium text-danger">
          {error.message}
        </span>
      ) : null}
    </p>
  );
};
