'use client';

import { type ReactNode, useMemo, useState } from 'react';
import { useNarrow } from '@/components/scope/use-narrow';
import type { FunnelLimit, FunnelPoint } from './funnel';
import { FunnelPicture } from './funnel-picture';
import { useCursor } from './use-cursor';
import { useWidth } from './use-width';

const HEIGHT = { wide: 400, narrow: 320 } as const;

type FunnelFigureProps = {
  label: string;
  points: readonly FunnelPoint[];
  limits: readonly FunnelLimit[];
  amountLabel: string;
  valueLabel: string;
  formatAmount: (amount: number) => string;
  formatValue: (value: number) => string;
  /** A point in words: shown when pointed at, read out when reached by keyboard. */
  wordsOf: (key: string) => string;
  /** Where a point leads. */
  onOpen: (key: string) => void;
  /** The same as a link, for the point being read. */
  verbsOf: (key: string) => ReactNode;
  /** What is said while no point is read. */
  hint: string;
};

/**
 * Who lies how far from the others, and how much there is to go by: one tab stop, arrows move from the least known to
 * the best known, Enter opens, Escape lets go. The table beside it is its equal for who does not see it.
 */
export const FunnelFigure = ({ points, wordsOf, verbsOf, onOpen, label, hint, ...picture }: FunnelFigureProps) => {
  const narrow = useNarrow();
  const [measured, width] = useWidth();
  const [pointed, setPointed] = useState<string | null>(null);
  const keys = useMemo(() => [...points].sort((a, b) => a.amount - b.amount).map(({ key }) => key), [points]);
  const cursor = useCursor(keys, onOpen, { begin: 'first', stride: 5 });
  const active = pointed !== null && keys.includes(pointed) ? pointed : cursor.active;
  /** The first click holds a point, so that its verbs can be reached; the next opens it. */
  const click = () => {
    if (pointed === null) return;
    if (pointed === cursor.active) onOpen(pointed);
    else cursor.setActive(pointed);
  };
  return (
    <figure className="m-0">
      <div
        role="slider"
        tabIndex={0}
        aria-label={label}
        aria-valuemin={1}
        aria-valuemax={keys.length}
        aria-valuenow={cursor.index + 1}
        aria-valuetext={wordsOf(cursor.active ?? keys[cursor.index] ?? '')}
        onKeyDown={(event) => {
          setPointed(null);
          cursor.onKeyDown(event);
        }}
        onClick={click}
        onPointerLeave={(event) => event.pointerType === 'mouse' && setPointed(null)}
        style={{ height: narrow ? HEIGHT.narrow : HEIGHT.wide }}
        className="[&_svg]:block [&_svg]:overflow-visible"
      >
        <div aria-hidden="true" ref={measured} className="h-full">
          {width > 0 ? (
            <FunnelPicture
              {...picture}
              points={points}
              width={width}
              height={narrow ? HEIGHT.narrow : HEIGHT.wide}
              narrow={narrow}
              active={active}
              onPoint={setPointed}
            />
          ) : null}
        </div>
      </div>
      <figcaption className="mt-2 flex min-h-[6rem] flex-wrap content-start gap-x-4 text-sm text-ink-2 sm:min-h-12 print:min-h-0">
        {active ? (
          <>
            <span className="tabular-nums">{wordsOf(active)}</span>
            {verbsOf(active)}
          </>
        ) : (
          <span className="print:hidden">{hint}</span>
        )}
      </figcaption>
    </figure>
  );
};
