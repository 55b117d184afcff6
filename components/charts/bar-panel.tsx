'use client';

import { Bar } from '@visx/shape';
import { formatMonth } from '@/lib/format';
import { plainBand } from './plain-band';

export type PanelMonth = { month: string; value: number; unfinished: boolean };

type BarPanelProps = {
  months: readonly PanelMonth[];
  /** The highest value of all panels: one scale for all of them. */
  highest: number;
  width: number;
  height: number;
  colour: string;
};

const MARGIN = { top: 4, right: 0, bottom: 20, left: 0 };

/** One small chart among others of the same scale: bars from zero, the unfinished month outlined, first and last named. */
export const BarPanel = ({ months, highest, width, height, colour }: BarPanelProps) => {
  const { band } = plainBand({
    months: months.map(({ month }) => month),
    width,
    height,
    margin: MARGIN,
    highest,
    ticks: 0,
  });
  const [first, last] = [months[0]?.month, months.at(-1)?.month];
  return (
    <svg width={width} height={height} aria-hidden="true" className="block">
      {months.map(({ month, value, unfinished }) => (
        <Bar
          key={month}
          x={band.xOf(month)}
          width={band.width}
          y={band.yOf(value)}
          height={band.bottom - band.yOf(value)}
          fill={unfinished ? 'none' : colour}
          stroke={unfinished && value > 0 ? colour : 'none'}
        />
      ))}
      <line x1={0} x2={width} y1={band.bottom} y2={band.bottom} stroke="var(--ink)" strokeWidth={1.5} />
      <g fill="var(--ink-2)" fontSize={12.5}>
        {first ? (
          <text x={0} y={height - 4}>
            {formatMonth(first, 'short')}
          </text>
        ) : null}
        {last && last !== first ? (
          <text x={width} y={height - 4} textAnchor="end">
            {formatMonth(last, 'short')}
          </text>
        ) : null}
      </g>
    </svg>
  );
};
