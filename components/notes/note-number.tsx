import type { NumberedNote } from './numbered';

/** The number of a note, as the chart shows it. */
export const NoteNumber = ({ note: { no, text } }: { note: Pick<NumberedNote, 'no' | 'text'> }) => (
  <span
    title={text}
    className="mt-1 inline-flex size-4 shrink-0 items-center justify-center bg-ink font-mono text-xs leading-none font-semibold text-sheet print:border print:bg-sheet print:text-ink"
  >
    <span className="sr-only">Note </span>
    {no}
  </span>
);
