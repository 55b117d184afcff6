'use client';

import { useState } from 'react';
import type { Dimension } from '@/analytics/dimensions';
import { lastWholeMonth, type Stacks } from '@/analytics/monthly-trends/series';
import type { NoteDraft } from '@/analytics/notes/hook';
import type { ScopeSelection } from '@/analytics/scope-address';
import { NotesList } from '@/components/notes/notes-list';
import { type NumberedNote, wholeMonth } from '@/components/notes/numbered';
import { DIMENSION_WORDS } from '@/components/scope/wording';
import { TextButton } from '@/components/ui/button';
import { Sheet } from '@/components/ui/sheet';
import { useMay } from '@/components/viewer-context';
import { comparesYears, MonthsChart } from './months-chart';
import { SplitSelector } from './split-selector';

type MonthsSheetProps = {
  stacks: Stacks;
  /** By what the months shown are split, and by what they will be once the newer figures are here. */
  shownBy: Dimension;
  by: Dimension;
  onSplit: (by: Dimension) => void;
  scope: ScopeSelection;
  colours: Record<string, string>;
  notes: readonly NumberedNote[];
  className?: string;
};

/** The months as a chart, with the notes that explain them. */
export const MonthsSheet = ({ stacks, shownBy, by, onSplit, scope, colours, notes, className }: MonthsSheetProps) => {
  const mayWrite = useMay('notes:write');
  const [draft, setDraft] = useState<NoteDraft | null>(null);
  const write = (month: string) => setDraft({ ...wholeMonth(month), text: '' });
  const latest = (lastWholeMonth(stacks.months) ?? stacks.months.at(-1))?.month;
  return (
    <Sheet
      title="Recovered mass by month"
      aside={`${scope.unit}, by ${DIMENSION_WORDS[shownBy].one}${comparesYears(stacks) ? '; the line is the year before' : ''}`}
      {...(className ? { className } : {})}
    >
      <SplitSelector by={by} onChange={onSplit} />
      <MonthsChart
        stacks={stacks}
        by={shownBy}
        scope={scope}
        colours={colours}
        notes={notes}
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
