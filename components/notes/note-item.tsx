'use client';

import { useState } from 'react';
import { useDeleteNote } from '@/analytics/notes/hook';
import { TextButton } from '@/components/ui/button';
import { useMay } from '@/components/viewer-context';
import { NoteForm } from './note-form';
import { NoteNumber } from './note-number';
import { type NumberedNote, noteDays } from './numbered';

/** One note with who wrote it; changed and taken away in place. */
export const NoteItem = ({ note }: { note: NumberedNote }) => {
  const mayWrite = useMay('notes:write');
  const [mode, setMode] = useState<'read' | 'change' | 'remove'>('read');
  const { mutate: remove, error, isPending } = useDeleteNote();
  if (mode === 'change')
    return (
      <li>
        <NoteForm
          note={note}
          draft={{ from: note.from, to: note.to, text: note.text }}
          onDone={() => setMode('read')}
        />
      </li>
    );
  return (
    <li className="flex gap-3">
      <NoteNumber note={note} />
      <div className="min-w-0">
        <p className="max-w-prose break-words">
          <span className="font-semibold">{noteDays(note)}</span>: {note.text}
        </p>
        <p className="flex flex-wrap gap-x-4 text-sm text-ink-2">
          <span>{note.writtenBy}</span>
          {mayWrite && mode === 'read' ? (
            <span className="flex gap-x-4 print:hidden">
              <TextButton onClick={() => setMode('change')}>Change</TextButton>
              <TextButton onClick={() => setMode('remove')}>Take away</TextButton>
            </span>
          ) : null}
          {mode === 'remove' ? (
            <span className="flex flex-wrap gap-x-4 print:hidden">
              Take this note away? It stays in the history.
              <TextButton disabled={isPending} onClick={() => remove(note)}>
                Yes, take it away
              </TextButton>
              <TextButton onClick={() => setMode('read')}>Keep it</TextButton>
            </span>
          ) : null}
        </p>
        {error ? (
          <p role="alert" className="text-sm font-medium text-danger">
            {error.message}
          </p>
        ) : null}
      </div>
    </li>
  );
};
