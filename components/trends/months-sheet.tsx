'use client';

import { useState } from 'react';
import type { Dimension } from '@/analytics/dimensions';
import { lastWholeMonth, type Stacks } from '@/analytics/monthly-trends/series';
import type { NoteDraft } from '@/analytics/notes/hook';
import type { ChartModel } from '@/components/charts/model';
import { modelFile } from '@/components/charts/model-file';
import { StackedMonthsFigure } from '@/components/charts/stacked-months-figure';
import { FileButtons } from '@/components/files/file-buttons';
import { NotesList } from '@/components/notes/notes-list';
import { type NumberedNote, wholeMonth } from '@/components/notes/numbered';
import { DIMENSION_WORDS } from '@/components/scope/wording';
import { TextButton } from '@/components/ui/button';
import { Sheet } from '@/components/ui/sheet';
import { useMay } from '@/components/viewer-context';
import { formatCount, plural } from '@/lib/format';
import { SplitSelector } from './split-selector';

type MonthsSheetProps = {
  stacks: Stacks;
  /** By what the months shown are split, and by what they will be once the newer figures are here. */
  shownBy: Dimension;
  by: Dimension;
  onSplit: (by: Dimension) => void;
  model: ChartModel;
  notes: readonly NumberedNote[];
  className?: string;
};

/** Says that only the largest are told apart, where that is so. */
const othersNote = ({ layers }: Stacks): string => {
  const others = layers.find(({ key }) => key === null);
  return others ? `, the ${formatCount(layers.length - 1)} largest and ${plural(others.keys, 'other', 'others')}` : '';
};

/** The months as a chart, with the notes that explain them. */
export const MonthsSheet = ({ stacks, shownBy, by, onSplit, model, notes, className }: MonthsSheetProps) => {
  const mayWrite = useMay('notes:write');
  const [draft, setDraft] = useState<NoteDraft | null>(null);
  const write = (month: string) => setDraft({ ...wholeMonth(month), text: '' });
  const latest = (lastWholeMonth(stacks.months) ?? stacks.months.at(-1))?.month;
  return (
    <Sheet
      title="Recovered mass by month"
      aside={`${model.unit}, by ${DIMENSION_WORDS[shownBy].one}${othersNote(stacks)}${model.overlays.length ? '; the line is the year before' : ''}`}
      tools={<FileButtons makeTable={() => modelFile(model)} />}
      {...(className ? { className } : {})}
    >
      <SplitSelector by={by} onChange={onSplit} />
      <StackedMonthsFigure
        model={model}
        verbsOf={(month) =>
          mayWrite ? (
            <TextButton className="print:hidden" onClick={() => write(month)}>
              Add a note
            </TextButton>
          ) : null
        }
      />
      <NotesList notes={notes} draft={draft} onWrite={() => latest && write(latest)} onDone={() => setDraft(null)} />
    </Sheet>
  );
};
