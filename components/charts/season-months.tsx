'use client';

import { Area, LinePath } from '@visx/shape';
import { formatMonth, formatNumber } from '@/lib/format';
import { spreadLabels } from './end-labels';
import { MonthAxisOf } from './month-axis-of';
import type { MonthsCanvas } from './months-figure';
import { plainBand } from './plain-band';
import type { Band } from './use-band';

/** A month of the picture, in the chart's unit. */
export type SeasonMonth = {
  month: string;
  observed: number;
  trend: number;
  low: number;
  high: number;
  /** Judged, so drawn full. */
  counts: boolean;
  /** Falls out of the band: marked and named. */
  unusual: boolean;
};

const LABELS = 96;
const LINE = 18;

const Names = ({ band, last }: { band: Band; last: SeasonMonth }) => {
  const places = spreadLabels(
    [
      { id: 'recovered', y: band.yOf(last.observed) },
      { id: 'trend', y: band.yOf(last.trend) },
      { id: 'usual', y: (band.yOf(last.low) + band.yOf(last.high)) / 2 },
    ],
    LINE,
    band.top + 4,
    band.bottom - 4,
  );
  const fills: Record<string, string> = { recovered: 'var(--ink)', trend: 'var(--act)', usual: 'var(--ink-2)' };
  return (
    <g fontSize={13.5} dominantBaseline="central">
      {places.map(({ id, y }) => (
        <text key={id} x={band.right + 10} y={y} fill={fills[id]} fontWeight={id === 'trend' ? 600 : 400}>
          {id}
        </text>
      ))}
    </g>
  );
};

const Dots = ({ band, months }: { band: Band; months: readonly SeasonMonth[] }) => (
  <g>
    {months.map(({ month, observed, counts, unusual, high }) => {
      const [x, y] = [band.xOf(month) + band.width / 2, band.yOf(observed)];
      return (
        <g key={month}>
          {unusual ? <circle cx={x} cy={y} r={7} fill="var(--shoulder)" stroke="var(--ink)" strokeWidth={1.5} /> : null}
          <circle
            cx={x}
            cy={y}
            r={3}
            fill={counts ? 'var(--ink)' : 'var(--sheet)'}
            stroke={unusual ? 'var(--shoulder-ink)' : 'var(--ink)'}
            strokeWidth={counts ? 0 : 1.5}
          />
          {unusual ? (
            <text
              x={x}
              y={observed > high ? y - 13 : y + 21}
              fill="var(--ink)"
              fontSize={12.5}
              fontWeight={600}
              textAnchor="middle"
            >
              {formatMonth(month, 'short')}
            </text>
          ) : null}
        </g>
      );
    })}
  </g>
);

type SeasonMonthsProps = Omit<MonthsCanvas, 'months'> & { months: readonly SeasonMonth[] };

/** Months as points on the band of what is usual, with the trend through it. */
export const SeasonMonths = ({ months, width, height, narrow, active, onPoint }: SeasonMonthsProps) => {
  const highest = Math.max(...months.map(({ observed, high }) => Math.max(observed, high)));
  const digits = highest < 5 ? 1 : 0;
  const size = narrow ? 14 : 13;
  // The reading face is monospaced: a figure is 0.6 em wide.
  const left = Math.ceil(formatNumber(highest * 1.2, digits).length * 0.6 * size) + 14;
  const names = months.map(({ month }) => month);
  const { band, gridValues } = plainBand({
    months: names,
    width,
    height,
    margin: { top: 24, right: narrow ? 6 : LABELS, bottom: 44, left },
    highest,
    ticks: 5,
  });
  const x = ({ month }: SeasonMonth) => band.xOf(month) + band.width / 2;
  const last = months.at(-1);
  return (
    <svg width={width} height={height} aria-hidden="true">
      {gridValues.map((value) => (
        <g key={value}>
          <line x1={band.left} x2={band.right} y1={band.yOf(value)} y2={band.yOf(value)} stroke="var(--rule-2)" />
          <text
            x={band.left - 8}
            y={band.yOf(value)}
            fill="var(--ink-2)"
            fontSize={size}
            fontFamily="var(--font-reading), ui-monospace, monospace"
            textAnchor="end"
            dominantBaseline="central"
          >
            {formatNumber(value, digits)}
          </text>
        </g>
      ))}
      <Area
        data={[...months]}
        x={x}
        y0={({ low }) => band.yOf(low)}
        y1={({ high }) => band.yOf(high)}
        fill="var(--rule)"
        fillOpacity={0.55}
      />
      <LinePath data={[...months]} x={x} y={({ trend }) => band.yOf(trend)} stroke="var(--act)" strokeWidth={2.5} />
      <LinePath
        data={[...months]}
        x={x}
        y={({ observed }) => band.yOf(observed)}
        stroke="var(--ink-3)"
        strokeWidth={1}
      />
      <Dots band={band} months={months} />
      {active ? (
        <rect
          x={band.xOf(active) - (band.step - band.width) / 2}
          width={band.step}
          y={band.top}
          height={band.bottom - band.top}
          fill="var(--ink)"
          fillOpacity={0.08}
        />
      ) : null}
      {names.map((month) => (
        <rect
          key={month}
          x={band.xOf(month) - (band.step - band.width) / 2}
          width={band.step}
          y={band.top}
          height={band.bottom - band.top}
          fill="transparent"
          onPointerEnter={() => onPoint(month)}
          onPointerDown={() => onPoint(month)}
        />
      ))}
      <MonthAxisOf band={band} months={names} narrow={narrow} />
      {!narrow && last ? <Names band={band} last={last} /> : null}
    </svg>
  );
};
