'use client';

import dynamic from 'next/dynamic';
import { useMemo } from 'react';
import type { MonthlyPattern, ShownPattern, ShownPatternMonth } from '@/analytics/monthly-pattern/contract';
import {
  isUnusual,
  missingSentence,
  patternSentences,
  routineSentence,
  unusualWord,
} from '@/analytics/monthly-pattern/sentence';
import type { ScopeSelection } from '@/analytics/scope-address';
import { MonthsFigure } from '@/components/charts/months-figure';
import { useSeen } from '@/components/charts/use-seen';
import { Term } from '@/components/glossary/term';
import { Sheet } from '@/components/ui/sheet';
import { Loading } from '@/components/ui/states';
import { formatMass, formatMassWithUnit, formatMonth } from '@/lib/format';
import { kgToUnit } from '@/lib/units';
import type { DisplayUnit } from '@/lib/vocabulary';
import { SeasonTable } from './season-table';

/** A season shows itself over three years, whatever part of them the scope asks for. */
const LEAST_SHOWN = 36;
const NARROW_MONTHS = 18;
const HEIGHT = { wide: 340, narrow: 300 } as const;

const SeasonMonths = dynamic(() => import('@/components/charts/season-months').then((module) => module.SeasonMonths), {
  ssr: false,
  loading: () => <Loading label="Drawing the chart" minHeight={HEIGHT.narrow} />,
});

/** The months to be drawn: those of the scope, and at least the last three years of the fit. */
const shownMonths = ({ months }: ShownPattern, from: string | null): ShownPatternMonth[] => {
  const asked = from ? months.findIndex(({ month }) => month >= from.slice(0, 7)) : 0;
  const least = Math.max(0, months.length - LEAST_SHOWN);
  return months.slice(asked < 0 ? least : Math.min(asked, least));
};

const inWords = (month: ShownPatternMonth, unit: DisplayUnit): string => {
  const usual = `usual is ${formatMass(month.low, unit, 0)} to ${formatMassWithUnit(month.high, unit, 0)}`;
  const verdict = !month.counts ? '; too few recoveries to judge' : isUnusual(month) ? `; ${unusualWord(month)}` : '';
  return `${formatMonth(month.month)}: ${formatMassWithUnit(month.recoveredMass, unit, 0)}, ${usual}; trend ${formatMassWithUnit(month.trend, unit, 0)}, season × ${month.seasonFactor.toFixed(2)}${verdict}.`;
};

const SeasonFigure = ({ pattern, scope }: { pattern: ShownPattern; scope: ScopeSelection }) => {
  const months = useMemo(() => shownMonths(pattern, scope.from), [pattern, scope.from]);
  const [seenRef, seen] = useSeen();
  const drawn = useMemo(
    () =>
      months.map((month) => ({
        month: month.month,
        observed: kgToUnit(month.recoveredMass, scope.unit),
        trend: kgToUnit(month.trend, scope.unit),
        low: kgToUnit(month.low, scope.unit),
        high: kgToUnit(month.high, scope.unit),
        counts: month.counts,
        unusual: isUnusual(month),
      })),
    [months, scope.unit],
  );
  return (
    <div ref={seenRef}>
      <MonthsFigure
        label="Season and trend by month"
        months={months.map(({ month }) => month)}
        narrowMonths={NARROW_MONTHS}
        height={HEIGHT}
        wordsOf={(name) => {
          const month = months.find((other) => other.month === name);
          return month ? inWords(month, scope.unit) : '';
        }}
        figureOf={(month) => ({ measure: 'routineMass', scope: { ...scope, from: month, to: month } })}
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
      <SeasonTable months={months} scope={scope} />
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
