import { Notice } from '@/components/ui/notice';
import { Table, Td, Th } from '@/components/ui/table';
import { FIELD_LABELS } from '@/lib/recoveries/fields';
import type { Clash } from './conflict';

type ConflictNoticeProps = { sentence: string; clashes: readonly Clash[] };

const shown = (text: string) => text || 'not stated';

/** Both versions side by side; what was typed here still stands in the fields below. */
export const ConflictNotice = ({ sentence, clashes }: ConflictNoticeProps) => (
  <Notice tone="warning" announce title={sentence} className="mb-5">
    <p>What you typed still stands below. Fields that you had not touched now follow the newer version.</p>
    {clashes.length ? (
      <Table label="Both versions" className="mt-2">
        <thead>
          <tr>
            <Th>Field</Th>
            <Th>You opened</Th>
            <Th>Newer version</Th>
            <Th>You typed</Th>
          </tr>
        </thead>
        <tbody>
          {clashes.map(({ field, began, theirs, mine }) => (
            <tr key={field}>
              <Td>{FIELD_LABELS[field]}</Td>
              <Td>{shown(began)}</Td>
              <Td>{shown(theirs)}</Td>
              <Td>{mine === began ? '—' : shown(mine)}</Td>
            </tr>
          ))}
        </tbody>
      </Table>
    ) : null}
  </Notice>
);
