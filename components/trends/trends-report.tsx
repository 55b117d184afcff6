'use client';

import { clsx } from 'clsx';
import Link from 'next/link';
import { useMemo } from 'react';
import type { Dimension } from '@/analytics/dimensions';
import type { MonthlyTrends } from '@/analytics/monthly-trends/contract';
import { trendAnswer, trendNotes } from '@/analytics/monthly-trends/sentence';
import { lastWholeMonth, toStacks } from '@/analytics/monthly-trends/series';
import { type ScopeSelection, scopeSearch } from '@/analytics/scope-address';
import { NothingInScope } from '@/components/scope/nothing-in-scope';
import { choiceName, DIMENSION_WORDS } from '@/components/scope/wording';
import { PageHead } from '@/components/ui/page-head';
import { Sheet } from '@/components/ui/sheet';
import { layerColours } from './layer-colours';
import { MonthTicket } from './month-ticket';
import { comparesYears, MonthsChart } from './months-chart';
import { MonthsTable } from './months-table';
import { recordsHref } from './records-link';
import { SplitSelector } from './split-selector';

type TrendsReportProps = {
  trends: MonthlyTrends;
  scope: ScopeSelection;
  by: Dimension;
  onSplit: (by: Dimension) => void;
  /** Whether newer figures are on their way. */
  stale: boolean;
};

/** The answer, the ticket, the chart and the table of one scope. */
export const TrendsReport = ({ trends, scope, by, onSplit, stale }: TrendsReportProps) => {
  const stacks = useMemo(() => toStacks(trends), [trends]);
  // While new figures come, keys are still those of the split before.
  const shownBy = trends.by;
  const colours = useMemo(() => layerColours(shownBy, stacks.layers), [shownBy, stacks.layers]);
  const answer = trendAnswer(stacks, scope.unit);
  const notes = trendNotes(stacks, trends, scope.unit, (key) => choiceName(shownBy, key));
  const ticketMonth = lastWholeMonth(stacks.months) ?? stacks.months.at(-1);
  const href = (answer.month && recordsHref(scope, answer.month)) || `/records${scopeSearch(scope)}`;
  if (!ticketMonth)
    return (
      <div aria-busy={stale} className={clsx(stale && 'opacity-50')}>
        <NothingInScope />
      </div>
    );
  return (
    <div
      aria-busy={stale}
      className={clsx(
        'grid gap-x-10 gap-y-6 transition-opacity lg:grid-cols-[minmax(0,1fr)_300px]',
        stale && 'opacity-50',
      )}
    >
      <PageHead
        title={
          <>
            {answer.before}
            {answer.figure ? (
              <Link href={href} className="figure-link">
                {answer.figure}
              </Link>
            ) : null}
            {answer.after}
          </>
        }
        sub={notes.join(' ')}
        className="lg:min-h-28 lg:content-start"
      />
      <MonthTicket month={ticketMonth} months={stacks.months} scope={scope} className="lg:row-span-2 lg:self-start" />
      <Sheet
        title="Recovered mass by month"
        aside={`${scope.unit}, by ${DIMENSION_WORDS[shownBy].one}${comparesYears(stacks) ? '; the line is the year before' : ''}`}
        className="lg:col-start-1"
      >
        <SplitSelector by={by} onChange={onSplit} />
        <MonthsChart stacks={stacks} by={shownBy} scope={scope} colours={colours} />
      </Sheet>
      <Sheet title="Month by month" aside="newest first; every figure opens its records" className="lg:col-span-2">
        <MonthsTable stacks={stacks} by={shownBy} scope={scope} colours={colours} />
      </Sheet>
    </div>
  );
};
