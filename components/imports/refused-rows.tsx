import { Sheet } from '@/components/ui/sheet';
import { Table, Td, Th } from '@/components/ui/table';
import { formatCount } from '@/lib/format';
import type { ImportView } from '@/lib/imports/contract';
import { refusedRowsPath } from './import-api';

const quoted = (value: string) => (value === '' ? 'empty' : `“${value}”`);

/** Refused rows by reason, with examples, and the file in which each has its reason. */
export const RefusedRows = ({ view }: { view: ImportView }) => {
  const reasons = view.summary?.rejectedByReason ?? [];
  if (view.rejected === 0) return null;
  return (
    <Sheet
      title="Refused rows"
      aside={`${formatCount(view.rejected)} of ${formatCount(view.rowsRead)} rows`}
      tools={
        <a className="link" href={refusedRowsPath(view.id)} download>
          Download refused rows
        </a>
      }
    >
      <Table label="Refused rows by reason">
        <thead>
          <tr>
            <Th>Column</Th>
            <Th numeric>Rows</Th>
            <Th>Reason</Th>
            <Th>For example</Th>
          </tr>
        </thead>
        <tbody>
          {reasons.map((reason) => (
            <tr key={`${reason.code} ${reason.column ?? ''}`}>
              <Th scope="row" className="max-w-40 align-top break-words">
                {reason.column ?? 'whole row'}
              </Th>
              <Td numeric className="align-top">
                {formatCount(reason.count)}
              </Td>
              <Td className="min-w-56 align-top">{reason.message}</Td>
              <Td className="min-w-56 align-top">
                {reason.examples.map(({ line, recordRef, value }) => (
                  <span key={line} className="block break-words">
                    line {formatCount(line)}
                    {recordRef ? `, ${recordRef}` : ''}: {quoted(value)}
                  </span>
                ))}
              </Td>
            </tr>
          ))}
        </tbody>
      </Table>
      <p className="mt-3 max-w-prose text-sm text-ink-2">
        A row can have several reasons. Mend the downloaded file and hand it in again: rows that came in before stay as
        they are.
      </p>
    </Sheet>
  );
};
