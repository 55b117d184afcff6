import type { ReactNode } from 'react';
import { MEASURE_UNITS, type Measure } from '@/analytics/figures/measures';
import type { GroupFigures } from '@/analytics/grouped-figures/contract';
import { chanceText } from '@/analytics/leak-suspicion/sentence';
import type { ScopeSelection } from '@/analytics/scope-address';
import type { FileColumn } from '@/components/files/file-table';
import type { TermId } from '@/lib/glossary/terms';

/**
 * One column of a table of groups: its heading and its value, from which come the table, its order and the file. Masses
 * are kilograms here.
 */
export type GroupedColumn<Row> = {
  id: string;
  label: string;
  kind: Exclude<FileColumn['kind'], 'month'>;
  value: (row: Row) => string | number | null;
  /** What the figure measures, so that it opens; a day opens what was recovered on it. */
  measure?: Measure;
  /** Draws the value otherwise than as plain text. */
  draw?: (row: Row, scope: ScopeSelection) => ReactNode;
  /** What the heading means, in the glossary. */
  term?: TermId;
  /** Names the row. */
  heads?: boolean;
  /** Said with another column on the screen; files have it as a column of its own. */
  onlyInFile?: boolean;
};

type FigureName<Row> = { [Name in keyof Row]: Row[Name] extends number | null ? Name : never }[keyof Row] & string;

const KINDS = { kg: 'mass', count: 'count', share: 'share' } as const;

/** A column of a figure that is called in the answer as its measure is. */
export const measured = <Row>(name: FigureName<Row> & Measure, label: string, term?: TermId): GroupedColumn<Row> => ({
  id: name,
  label,
  kind: KINDS[MEASURE_UNITS[name]],
  measure: name,
  ...(term ? { term } : {}),
  // The type of `name` sees to it that a number or nothing stands there.
  value: (row) => row[name] as number | null,
});

/** What every table of groups says, in the order in which it is read. */
export const MASS_COLUMNS: readonly GroupedColumn<GroupFigures>[] = [
  measured<GroupFigures>('recoveredMass', 'Recovered', 'recovered-mass'),
  measured<GroupFigures>('fullCharge', 'Full charge', 'full-charge'),
  measured<GroupFigures>('totalYield', 'Total yield', 'total-yield'),
  measured<GroupFigures>('medianYield', 'Median yield', 'median-yield'),
];
export const RECOVERIES: GroupedColumn<GroupFigures> = measured<GroupFigures>('recoveries', 'Recoveries');
export const FIRST: GroupedColumn<GroupFigures> = {
  id: 'firstRecoveredOn',
  label: 'First',
  kind: 'day',
  value: ({ firstRecoveredOn }) => firstRecoveredOn,
};
export const LAST: GroupedColumn<GroupFigures> = {
  id: 'lastRecoveredOn',
  label: 'Last',
  kind: 'day',
  value: ({ lastRecoveredOn }) => lastRecoveredOn,
};

/** How many recoveries of the group lie far below like jobs. */
export const LOW: GroupedColumn<{ lowRecoveries: number }> = {
  id: 'lowRecoveries',
  label: 'Far below',
  kind: 'count',
  measure: 'farBelow',
  term: 'far-below-like-jobs',
  value: ({ lowRecoveries }) => lowRecoveries,
};

/** How likely the group's most suspected unit leaks, from its visits of the last 36 months. */
export const LEAK_SUSPICION: GroupedColumn<{ leakSuspicion: number | null }> = {
  id: 'leakSuspicion',
  label: 'Leaks with',
  kind: 'share',
  value: ({ leakSuspicion }) => leakSuspicion,
  draw: ({ leakSuspicion }) => (leakSuspicion === null ? '—' : chanceText(leakSuspicion)),
};
