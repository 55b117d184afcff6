'use client';

import { useState } from 'react';
import { TextButton } from '@/components/ui/button';
import { Sheet } from '@/components/ui/sheet';
import { Table, Td, Th } from '@/components/ui/table';
import { formatCount } from '@/lib/format';
import type { ImportView } from '@/lib/imports/contract';
import { FIELD_NAMES } from '@/lib/imports/field-names';

const FIRST = 20;

const nameOf = (field: string): string => Object.entries(FIELD_NAMES).find(([name]) => name === field)?.[1] ?? field;

/** Records that are known and differ in the file: what stands there, and what the file says. */
export const ChangedRecords = ({ view, made }: { view: ImportView; made: boolean }) => {
  const [all, setAll] = useState(false);
  const changes = view.summary?.changes ?? [];
  if (changes.length === 0) return null;
  const shown = all ? changes : changes.slice(0, FIRST);
  return (
    <Sheet
      title={made ? 'Changed records' : 'Records that would change'}
      aside={
        view.updated > shown.length
          ? `The first ${formatCount(shown.length)} of ${formatCount(view.updated)}`
          : formatCount(view.updated)
      }
      tools={
        changes.length > shown.length ? (
          <TextButton onClick={() => setAll(true)}>Show {formatCount(changes.length)}</TextButton>
        ) : undefined
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
          {shown.flatMap(({ recordRef, line, fields }) =>
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
