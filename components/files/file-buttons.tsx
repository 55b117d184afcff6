'use client';

import { useState } from 'react';
import { TextButton } from '@/components/ui/button';
import type { FileTable } from './file-table';
import { saveCsv, saveXlsx } from './save';

const SAID = { idle: '', making: 'Making the file', failed: 'The file could not be made. Try again.' };

/** Takes a table away as a file. `makeTable` is asked when it is wanted, and may have to read for it. */
export const FileButtons = ({ makeTable }: { makeTable: () => FileTable | Promise<FileTable> }) => {
  const [state, setState] = useState<keyof typeof SAID>('idle');
  const save = async (how: (table: FileTable) => Promise<void>) => {
    setState('making');
    setState(
      await Promise.resolve(makeTable())
        .then(how)
        .then(
          () => 'idle' as const,
          () => 'failed' as const,
        ),
    );
  };
  return (
    <>
      <TextButton onClick={() => save(saveCsv)}>CSV</TextButton>
      <TextButton onClick={() => save(saveXlsx)}>Excel</TextButton>
      <span role="status" className="text-ink-2">
        {SAID[state]}
      </span>
    </>
  );
};
