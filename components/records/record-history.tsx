'use client';

import type { HistoryEntry } from '@/analytics/records/contract';
import { useViewer } from '@/components/viewer-context';
import { formatInstant } from '@/lib/format';
import { FIELD_LABELS, RECORD_FIELDS } from '@/lib/recoveries/fields';
import { fieldValue } from './wording';

const ACTIONS: Record<HistoryEntry['action'], string> = { insert: 'written', update: 'changed', delete: 'deleted' };

const labelOf = (name: string): string => {
  const field = RECORD_FIELDS.find((one) => one === name);
  return field ? FIELD_LABELS[field] : 'In the figures';
};

const Change = ({ field, before, after }: HistoryEntry['changes'][number]) => (
  <li>
    {labelOf(field)}:{' '}
    {before === null ? <span className="text-ink-3">not stated</span> : <del>{fieldValue(field, before)}</del>} →{' '}
    {after === null ? <span className="text-ink-3">not stated</span> : <ins>{fieldValue(field, after)}</ins>}
  </li>
);

/** Who changed what and why, newest first. How the record was at first stands in the entry that wrote it. */
export const RecordHistoryList = ({ entries }: { entries: readonly HistoryEntry[] }) => {
  const { timeZone } = useViewer();
  return (
    <ol className="border-t border-rule-2">
      {entries.map((entry) => (
        <li key={entry.entryNo} className="border-b border-rule-2 py-3 last:border-b-0">
          <p>
            <span className="font-medium">{formatInstant(entry.changedAt, timeZone)}</span>, {ACTIONS[entry.action]} by{' '}
            {entry.who}
            {entry.reason ? <span className="text-ink-2">: {entry.reason}</span> : null}
          </p>
          {entry.action === 'update' ? (
            entry.changes.length ? (
              <ul className="mt-1 text-sm text-ink-2 [&_ins]:font-medium [&_ins]:text-ink [&_ins]:no-underline">
                {entry.changes.map((change) => (
                  <Change key={change.field} {...change} />
                ))}
              </ul>
            ) : (
              <p className="mt-1 text-sm text-ink-2">Nothing that the record says became different.</p>
            )
          ) : null}
        </li>
      ))}
    </ol>
  );
};
