'use client';

import { Axis, BarSeries, BarStack, Grid, XYChart } from '@visx/xychart';
import { useId, useMemo } from 'react';
import { formatNumber } from '@/lib/format';
import { Hatches, hatchId } from './hatch';
import type { ChartLayer, ChartMonth, ChartNote } from './layer';
import { MonthAxis } from './month-axis';
import { MonthOverlay } from './month-overlay';
import { placeNotes } from './note-lanes';
import { NOTE_LANE, NoteMarks } from './note-marks';
import { StackLabels } from './stack-labels';
import { chartTheme } from './theme';

export type StackedMonthsProps = {
  layers: readonly ChartLayer[];
  months: readonly ChartMonth[];
  notes: readonly ChartNote[];
  width: number;
  height: number;
  /** On a phone: larger type, letters for months, no labels beside the bars. */
  narrow: boolean;
  active: string | null;
  onPoint: (month: string | null) => void;
};

const month = (datum: ChartMonth) => datum.month;

/** Pixels for the names beside the last bar. */
const LABELS = 136;

const tickText = (value: number, highest: number): string => formatNumber(value, highest < 5 ? 1 : 0);

// The reading face is monospaced: a figure is 0.6 em wide.
const labelWidth = (highest: number, narrow: boolean): number =>
  Math.ceil(tickText(Math.max(1, highest * 1.2), highest).length * 0.6 * (narrow ? 14 : 13)) + 14;

/** Bars stacked by month from zero. Draws finished data: it neither fills, sums nor orders. */
export const StackedMonths = ({
  layers,
  months,
  notes,
  width,
  height,
  narrow,
  active,
  onPoint,
}: StackedMonthsProps) => {
  const chartId = useId();
  const highest = Math.max(...months.map(({ total, yearBefore }) => Math.max(total, yearBefore ?? 0)));
  // Series register themselves anew whenever they change: pointing at a month must not change them.
  const stack = useMemo(
    () => (
      <BarStack enableEvents={false}>
        {layers.map(({ id, colour }) => (
          <BarSeries
            key={id}
            dataKey={id}
            data={[...months]}
            xAccessor={month}
            yAccessor={(datum: ChartMonth) => datum.values[id] ?? 0}
            colorAccessor={(datum: ChartMonth) => (datum.unfinished ? `url(#${hatchId(chartId, id)})` : colour)}
          />
        ))}
      </BarStack>
    ),
    [layers, months, chartId],
  );
  const last = months.at(-1);
  const placed = placeNotes(notes, months.map(month));
  const lanes = Math.max(0, ...placed.map(({ lane }) => lane + 1));
  return (
    <XYChart
      width={width}
      height={height}
      margin={{
        top: 12 + lanes * NOTE_LANE,
        right: narrow ? 2 : LABELS,
        bottom: 44,
        left: labelWidth(highest, narrow),
      }}
      xScale={{ type: 'band', domain: months.map(month), paddingInner: 0.22, paddingOuter: 0.11 }}
      yScale={{ type: 'linear', domain: [0, highest || 1], nice: 5, zero: true }}
      theme={chartTheme}
      captureEvents={false}
      accessibilityLabel="Recovered mass by month"
    >
      <Hatches chartId={chartId} layers={layers} />
      <Grid columns={false} numTicks={5} strokeDasharray="0" />
      <Axis
        orientation="left"
        numTicks={5}
        hideAxisLine
        hideTicks
        tickFormat={(value: number) => tickText(value, highest)}
        tickLabelProps={() => ({ dx: -4, fontSize: narrow ? 14 : 13 })}
      />
      {stack}
      <MonthOverlay months={months} active={active} onPoint={onPoint} />
      <NoteMarks notes={placed} />
      <MonthAxis months={months.map(month)} narrow={narrow} />
      {!narrow && last ? <StackLabels layers={layers} last={last} /> : null}
    </XYChart>
  );
};
