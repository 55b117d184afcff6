import { Sheet } from '@/components/ui/sheet';
import { Table, Td, Th } from '@/components/ui/table';
import { formatCount } from '@/lib/format';
import type { ImportView } from '@/lib/imports/contract';
import { FIELD_NAMES } from '@/lib/imports/field-names';

const nameOf = (field: string): string => Object.entries(FIELD_NAMES).find(([name]) => name === field)?.[1] ?? field;

/** Records that are known and differ in the file: what stands there, and what the file says. */
export const ChangedRecords = ({ view, made }: { view: ImportView; made: boolean }) => {
  const changes = view.summary?.changes ?? [];
  if (changes.length === 0) return null;
  return (
    <Sheet
      title={made ? 'Changed records' : 'Records that would change'}
      aside={
        view.updated > changes.length
          ? `The first ${formatCount(changes.length)} of ${formatCount(view.updated)}`
          : formatCount(view.updated)
      }
    >
      <Table label="Changed records, before and after">
        <thead>
          <tr>
            <Th>Ticket</Th>
            <Th>What</Th>
            <Th>Before</Th>
            <Th>After</Th>
          </tr>
        </thead>
        <tbody>
          {changes.flatMap(({ recordRef, line, fields }) =>
            fields.map(({ field, before, after }, i) => (
              <tr key={`${line} ${field}`}>
                <Th scope="row" className="whitespace-nowrap">
                  {i === 0 ? recordRef : <span className="sr-only">{recordRef}</span>}
                </Th>
                <Td>{nameOf(field)}</Td>
                <Td className="text-ink-2">{before ?? 'not stated'}</Td>
                <Td className="font-medium">{after ?? 'not stated'}</Td>
              </tr>
            )),
          )}
        </tbody>
      </Table>
    </Sheet>
  );
};
