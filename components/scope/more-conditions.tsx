'use client';

import { type ReactNode, useState } from 'react';
import type { ScopePart } from '@/analytics/dimensions';
import { TextButton } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Popover } from '@/components/ui/popover';
import { useNarrow } from './use-narrow';
import { DIMENSION_WORDS } from './wording';

type MoreConditionsProps = {
  /** Dimensions that the sentence does not speak of yet. */
  dimensions: readonly ScopePart[];
  editorOf: (dimension: ScopePart) => (close: () => void) => ReactNode;
};

/** Brings a further dimension into the sentence: first which one, then which values. */
export const MoreConditions = ({ dimensions, editorOf }: MoreConditionsProps) => {
  const [open, setOpen] = useState(false);
  const [chosen, setChosen] = useState<ScopePart | null>(null);
  const narrow = useNarrow();
  if (!dimensions.length) return null;
  const show = (next: boolean) => {
    setOpen(next);
    setChosen(null);
  };
  const content = chosen ? (
    editorOf(chosen)(() => show(false))
  ) : (
    <ul>
      {dimensions.map((dimension) => (
        <li key={dimension}>
          <button
            type="button"
            onClick={() => setChosen(dimension)}
            className="flex min-h-11 w-full items-center px-2 text-left hover:bg-act-weak pointer-fine:min-h-9"
          >
            By {DIMENSION_WORDS[dimension].one}
          </button>
        </li>
      ))}
    </ul>
  );
  if (narrow) {
    return (
      <>
        <TextButton onClick={() => show(true)}>Narrow further</TextButton>
        <Dialog open={open} onOpenChange={show} title="Narrow further">
          {content}
        </Dialog>
      </>
    );
  }
  return (
    <Popover
      open={open}
      onOpenChange={show}
      trigger={<TextButton>Narrow further</TextButton>}
      label="Narrow further"
      className="p-4"
    >
      {content}
    </Popover>
  );
};
