import { Sheet } from '@/components/ui/sheet';
import { formatCount, plural } from '@/lib/format';
import type { ImportSummary, ImportView } from '@/lib/imports/contract';
import { refusedRowsPath } from './import-api';
import { reasonTitle } from './reason-titles';

type Reason = ImportSummary['rejectedByReason'][number];

const quoted = (value: string) => (value === '' ? 'empty' : `“${value}”`);

const RefusedGroup = ({ reason }: { reason: Reason }) => {
  const title = reasonTitle(reason.code);
  return (
    <li className="grid gap-x-6 gap-y-1 border-b border-rule-2 py-3 last:border-b-0 md:grid-cols-[minmax(0,2fr)_minmax(0,1.2fr)]">
      <div className="min-w-0">
        <p className="font-semibold">{title ?? reason.message}</p>
        <p className="break-words text-ink-2">
          {plural(reason.count, 'row', 'rows')}
          {reason.column ? ` in ${reason.column}` : ''}
        </p>
        {title && !reason.message.startsWith(title) ? (
          <p className="mt-1 max-w-prose text-sm break-words text-ink-2">For example: {reason.message}</p>
        ) : null}
      </div>
      <ul className="min-w-0 text-[0.9375rem]">
        {reason.examples.map(({ line, recordRef, value }) => (
          <li key={line} className="break-words">
            line {formatCount(line)}
            {recordRef ? `, ${recordRef}` : ''}: {quoted(value)}
          </li>
        ))}
      </ul>
    </li>
  );
};

/** Refused rows by reason, with examples, and the file in which each has its reason. */
export const RefusedRows = ({ view }: { view: ImportView }) => {
  if (view.rejected === 0) return null;
  return (
    <Sheet
      title="Refused rows"
      aside={`${formatCount(view.rejected)} of ${plural(view.rowsRead, 'row', 'rows')}`}
      tools={
        <a className="link" href={refusedRowsPath(view.id)} download>
          Download refused rows
        </a>
      }
    >
      <ul className="border-t-2 border-ink">
        {view.summary?.rejectedByReason.map((reason) => (
          <RefusedGroup key={`${reason.code} ${reason.column ?? ''}`} reason={reason} />
        ))}
      </ul>
      <p className="mt-3 max-w-prose text-sm text-ink-2">
        A row can have several reasons. Mend the downloaded file and hand it in again: rows that came in before stay as
        they are.
      </p>
    </Sheet>
  );
};
