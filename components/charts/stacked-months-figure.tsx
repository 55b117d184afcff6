'use client';

import dynamic from 'next/dynamic';
import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useMemo } from 'react';
import { useNarrow } from '@/components/scope/use-narrow';
import { Loading } from '@/components/ui/states';
import { formatDesignation, formatMonth } from '@/lib/format';
import type { ChartLayer, ChartMonth } from './layer';
import { useMonthCursor } from './use-month-cursor';
import { useWidth } from './use-width';

const HEIGHT = { wide: 400, narrow: 320 } as const;
/** A phone shows the last twelve months; the table has them all. */
const NARROW_MONTHS = 12;

// The chart library stays out of the first load, and draws nothing on the server anyway.
const StackedMonths = dynamic(() => import('./stacked-months').then((module) => module.StackedMonths), {
  ssr: false,
  loading: () => <Loading label="Drawing the chart" minHeight={HEIGHT.narrow} />,
});

type StackedMonthsFigureProps = {
  label: string;
  layers: readonly ChartLayer[];
  months: readonly ChartMonth[];
  /** A month's figures in words: shown when pointed at, read out when reached by keyboard. */
  wordsOf: (month: string) => string;
  /** Where the records of a month are. */
  recordsOf: (month: string) => string;
};

/**
 * Stacked months with what a picture alone lacks: one tab stop in which arrows move from month to month, the month in
 * words, and a way to its records. The table beside it is its equal for who does not see it.
 */
export const StackedMonthsFigure = ({ label, layers, months, wordsOf, recordsOf }: StackedMonthsFigureProps) => {
  const narrow = useNarrow();
  const router = useRouter();
  const shown = useMemo(() => (narrow ? months.slice(-NARROW_MONTHS) : months), [narrow, months]);
  const names = useMemo(() => shown.map(({ month }) => month), [shown]);
  const { active, index, setActive, onKeyDown } = useMonthCursor(names, (month) => router.push(recordsOf(month)));
  const [measured, width] = useWidth();
  const height = narrow ? HEIGHT.narrow : HEIGHT.wide;
  const first = names[0];
  return (
    <figure className="m-0">
      {/* A slider is what a row of months is to a keyboard: arrows move along it and the value says what stands there. */}
      <div
        role="slider"
        tabIndex={0}
        aria-label={label}
        aria-valuemin={1}
        aria-valuemax={names.length}
        aria-valuenow={index + 1}
        aria-valuetext={wordsOf(active ?? names[index] ?? '')}
        onKeyDown={onKeyDown}
        onPointerLeave={(event) => event.pointerType === 'mouse' && setActive(null)}
        style={{ height }}
        className="[&_.visx-bar]:stroke-sheet [&_.visx-bar]:[stroke-width:0.75px] [&_svg]:block [&_svg]:overflow-visible"
      >
        <div aria-hidden="true" ref={measured} className="h-full">
          {width > 0 ? (
            <StackedMonths
              layers={layers}
              months={shown}
              width={width}
              height={height}
              narrow={narrow}
              active={active}
              onPoint={setActive}
            />
          ) : null}
        </div>
      </div>
      {narrow ? (
        <ul className="mt-2 flex flex-wrap gap-x-4 gap-y-0.5 text-sm" aria-label="Colours">
          {layers.map(({ id, name, colour }) => (
            <li key={id} className="flex items-center gap-1.5">
              <span className="size-2.5 shrink-0" style={{ background: colour }} />
              {formatDesignation(name)}
            </li>
          ))}
        </ul>
      ) : null}
      <figcaption className="mt-2 flex min-h-[7.75rem] flex-wrap content-start gap-x-4 text-sm text-ink-2 sm:min-h-16">
        {active ? (
          <>
            <span className="tabular-nums">{wordsOf(active)}</span>
            <Link href={recordsOf(active)} className="link whitespace-nowrap print:hidden">
              Open the records
            </Link>
          </>
        ) : (
          <span className="print:hidden">
            Point at a month to read it, or use the arrow keys.
            {narrow && first && months.length > shown.length
              ? ` The chart begins with ${formatMonth(first)}; the table below has every month.`
              : ''}
          </span>
        )}
      </figcaption>
    </figure>
  );
};
