'use client';

import dynamic from 'next/dynamic';
import { useMemo } from 'react';
import type { MonthlyPattern, ShownPattern } from '@/analytics/monthly-pattern/contract';
import { missingSentence, patternSentences, routineSentence } from '@/analytics/monthly-pattern/sentence';
import type { ScopeSelection } from '@/analytics/scope-address';
import { FoldedTable } from '@/components/charts/folded-table';
import { MonthsFigure } from '@/components/charts/months-figure';
import { useSeen } from '@/components/charts/use-seen';
import { Term } from '@/components/glossary/term';
import { Sheet } from '@/components/ui/sheet';
import { Loading } from '@/components/ui/states';
import { seasonModel, seasonPicture } from './season-model';

const NARROW_MONTHS = 18;
const HEIGHT = { wide: 340, narrow: 300 } as const;

const SeasonMonths = dynamic(() => import('@/components/charts/season-months').then((module) => module.SeasonMonths), {
  ssr: false,
  loading: () => <Loading label="Drawing the chart" minHeight={HEIGHT.narrow} />,
});

const SeasonFigure = ({ pattern, scope }: { pattern: ShownPattern; scope: ScopeSelection }) => {
  const model = useMemo(() => seasonModel(pattern, scope), [pattern, scope]);
  const drawn = useMemo(() => seasonPicture(model), [model]);
  const [seenRef, seen] = useSeen();
  return (
    <div ref={seenRef}>
      <MonthsFigure
        label={model.title}
        months={model.months.map(({ month }) => month)}
        narrowMonths={NARROW_MONTHS}
        height={HEIGHT}
        wordsOf={(name) => model.months.find(({ month }) => month === name)?.words ?? ''}
        figureOf={(month) => model.open(month, model.total.key)}
        legend={
          <p className="mt-2 text-sm text-ink-2">
            Points: recovered in <Term id="routine-jobs">routine jobs</Term>. Line: <Term id="season">trend</Term>.
            Band: <Term id="control-limits">usual</Term>.
          </p>
        }
        draw={({ months: shown, ...canvas }) =>
          seen ? <SeasonMonths {...canvas} months={drawn.slice(-shown.length)} /> : null
        }
      />
      <FoldedTable model={model} />
    </div>
  );
};

type SeasonSheetProps = {
  data: MonthlyPattern | undefined;
  error: Error | null;
  scope: ScopeSelection;
  className?: string;
};

/** What is season and what is not: the trend, the band of usual months, and the months that fall out of it. */
export const SeasonSheet = ({ data, error, scope, className }: SeasonSheetProps) => (
  <Sheet
    title="Season and trend"
    aside={data?.pattern ? `${scope.unit} a month in routine jobs` : undefined}
    {...(className ? { className } : {})}
  >
    {data?.pattern ? (
      <>
        {[...patternSentences(data.pattern), routineSentence(data.large, scope.unit)].map((sentence) => (
          <p key={sentence} className="mb-2 max-w-[54em] text-ink-2">
            {sentence}
          </p>
        ))}
        <SeasonFigure pattern={data.pattern} scope={scope} />
      </>
    ) : (
      <p role={error ? 'alert' : undefined} className="max-w-[54em] pb-2 text-ink-2">
        {error ? error.message : data?.missing ? missingSentence(data.missing) : ''}
      </p>
    )}
  </Sheet>
);
