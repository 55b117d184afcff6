import { Table, Td, Th } from '@/components/ui/table';
import { RECOVERY_FIELDS } from '@/lib/imports/fields';
import { COLUMN_GUIDE, isNeeded, templateAddress } from './column-guide';

/** What a file should hold, folded away until somebody asks, and a file to begin from. */
export const ColumnsExplained = () => (
  <div className="mt-5 flex flex-col gap-2 border-t border-rule-2 pt-3">
    <p className="text-ink-2">
      The first row names the columns, in any order; columns we have no field for are kept with the record.{' '}
      <a className="link" href={templateAddress()} download="recoveries.csv">
        Download a template
      </a>
    </p>
    <details>
      <summary className="link w-fit cursor-pointer py-1.5">The columns and what they hold</summary>
      <Table label="Columns of the recovery file" className="mt-2">
        <thead>
          <tr>
            <Th>Column</Th>
            <Th>Needed</Th>
            <Th>What it holds</Th>
          </tr>
        </thead>
        <tbody>
          {RECOVERY_FIELDS.map((field) => (
            <tr key={field}>
              <Th scope="row" className="font-mono text-sm whitespace-nowrap">
                {field}
              </Th>
              <Td>{isNeeded(field) ? 'yes' : ''}</Td>
              <Td className="min-w-64">{COLUMN_GUIDE[field]}</Td>
            </tr>
          ))}
        </tbody>
      </Table>
    </details>
  </div>
);
