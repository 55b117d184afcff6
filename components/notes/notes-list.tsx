'use client';

import type { NoteDraft } from '@/analytics/notes/hook';
import { TextButton } from '@/components/ui/button';
import { useMay } from '@/components/viewer-context';
import { NoteForm } from './note-form';
import { NoteItem } from './note-item';
import type { NumberedNote } from './numbered';

type NotesListProps = {
  notes: readonly NumberedNote[];
  /** The note being written; null while none is. */
  draft: NoteDraft | null;
  onWrite: () => void;
  onDone: () => void;
};

/** The notes under a chart, numbered as their marks in it, and the place to write another. */
export const NotesList = ({ notes, draft, onWrite, onDone }: NotesListProps) => {
  const mayWrite = useMay('notes:write');
  if (!notes.length && !mayWrite) return null;
  return (
    <section aria-label="Notes" className="mt-3 flex flex-col gap-3 border-t border-rule-2 pt-3">
      {notes.length ? (
        <ol className="flex flex-col gap-2.5">
          {notes.map((note) => (
            <NoteItem key={note.id} note={note} />
          ))}
        </ol>
      ) : null}
      {draft ? (
        <NoteForm key={`${draft.from} ${draft.to}`} note={null} draft={draft} onDone={onDone} />
      ) : mayWrite ? (
        <p className="text-sm print:hidden">
          <TextButton onClick={onWrite}>Add a note</TextButton>
          <span className="text-ink-2"> of what made a month what it was</span>
        </p>
      ) : null}
    </section>
  );
};
