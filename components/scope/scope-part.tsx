'use client';

import { clsx } from 'clsx';
import { type ReactNode, useState } from 'react';
import { Dialog } from '@/components/ui/dialog';
import { Popover } from '@/components/ui/popover';
import { useNarrow } from './use-narrow';

type ScopePartProps = {
  /** What is set here, for the reader of the opened part: "Branches". */
  label: string;
  /** The words in the sentence. */
  children: ReactNode;
  /** The stop behind the words, which must not begin a line of its own. */
  stop?: string;
  /** Wider than the usual popover. */
  wide?: boolean;
  /** The words say something that the records do not know. */
  doubtful?: boolean;
  /** What stands in the opened part; `close` puts it away. */
  editor: (close: () => void) => ReactNode;
};

/** One part of the sentence, set in place: beside the word on a wide window, in a sheet from the bottom on a phone. */
export const ScopePart = ({ label, children, stop = '', wide = false, doubtful = false, editor }: ScopePartProps) => {
  const [open, setOpen] = useState(false);
  const narrow = useNarrow();
  const close = () => setOpen(false);
  const word = (
    <button
      type="button"
      onClick={narrow ? () => setOpen(true) : undefined}
      aria-haspopup="dialog"
      className="group relative inline text-left font-semibold text-ink pointer-coarse:py-1.5 pointer-coarse:after:absolute pointer-coarse:after:-inset-y-1 pointer-coarse:after:inset-x-0"
    >
      <span
        className={clsx(
          'border-b-[1.5px] border-dotted border-ink-3 pb-px group-hover:border-solid group-hover:border-act',
          doubtful ? 'marked' : 'group-hover:text-act',
        )}
      >
        {children}
      </span>
      <span aria-hidden="true" className="font-normal text-ink-2">
        {stop}
      </span>
    </button>
  );
  if (narrow) {
    return (
      <>
        {word}
        <Dialog open={open} onOpenChange={setOpen} title={label}>
          {editor(close)}
        </Dialog>
      </>
    );
  }
  return (
    <Popover open={open} onOpenChange={setOpen} trigger={word} label={label} className={clsx('p-4', wide && 'w-96')}>
      {editor(close)}
    </Popover>
  );
};
