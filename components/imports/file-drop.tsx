'use client';

import { clsx } from 'clsx';
import { useRouter } from 'next/navigation';
import { type DragEvent, useId, useState } from 'react';
import { Notice } from '@/components/ui/notice';
import { MOST_FILE_MB, MOST_XLSX_MB } from '@/lib/imports/limits';
import { useUpload } from './import-api';

const MB = 1024 * 1024;

const faultOf = (file: File): string | null => {
  if (file.size === 0) return `“${file.name}” is empty.`;
  if (/\.xlsx$/i.test(file.name) && file.size > MOST_XLSX_MB * MB)
    return `Excel files may have up to ${MOST_XLSX_MB} MB. Save “${file.name}” as CSV: those may have ${MOST_FILE_MB} MB.`;
  return file.size > MOST_FILE_MB * MB ? `“${file.name}” is larger than ${MOST_FILE_MB} MB. Send it in parts.` : null;
};

/** Takes a file by choosing or by dragging, sends it and goes on to its preview. */
export const FileDrop = () => {
  const id = useId();
  const router = useRouter();
  const upload = useUpload();
  const [over, setOver] = useState(false);
  const [fault, setFault] = useState<string | null>(null);

  const send = (file: File | undefined) => {
    if (!file || upload.isPending) return;
    const found = faultOf(file);
    setFault(found);
    if (!found) upload.mutate(file, { onSuccess: (made) => router.push(`/imports/${made.id}`) });
  };
  const drop = (event: DragEvent) => {
    event.preventDefault();
    setOver(false);
    send(event.dataTransfer.files[0]);
  };
  const problem = fault ?? upload.error?.message ?? null;
  const isSending = upload.isPending || upload.isSuccess;

  return (
    <>
      <label
        htmlFor={id}
        onDragOver={(event) => {
          event.preventDefault();
          setOver(true);
        }}
        onDragLeave={() => setOver(false)}
        onDrop={drop}
        className={clsx(
          'flex min-h-40 cursor-pointer flex-col items-center justify-center gap-1 border-2 border-dashed px-4 py-6 text-center',
          'has-focus-visible:outline-2 has-focus-visible:outline-offset-2 has-focus-visible:outline-act',
          over ? 'border-act bg-act-weak' : 'border-edge bg-sheet-2 hover:border-ink',
        )}
      >
        <span className="text-lg font-semibold">
          {isSending ? `Sending ${upload.variables?.name ?? 'the file'}` : 'Choose a file, or drag one here'}
        </span>
        <span className="max-w-prose text-ink-2">
          CSV up to {MOST_FILE_MB} MB or Excel (.xlsx) up to {MOST_XLSX_MB} MB. Nothing is taken in before you have seen
          what it would change.
        </span>
        <input
          id={id}
          type="file"
          accept=".csv,.txt,.tsv,.xlsx,text/csv,text/tab-separated-values"
          className="sr-only"
          disabled={isSending}
          onChange={(event) => {
            send(event.target.files?.[0]);
            // The same file can be chosen again after it was mended.
            event.target.value = '';
          }}
        />
      </label>
      <p role="status" className="sr-only">
        {isSending ? 'Sending the file' : ''}
      </p>
      {problem ? (
        <Notice tone="danger" announce className="mt-3" title="This file was not taken">
          {problem}
        </Notice>
      ) : null}
    </>
  );
};
