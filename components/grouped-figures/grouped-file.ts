import type { ScopeSelection } from '@/analytics/scope-address';
import { figureScopePhrase } from '@/components/figures/wording';
import { type FileTable, massCell } from '@/components/files/file-table';
import { plainCharacters } from '@/lib/format';
import type { GroupedColumn } from './column';

/** A table of groups as rows for a file, in the order in which they come. */
export const groupedFile = <Row>(
  title: string,
  columns: readonly GroupedColumn<Row>[],
  items: readonly Row[],
  scope: ScopeSelection,
): FileTable => ({
  title,
  scopeWords: plainCharacters(figureScopePhrase(scope)),
  unit: scope.unit,
  columns: columns.map(({ label, kind }) => ({ label: kind === 'mass' ? `${label}, ${scope.unit}` : label, kind })),
  rows: items.map((row) =>
    columns.map(({ kind, value }) => {
      const cell = value(row);
      return kind === 'mass' && typeof cell === 'number' ? massCell(cell, scope.unit) : cell;
    }),
  ),
});
