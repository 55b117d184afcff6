'use client';

import { type ReactNode, useState } from 'react';
import type { Figure } from '@/analytics/figures/figure';
import { FigureLink } from '@/components/figures/figure-link';
import { useFigurePage } from '@/components/figures/figure-page';
import { useNarrow } from '@/components/scope/use-narrow';
import { formatMonth } from '@/lib/format';
import { useMonthCursor } from './use-month-cursor';
import { useWidth } from './use-width';

/** What a chart of months is handed to draw itself with. */
export type MonthsCanvas = {
  months: readonly string[];
  width: number;
  height: number;
  narrow: boolean;
  active: string | null;
  onPoint: (month: string | null) => void;
};

type MonthsFigureProps = {
  label: string;
  months: readonly string[];
  /** A phone shows only the last so many; the table has them all. */
  narrowMonths: number;
  height: { wide: number; narrow: number };
  /** A month's figures in words: shown when pointed at, read out when reached by keyboard. */
  wordsOf: (month: string) => string;
  /** The figure that a month stands for; null opens nothing. */
  figureOf: (month: string) => Figure | null;
  /** Further verbs for the month being read. */
  verbsOf?: (month: string) => ReactNode;
  /** Names beside their colours, where the picture has no room for them. */
  legend?: ReactNode;
  draw: (canvas: MonthsCanvas) => ReactNode;
};

/**
 * A picture of months with what a picture alone lacks: one tab stop in which arrows move from month to month, the month
 * in words, and a way to its records. The table beside it is
 * its equal for who does not see it.
 */
export const MonthsFigure = (props: MonthsFigureProps) => {
  const { label, months, narrowMonths, height: heights, wordsOf, figureOf, verbsOf, legend, draw } = props;
  const narrow = useNarrow();
  const page = useFigurePage();
  const [pointed, setPointed] = useState<string | null>(null);
  const [measured, width] = useWidth();
  const shown = narrow ? months.slice(-narrowMonths) : months;
  const open = (month: string) => {
    const figure = figureOf(month);
    if (figure) page.open(figure);
  };
  const cursor = useMonthCursor(shown, open);
  const active = pointed !== null && shown.includes(pointed) ? pointed : cursor.active;
  const height = narrow ? heights.narrow : heights.wide;
  const first = shown[0];
  const activeFigure = active === null ? null : figureOf(active);
  /** The first click holds a month, so that its verbs can be reached; the next opens it. */
  const click = () => {
    if (pointed === null) return;
    if (pointed === cursor.active) open(pointed);
    else cursor.setActive(pointed);
  };
  return (
    <figure className="m-0">
      {/* A slider is what a row of months is to a keyboard: arrows move along it and the value says what stands there. */}
      <div
        role="slider"
        tabIndex={0}
        aria-label={label}
        aria-valuemin={1}
        aria-valuemax={shown.length}
        aria-valuenow={cursor.index + 1}
        aria-valuetext={wordsOf(cursor.active ?? shown[cursor.index] ?? '')}
        onKeyDown={(event) => {
          setPointed(null);
          cursor.onKeyDown(event);
        }}
        onClick={click}
        onPointerLeave={(event) => event.pointerType === 'mouse' && setPointed(null)}
        style={{ height }}
        className="[&_.visx-bar]:stroke-sheet [&_.visx-bar]:[stroke-width:0.75px] [&_svg]:block [&_svg]:overflow-visible"
      >
        <div aria-hidden="true" ref={measured} className="h-full">
          {width > 0 ? draw({ months: shown, width, height, narrow, active, onPoint: setPointed }) : null}
        </div>
      </div>
      {narrow ? legend : null}
      <figcaption className="mt-2 flex min-h-[7.75rem] flex-wrap content-start gap-x-4 text-sm text-ink-2 sm:min-h-16 print:min-h-0">
        {active ? (
          <>
            <span className="tabular-nums">{wordsOf(active)}</span>
            {activeFigure ? (
              <FigureLink {...activeFigure} className="link whitespace-nowrap print:hidden">
                Open the records
              </FigureLink>
            ) : null}
            {verbsOf?.(active)}
          </>
        ) : (
          <span className="print:hidden">
            Point at a month to read it, click to hold it and again to open it, or use the arrow keys and Enter.
            {narrow && first && months.length > shown.length
              ? ` The chart begins with ${formatMonth(first)}; the table below has every month.`
              : ''}
          </span>
        )}
      </figcaption>
    </figure>
  );
};
