'use client';

import { type ChangeEvent, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field, TextInput } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { outcomeText, RefusedAdditions } from './file-outcome';
import { usePreviewFile, useTakeFile } from './files-api';

/** Takes a file: first what would come of it, then, when the person says so, for good. */
export const TakeFile = () => {
  const [file, setFile] = useState<File | null>(null);
  const preview = usePreviewFile();
  const take = useTakeFile();
  const choose = (event: ChangeEvent<HTMLInputElement>) => {
    const [chosen] = event.target.files ?? [];
    take.reset();
    preview.reset();
    setFile(chosen ?? null);
    if (chosen) preview.mutate(chosen);
    // The same file, mended, can be chosen again.
    event.target.value = '';
  };
  const seen = take.data ?? preview.data;
  const error = take.error ?? preview.error;
  const isOver = Boolean(take.data);
  return (
    <div>
      <Field
        label="A file of additions"
        hint="CSV or Excel (.xlsx), up to 10 MB. You see what it would do before it does anything."
      >
        <TextInput type="file" accept=".csv,.tsv,.txt,.xlsx" className="py-2" onChange={choose} />
      </Field>
      {preview.isPending ? (
        <p role="status" className="mt-3">
          Reading {file?.name}
        </p>
      ) : null}
      {error ? (
        <Notice tone="danger" announce className="mt-3" title="Nothing was taken in">
          {error.message}
        </Notice>
      ) : null}
      {seen ? (
        <Notice
          announce
          tone={isOver ? 'good' : 'info'}
          className="mt-3"
          title={isOver ? `${seen.fileName} is taken in` : `What ${seen.fileName} would do`}
        >
          {outcomeText(seen)}.
        </Notice>
      ) : null}
      {seen && !isOver && file ? (
        <div className="mt-3 flex flex-wrap gap-3">
          <Button
            tone="primary"
            disabled={take.isPending || seen.added + seen.updated === 0}
            onClick={() => take.mutate(file)}
          >
            {take.isPending ? 'Taking it in' : 'Take it in'}
          </Button>
          <Button onClick={() => preview.reset()}>Leave it</Button>
        </div>
      ) : null}
      {seen ? <RefusedAdditions file={seen} /> : null}
    </div>
  );
};
