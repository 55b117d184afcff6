import type { Figure } from '@/analytics/figures/figure';
import type { MonthState } from '@/analytics/monthly-trends/series';
import { kgToUnit } from '@/lib/units';
import type { DisplayUnit } from '@/lib/vocabulary';
import type { ChartNote } from './layer';

/** What the values of a column are: kilograms, numbers of things, shares (0.84), changes (−0.03), or factors (1.20). */
export type ColumnKind = 'mass' | 'count' | 'share' | 'change' | 'factor';

/** One value a month; null where there is none to tell. */
export type ChartColumn = { key: string; label: string; kind: ColumnKind; values: readonly (number | null)[] };

/**
 * A month of the chart: `stateWord` says why it is not to be compared or what is special about it, `words` what it
 * holds, `notes` what is pinned to it.
 */
export type ModelMonth = {
  month: string;
  state: MonthState;
  stateWord: string;
  words: string;
  notes: readonly { id: string; no: number; text: string }[];
};

/**
 * All that a chart says, once. Its picture, table, reading, CSV and Excel file come from it and from nothing else, so
 * that they cannot disagree. Masses are kilograms here; whoever shows them turns them into `unit`.
 */
export type ChartModel = {
  title: string;
  /** The records it is drawn from, in words. */
  scopeWords: string;
  unit: DisplayUnit;
  months: readonly ModelMonth[];
  /** What files call a month of which nothing special is to be said. */
  plainState: string;
  /** Stacked in the picture, the first at the bottom. */
  series: readonly (ChartColumn & { colour: string })[];
  /** What the series of a month come to. */
  total: ChartColumn;
  /** Drawn as lines over the bars. */
  overlays: readonly ChartColumn[];
  /** Told beside the picture: in the table and in files. */
  beside: readonly ChartColumn[];
  /** Notes pinned to months, by their numbers. */
  marks: readonly ChartNote[];
  /** The figure that a value is; null for one that is computed from several. */
  open: (month: string, columnKey: string) => Figure | null;
};

/** The columns of the table on the screen; a change says what an overlay shows. */
export const tableColumns = ({ series, total, beside }: ChartModel): ChartColumn[] => [...series, total, ...beside];

/** The columns of a file: everything. */
export const fileColumns = ({ series, total, overlays, beside }: ChartModel): ChartColumn[] => [
  ...series,
  total,
  ...overlays,
  ...beside,
];

/** A value as it is shown: masses in the chart's unit, all else as it is. */
export const shownValue = (value: number | null, kind: ColumnKind, unit: DisplayUnit): number | null =>
  value === null || kind !== 'mass' ? value : kgToUnit(value, unit);
