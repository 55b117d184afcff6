'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { plural } from '@/lib/format';
import type { ImportView } from '@/lib/imports/contract';
import type { useImportVerbs } from './import-api';

type UndoImportProps = { view: ImportView; undo: ReturnType<typeof useImportVerbs>['undo'] };

/** Takes an import back, after saying what that does. */
export const UndoImport = ({ view, undo }: UndoImportProps) => {
  const [asking, setAsking] = useState(false);
  if (!asking)
    return (
      <Button tone="danger" className="self-start" onClick={() => setAsking(true)}>
        Undo this import
      </Button>
    );
  return (
    <Notice tone="warning" title="Undo this import?" className="w-full">
      <p>
        {view.added ? `${plural(view.added, 'record that came with it goes', 'records that came with it go')}. ` : ''}
        {view.updated ? `${plural(view.updated, 'record gets its', 'records get their')} former values back. ` : ''}
        Records that somebody edited since are kept and listed. The history keeps all of it.
      </p>
      <div className="mt-3 flex flex-wrap gap-3">
        <Button
          tone="danger"
          autoFocus
          disabled={undo.isPending}
          onClick={() => undo.mutate(undefined, { onSettled: () => setAsking(false) })}
        >
          {undo.isPending ? 'Undoing' : 'Undo it'}
        </Button>
        <Button disabled={undo.isPending} onClick={() => setAsking(false)}>
          Keep it
        </Button>
      </div>
    </Notice>
  );
};
