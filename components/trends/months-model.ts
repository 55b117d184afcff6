import type { Dimension } from '@/analytics/dimensions';
import { type Figure, type FigureScope, monthInScope } from '@/analytics/figures/figure';
import type { Measure } from '@/analytics/figures/measures';
import type { StackedMonth, StackLayer, Stacks } from '@/analytics/monthly-trends/series';
import { allBut, onlyOf, type ScopeSelection } from '@/analytics/scope-address';
import type { ChartColumn, ChartModel } from '@/components/charts/model';
import { figureScopePhrase } from '@/components/figures/wording';
import { chartNotes, type NumberedNote, notesOfMonth } from '@/components/notes/numbered';
import { layerName, monthInWords, stateWord } from './wording';

/** With more months than this the line of the year before hides more than it shows. */
const MOST_COMPARED = 37;

const comparable = ({ state, yearBefore }: StackedMonth): boolean => state === 'whole' && yearBefore !== null;

/** What the whole month's mass is against the same month a year before, as a change; null where that says nothing. */
const changeOf = (month: StackedMonth): number | null =>
  comparable(month) && month.yearBefore ? month.recoveredMass / month.yearBefore - 1 : null;

const notesInWords = (notes: readonly NumberedNote[], month: string): string[] =>
  notesOfMonth(notes, month).map(({ no, text }) => `Note ${no}: ${text}`);

/** The records of one layer: those of its key, or all but those of the named ones. */
export const layerScope = <Scope extends FigureScope>(
  scope: Scope,
  by: Dimension,
  layer: StackLayer,
  layers: readonly StackLayer[],
): Scope => {
  if (layer.key !== null) return onlyOf(scope, by, [layer.key]);
  return allBut(
    scope,
    by,
    layers.flatMap(({ key }) => key ?? []),
  );
};

const MEASURE_OF: Record<string, Measure> = {
  all: 'recoveredMass',
  recoveries: 'recoveries',
  medianYield: 'medianYield',
};

/** The months of Trends as one model: what picture, table, reading and files show. */
export const monthsModel = (
  { layers, months }: Stacks,
  by: Dimension,
  scope: ScopeSelection,
  colours: Record<string, string>,
  notes: readonly NumberedNote[] = [],
): ChartModel => {
  const column = (
    key: string,
    label: string,
    kind: ChartColumn['kind'],
    of: (month: StackedMonth) => number | null,
  ): ChartColumn => ({ key, label, kind, values: months.map(of) });
  const compared = months.length <= MOST_COMPARED && months.some(comparable);
  const yearBefore = column('yearBefore', 'Year before', 'mass', (month) =>
    comparable(month) ? month.yearBefore : null,
  );
  return {
    title: 'Recovered mass by month',
    scopeWords: figureScopePhrase(scope),
    unit: scope.unit,
    plainState: 'whole',
    months: months.map((month) => ({
      month: month.month,
      state: month.state,
      stateWord: stateWord(month),
      words: [monthInWords(month, layers, by, scope.unit), ...notesInWords(notes, month.month)].join(' '),
      notes: notesOfMonth(notes, month.month),
    })),
    series: layers.map((layer) => ({
      ...column(layer.id, layerName(by, layer), 'mass', (month) => month.layers[layer.id] ?? 0),
      colour: colours[layer.id] ?? 'var(--refrigerant-other)',
    })),
    total: column('all', 'All', 'mass', (month) => month.recoveredMass),
    overlays: compared ? [yearBefore] : [],
    beside: [
      column('change', 'Against the year before', 'change', changeOf),
      column('recoveries', 'Recoveries', 'count', (month) => month.recoveries),
      column('medianYield', 'Median yield', 'share', (month) => month.medianYield),
    ],
    marks: chartNotes(notes),
    open: (month, key): Figure | null => {
      const own = monthInScope(scope, month);
      const layer = layers.find(({ id }) => id === key);
      if (layer) return { measure: 'recoveredMass', scope: layerScope(own, by, layer, layers) };
      const measure = MEASURE_OF[key];
      return measure ? { measure, scope: own } : null;
    },
  };
};
