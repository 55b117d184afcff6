'use client';

import { useScopeOptions } from '@/analytics/scope-options/hook';
import { Button, LinkButton } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { PageHead } from '@/components/ui/page-head';
import { Sheet } from '@/components/ui/sheet';
import { Table, Td, Th } from '@/components/ui/table';
import { useViewer } from '@/components/viewer-context';
import { searchString } from '@/lib/api/client';
import { formatInstant } from '@/lib/format';
import type { ImportView } from '@/lib/imports/contract';
import { ChangedRecords } from './changed-records';
import type { useImportVerbs } from './import-api';
import { importSentence, takenCount } from './import-words';
import { NewNames } from './new-names';
import { OutcomeCounts } from './outcome-counts';
import { RefusedRows } from './refused-rows';
import { UndoImport } from './undo-import';

const KeptByUndo = ({ kept }: { kept: { recordRef: string; reason: string }[] }) =>
  kept.length ? (
    <Sheet title="Records that were kept" aside="Changed after the import">
      <Table label="Records that the undo kept">
        <thead>
          <tr>
            <Th>Ticket</Th>
            <Th>Why</Th>
          </tr>
        </thead>
        <tbody>
          {kept.map(({ recordRef, reason }) => (
            <tr key={recordRef}>
              <Th scope="row">{recordRef}</Th>
              <Td>{reason}</Td>
            </tr>
          ))}
        </tbody>
      </Table>
    </Sheet>
  ) : null;

/** The records that an import last added or changed, over the whole time: a file may be older than the usual period. */
const useRecordsHref = (importId: string): string => {
  const { data } = useScopeOptions();
  const { firstMonth, lastMonth } = data ?? {};
  const period = firstMonth && lastMonth ? { from: firstMonth, to: lastMonth } : {};
  return `/records${searchString({ ...period, importId })}`;
};

type ImportResultProps = { view: ImportView; verbs: ReturnType<typeof useImportVerbs> };

/** What came of a file that was taken in, or was undone. */
export const ImportResult = ({ view, verbs }: ImportResultProps) => {
  const { timeZone } = useViewer();
  const recordsHref = useRecordsHref(view.id);
  const isUndone = view.status === 'undone';
  const at = isUndone ? view.undoneAt : view.finishedAt;
  const canUndo = !isUndone && takenCount(view) > 0;
  return (
    <div className="flex flex-col gap-6">
      <PageHead
        title={importSentence(view)}
        sub={at ? `${isUndone ? 'Undone' : 'Taken in'} ${formatInstant(at, timeZone)}` : undefined}
        actions={
          <>
            {isUndone || takenCount(view) === 0 ? null : (
              <LinkButton tone="primary" href={recordsHref}>
                Open the records
              </LinkButton>
            )}
            <LinkButton href="/imports">Bring in another file</LinkButton>
          </>
        }
      />
      {verbs.undo.error || view.failure ? (
        <Notice tone="danger" announce title="The import was not undone">
          {verbs.undo.error?.message ?? view.failure}
        </Notice>
      ) : null}
      {verbs.undo.data && verbs.undo.data.status !== 'undone' && !isUndone ? (
        <Notice announce title="The undo goes on">
          It takes longer than usual.{' '}
          <Button className="mt-2" onClick={() => window.location.reload()}>
            Look again
          </Button>
        </Notice>
      ) : null}
      <OutcomeCounts view={view} />
      {view.summary ? <KeptByUndo kept={view.summary.keptByUndo} /> : null}
      <RefusedRows view={view} />
      {view.summary && !isUndone ? <NewNames names={view.summary.newNames} made /> : null}
      {isUndone ? null : <ChangedRecords view={view} made />}
      {canUndo ? <UndoImport view={view} undo={verbs.undo} /> : null}
    </div>
  );
};
