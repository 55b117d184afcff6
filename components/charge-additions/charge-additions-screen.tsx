'use client';

import Link from 'next/link';
import { PageHead } from '@/components/ui/page-head';
import { Sheet } from '@/components/ui/sheet';
import { Table, Td, Th } from '@/components/ui/table';
import { useMay } from '@/components/viewer-context';
import { ADDITION_FIELDS } from '@/lib/charge-additions/file/fields';
import { additionTemplate, COLUMN_MEANINGS, isNeededColumn } from './column-meanings';
import { TakeFile } from './take-file';
import { TakenFiles } from './taken-files';

/** Where files of charge additions come in. */
export const ChargeAdditionsScreen = () => {
  const mayWrite = useMay('leaks:write');
  return (
    <div className="flex flex-col gap-6">
      <PageHead
        title="Bring in refrigerant that was added"
        sub={
          <>
            Leak rates are computed from what is put into appliances. A single addition is written down on the page of
            its{' '}
            <Link href="/appliances" className="link">
              appliance
            </Link>
            ; a file brings many.
          </>
        }
      />
      {mayWrite ? (
        <Sheet title="A file">
          <TakeFile />
          <div className="mt-5 border-t border-rule-2 pt-3">
            <p className="text-ink-2">
              The first row names the columns, in any order. The same file twice changes nothing.{' '}
              <a className="link" href={additionTemplate()} download="charge-additions.csv">
                Download a template
              </a>
            </p>
            <details>
              <summary className="link w-fit cursor-pointer py-1.5">The columns and what they hold</summary>
              <Table label="Columns of a file of additions" className="mt-2">
                <thead>
                  <tr>
                    <Th>Column</Th>
                    <Th>Needed</Th>
                    <Th>What it holds</Th>
                  </tr>
                </thead>
                <tbody>
                  {ADDITION_FIELDS.map((field) => (
                    <tr key={field}>
                      <Th scope="row" className="font-mono text-sm whitespace-nowrap">
                        {field}
                      </Th>
                      <Td>{isNeededColumn(field) ? 'yes' : ''}</Td>
                      <Td className="min-w-64">{COLUMN_MEANINGS[field]}</Td>
                    </tr>
                  ))}
                </tbody>
              </Table>
            </details>
          </div>
        </Sheet>
      ) : null}
      <TakenFiles />
    </div>
  );
};
