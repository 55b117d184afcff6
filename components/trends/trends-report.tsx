'use client';

import { clsx } from 'clsx';
import { useMemo } from 'react';
import type { Dimension } from '@/analytics/dimensions';
import type { MonthlyTrends } from '@/analytics/monthly-trends/contract';
import { lastWholeMonth, toStacks, yearBeforeOf } from '@/analytics/monthly-trends/series';
import type { ScopeSelection } from '@/analytics/scope-address';
import { modelFile } from '@/components/charts/model-file';
import { ModelTable } from '@/components/charts/model-table';
import { FileButtons } from '@/components/files/file-buttons';
import { numbered } from '@/components/notes/numbered';
import { NothingInScope } from '@/components/scope/nothing-in-scope';
import { Sheet } from '@/components/ui/sheet';
import { BranchesSheet } from './branches-sheet';
import { ComparisonSheet } from './comparison-sheet';
import { layerColours } from './layer-colours';
import { MonthTicket } from './month-ticket';
import { monthsModel } from './months-model';
import { MonthsSheet } from './months-sheet';
import { SeasonSheet } from './season-sheet';
import { TrendsHead } from './trends-head';
import type { TrendsFigures } from './use-trends-figures';

type TrendsReportProps = {
  trends: MonthlyTrends;
  figures: TrendsFigures;
  scope: ScopeSelection;
  by: Dimension;
  onSplit: (by: Dimension) => void;
};

/** The answer, the ticket, the chart with its notes, the comparison, season and trend, the branches and the table. */
export const TrendsReport = ({ trends, figures, scope, by, onSplit }: TrendsReportProps) => {
  const { query, address, comparison, pattern } = figures;
  const notes = useMemo(() => numbered(figures.notes ?? []), [figures.notes]);
  const stale = figures.months.isPlaceholderData;
  const stacks = useMemo(() => toStacks(trends), [trends]);
  // While new figures come, keys are still those of the split before.
  const shownBy = trends.by;
  const colours = useMemo(() => layerColours(shownBy, stacks.layers), [shownBy, stacks.layers]);
  const model = useMemo(
    () => monthsModel(stacks, shownBy, scope, colours, notes),
    [stacks, shownBy, scope, colours, notes],
  );
  const ticketMonth = lastWholeMonth(stacks.months) ?? stacks.months.at(-1);
  if (!ticketMonth)
    return (
      <div aria-busy={stale} className={clsx(stale && 'opacity-50')}>
        <NothingInScope />
      </div>
    );
  const wide = 'lg:col-span-2';
  return (
    <div
      aria-busy={stale}
      className={clsx(
        'grid gap-x-10 gap-y-6 transition-opacity lg:grid-cols-[minmax(0,1fr)_300px] lg:grid-rows-[auto_1fr]',
        stale && 'opacity-50',
      )}
    >
      <TrendsHead
        trends={trends}
        stacks={stacks}
        scope={scope}
        comparison={comparison.data?.comparison ?? null}
        chosen={address.versus !== null}
        pattern={pattern.data?.pattern ?? null}
        notes={notes}
        className="lg:min-h-28 lg:content-start"
      />
      <MonthTicket
        month={ticketMonth}
        then={
          ticketMonth.state === 'whole'
            ? yearBeforeOf(ticketMonth.month, { months: stacks.months, earlier: trends.earlier })
            : undefined
        }
        scope={scope}
        className="lg:row-span-2 lg:self-start"
      />
      <MonthsSheet
        stacks={stacks}
        shownBy={shownBy}
        by={by}
        onSplit={onSplit}
        model={model}
        notes={notes}
        className="lg:col-start-1"
      />
      <ComparisonSheet
        data={comparison.data}
        error={comparison.error}
        scope={scope}
        address={address}
        className={wide}
      />
      <SeasonSheet data={pattern.data} error={pattern.error} scope={scope} className={wide} />
      <BranchesSheet query={query} scope={scope} className={wide} />
      <Sheet
        title="Month by month"
        aside="newest first; every figure opens its records"
        tools={<FileButtons makeTable={() => modelFile(model)} />}
        className={wide}
      >
        <ModelTable
          model={model}
          label={`Recovered mass by month and ${shownBy === 'jobType' ? 'job type' : shownBy}`}
        />
      </Sheet>
    </div>
  );
};
