import { FileButtons } from '@/components/files/file-buttons';
import type { FileTable } from '@/components/files/file-table';
import { Table, Td, Th } from '@/components/ui/table';
import { useViewer } from '@/components/viewer-context';
import type { AdditionImport } from '@/lib/charge-additions/file/contract';
import { formatCount, plural } from '@/lib/format';

const SHOWN = 20;

const reasonsText = ({ reasons }: AdditionImport['refused'][number]): string =>
  reasons.map(({ column, message }) => (column ? `${column}: ${message}` : message)).join(' ');

/** What a file did, or would do: `12 new additions, 3 changed, 40 as they were, 2 rows refused`. */
export const outcomeText = ({
  added,
  updated,
  unchanged,
  rejected,
}: Pick<AdditionImport, 'added' | 'updated' | 'unchanged' | 'rejected'>): string =>
  [
    plural(added, 'new addition', 'new additions'),
    updated ? `${formatCount(updated)} changed` : '',
    unchanged ? `${formatCount(unchanged)} as they were` : '',
    rejected ? `${plural(rejected, 'row', 'rows')} refused` : '',
  ]
    .filter(Boolean)
    .join(', ');

/** Refused rows with line, column and reason, and a file of them to be mended. */
export const RefusedAdditions = ({ file }: { file: AdditionImport }) => {
  const { massUnit } = useViewer();
  if (file.refused.length === 0) return null;
  const table = (): FileTable => ({
    title: `Refused rows of ${file.fileName}`,
    scopeWords: file.fileName,
    unit: massUnit,
    columns: [...file.headers, 'reason'].map((label) => ({ label, kind: 'text' })),
    rows: file.refused.map((row) => [...file.headers.map((_, index) => row.cells[index] ?? ''), reasonsText(row)]),
  });
  return (
    <div className="mt-4">
      <Table label="Refused rows">
        <thead>
          <tr>
            <Th>Line</Th>
            <Th>Ref</Th>
            <Th>Why it was refused</Th>
          </tr>
        </thead>
        <tbody>
          {file.refused.slice(0, SHOWN).map((row) => (
            <tr key={row.line}>
              <Th scope="row">{row.line}</Th>
              <Td>{row.additionRef ?? '—'}</Td>
              <Td className="min-w-64">{reasonsText(row)}</Td>
            </tr>
          ))}
        </tbody>
      </Table>
      <p className="mt-2 flex flex-wrap gap-x-5 text-sm text-ink-2">
        {file.refused.length > SHOWN ? `The first ${SHOWN} of ${formatCount(file.refused.length)}. ` : ''}
        All refused rows with their reasons: <FileButtons makeTable={table} />
      </p>
    </div>
  );
};
