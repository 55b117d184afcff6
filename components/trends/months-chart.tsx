'use client';

import { type ReactNode, useMemo } from 'react';
import type { Dimension } from '@/analytics/dimensions';
import type { Stacks } from '@/analytics/monthly-trends/series';
import type { ScopeSelection } from '@/analytics/scope-address';
import type { ChartLayer, ChartMonth } from '@/components/charts/layer';
import { StackedMonthsFigure } from '@/components/charts/stacked-months-figure';
import { chartNotes, type NumberedNote, notesOfMonth } from '@/components/notes/numbered';
import { kgToUnit } from '@/lib/units';
import { recordsHref } from './records-link';
import { layerName, monthInWords } from './wording';

/** With more months than this the line of the year before hides more than it shows. */
const MOST_COMPARED = 37;

/** Whether the chart draws the year before. */
export const comparesYears = ({ months }: Stacks): boolean =>
  months.length <= MOST_COMPARED && months.some(({ yearBefore, state }) => yearBefore !== null && state === 'whole');

const notesInWords = (notes: readonly NumberedNote[], month: string): string[] =>
  notesOfMonth(notes, month).map(({ no, text }) => `Note ${no}: ${text}`);

type MonthsChartProps = {
  stacks: Stacks;
  by: Dimension;
  scope: ScopeSelection;
  colours: Record<string, string>;
  notes: readonly NumberedNote[];
  /** Verbs for the month being read. */
  verbsOf: (month: string) => ReactNode;
};

/** The stacks in the viewer's unit, with the words of their months. */
export const MonthsChart = ({ stacks, by, scope, colours, notes, verbsOf }: MonthsChartProps) => {
  const layers = useMemo<ChartLayer[]>(
    () =>
      stacks.layers.map((layer) => ({
        id: layer.id,
        name: layerName(by, layer),
        colour: colours[layer.id] ?? 'var(--refrigerant-other)',
      })),
    [stacks.layers, by, colours],
  );
  const months = useMemo<ChartMonth[]>(() => {
    const inUnit = (kg: number) => kgToUnit(kg, scope.unit);
    const compared = comparesYears(stacks);
    return stacks.months.map((month) => ({
      month: month.month,
      values: Object.fromEntries(Object.entries(month.layers).map(([id, kg]) => [id, inUnit(kg)])),
      total: inUnit(month.recoveredMass),
      yearBefore: !compared || month.yearBefore === null || month.state !== 'whole' ? null : inUnit(month.yearBefore),
      unfinished: month.state !== 'whole',
    }));
  }, [stacks, scope.unit]);
  const marks = useMemo(() => chartNotes(notes), [notes]);
  return (
    <StackedMonthsFigure
      label="Recovered mass by month"
      layers={layers}
      months={months}
      notes={marks}
      verbsOf={verbsOf}
      wordsOf={(name) => {
        const month = stacks.months.find((other) => other.month === name);
        return month
          ? [monthInWords(month, stacks.layers, by, scope.unit), ...notesInWords(notes, name)].join(' ')
          : '';
      }}
      recordsOf={(month) => recordsHref(scope, month) ?? '/records'}
    />
  );
};
