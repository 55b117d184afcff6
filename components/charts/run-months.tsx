'use client';

import { scaleLinear } from '@visx/scale';
import { formatDay } from '@/lib/format';
import { MonthAxisOf } from './month-axis-of';
import type { MonthsCanvas } from './months-figure';
import { plainBand } from './plain-band';

/** A month's value around zero with its range. */
export type RunMonth = {
  month: string;
  value: number;
  low: number;
  high: number;
  /** Jobs enough to say something, so drawn full. */
  counts: boolean;
};

/** A day on which something was agreed or found, marked from top to bottom. */
export type RunMark = { day: string; label: string };

type RunMonthsProps = Omit<MonthsCanvas, 'months'> & {
  months: readonly string[];
  values: readonly RunMonth[];
  marks: readonly RunMark[];
  /** The value over all, with its range: a band through the picture. */
  overall: { value: number; low: number; high: number } | null;
  formatValue: (value: number) => string;
};

const MARGIN = { top: 34, right: 8, bottom: 44, left: 48 };
/** Room above and below for ranges; those of thin months would flatten all the others and are cut off. */
const ROOM_FOR_RANGES = 1.4;

const reachOf = (values: readonly RunMonth[], overall: RunMonthsProps['overall']): number => {
  const counting = values.filter(({ counts }) => counts);
  const points = (counting.length ? counting : values).map(({ value }) => Math.abs(value));
  const whole = overall ? [Math.abs(overall.low), Math.abs(overall.high)] : [];
  return Math.max(ROOM_FOR_RANGES * Math.max(...points, 1e-9), ...whole);
};

/** Month after month around zero, each with its range, over the band of the whole; days of note marked. */
export const RunMonths = (props: RunMonthsProps) => {
  const { months, values, marks, overall, width, height, narrow, active, onPoint, formatValue } = props;
  const { band } = plainBand({ months, width, height, margin: MARGIN, highest: 1, ticks: 0 });
  const reach = reachOf(values, overall);
  const y = scaleLinear<number>({ domain: [-reach, reach], range: [band.bottom, band.top], nice: 8, clamp: true });
  const middle = (month: string) => band.xOf(month) + band.width / 2;
  const ofDay = (day: string) =>
    band.xOf(day.slice(0, 7)) - (band.step - band.width) / 2 + (band.step * (Number(day.slice(8)) - 1)) / 31;
  const byMonth = new Map(values.map((value) => [value.month, value]));
  return (
    <svg width={width} height={height} aria-hidden="true">
      {overall ? (
        <rect
          x={band.left}
          width={band.right - band.left}
          y={y(overall.high)}
          height={Math.max(1, y(overall.low) - y(overall.high))}
          fill="var(--rule)"
          fillOpacity={0.55}
        />
      ) : null}
      {y.ticks(5).map((value) => (
        <g key={value}>
          <line x1={band.left} x2={band.right} y1={y(value)} y2={y(value)} stroke="var(--rule-2)" />
          <text
            x={band.left - 8}
            y={y(value)}
            dy="0.34em"
            textAnchor="end"
            fill="var(--ink-2)"
            fontSize={13}
            fontFamily="var(--font-reading), ui-monospace, monospace"
          >
            {formatValue(value)}
          </text>
        </g>
      ))}
      <line x1={band.left} x2={band.right} y1={y(0)} y2={y(0)} stroke="var(--ink)" strokeWidth={1.5} />
      {marks
        .filter(({ day }) => months.includes(day.slice(0, 7)))
        .map(({ day, label }) => (
          <g key={`${day} ${label}`}>
            <line x1={ofDay(day)} x2={ofDay(day)} y1={band.top - 12} y2={band.bottom} stroke="var(--act)" />
            <text
              x={ofDay(day)}
              y={12}
              fill="var(--ink)"
              fontSize={12.5}
              textAnchor={ofDay(day) > (band.left + band.right) / 2 ? 'end' : 'start'}
            >
              {narrow ? label : `${label}, ${formatDay(day)}`}
            </text>
          </g>
        ))}
      {months.map((month) => {
        const own = byMonth.get(month);
        return own ? (
          <g key={month}>
            <line
              x1={middle(month)}
              x2={middle(month)}
              y1={y(own.low)}
              y2={y(own.high)}
              stroke="var(--ink-3)"
              strokeWidth={1.25}
              strokeDasharray={own.counts ? undefined : '2 3'}
            />
            <circle
              cx={middle(month)}
              cy={y(own.value)}
              r={4}
              fill={own.counts ? 'var(--ink)' : 'var(--sheet)'}
              stroke="var(--ink)"
              strokeWidth={1.5}
            />
          </g>
        ) : null;
      })}
      {months.map((month) => (
        <rect
          key={month}
          x={band.xOf(month) - (band.step - band.width) / 2}
          width={band.step}
          y={band.top}
          height={band.bottom - band.top}
          fill={month === active ? 'var(--ink)' : 'transparent'}
          fillOpacity={month === active ? 0.08 : 0}
          onPointerEnter={() => onPoint(month)}
          onPointerDown={() => onPoint(month)}
        />
      ))}
      <MonthAxisOf band={band} months={months} narrow={narrow} />
    </svg>
  );
};
