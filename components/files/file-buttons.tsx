'use client';

import { useState } from 'react';
import { TextButton } from '@/components/ui/button';
import type { FileTable } from './file-table';
import { saveCsv, saveXlsx } from './save';

/** Takes a table away as a file. `makeTable` is asked when it is wanted. */
export const FileButtons = ({ makeTable }: { makeTable: () => FileTable }) => {
  const [failed, setFailed] = useState(false);
  const save = async (how: (table: FileTable) => Promise<void>) => {
    setFailed(
      await how(makeTable()).then(
        () => false,
        () => true,
      ),
    );
  };
  return (
    <>
      <TextButton onClick={() => save(saveCsv)}>CSV</TextButton>
      <TextButton onClick={() => save(saveXlsx)}>Excel</TextButton>
      <span role="status" className="text-ink-2">
        {failed ? 'The file could not be made. Try again.' : ''}
      </span>
    </>
  );
};
