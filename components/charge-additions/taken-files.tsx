'use client';

import { useState } from 'react';
import { TextButton } from '@/components/ui/button';
import { Sheet } from '@/components/ui/sheet';
import { Failed, Loading } from '@/components/ui/states';
import { useMay, useViewer } from '@/components/viewer-context';
import type { AdditionImportList } from '@/lib/charge-additions/file/contract';
import { formatInstant, formatList, plural } from '@/lib/format';
import { outcomeText } from './file-outcome';
import { useTakenFiles, useUndoFile } from './files-api';

type Taken = AdditionImportList['items'][number];

const TakenFile = ({ file }: { file: Taken }) => {
  const mayWrite = useMay('leaks:write');
  const { timeZone } = useViewer();
  const [asking, setAsking] = useState(false);
  const { mutate, data, error, isPending } = useUndoFile();
  return (
    <li className="border-b border-rule-2 py-2 last:border-b-0">
      <p className="font-semibold break-words">{file.fileName}</p>
      <p className="text-sm text-ink-2">
        {formatInstant(file.createdAt, timeZone)}, {file.createdBy}: {outcomeText(file)}
        {file.undoneAt ? `. Undone ${formatInstant(file.undoneAt, timeZone)}` : ''}
      </p>
      {data ? (
        <p role="status" className="text-sm">
          {plural(data.removed, 'addition', 'additions')} taken away, {data.restored} put back
          {data.kept.length
            ? `; kept because they were changed since: ${formatList(data.kept.map(({ additionRef }) => additionRef))}`
            : ''}
          .
        </p>
      ) : null}
      {mayWrite && !file.undoneAt ? (
        <p className="flex flex-wrap gap-x-4 text-sm print:hidden">
          {asking ? (
            <>
              Additions that it brought go, changed ones get their former values, those corrected since are kept.
              <TextButton disabled={isPending} onClick={() => mutate(file.id, { onSettled: () => setAsking(false) })}>
                Yes, undo it
              </TextButton>
              <TextButton onClick={() => setAsking(false)}>Keep it</TextButton>
            </>
          ) : (
            <TextButton onClick={() => setAsking(true)}>Undo this file</TextButton>
          )}
        </p>
      ) : null}
      {error ? (
        <p role="alert" className="text-sm font-medium text-danger">
          {error.message}
        </p>
      ) : null}
    </li>
  );
};

/** Files of additions that were taken in, each of which can be undone. */
export const TakenFiles = () => {
  const { data, error, refetch } = useTakenFiles();
  return (
    <Sheet title="Files taken in" aside="newest first">
      {data ? (
        data.items.length ? (
          <ul>
            {data.items.map((file) => (
              <TakenFile key={file.id} file={file} />
            ))}
          </ul>
        ) : (
          <p className="text-ink-2">None yet.</p>
        )
      ) : error ? (
        <Failed error={error} onRetry={() => refetch()} />
      ) : (
        <Loading />
      )}
    </Sheet>
  );
};
