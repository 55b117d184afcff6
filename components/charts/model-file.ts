import type { FileColumn, FileTable } from '@/components/files/file-table';
import { plainCharacters } from '@/lib/format';
import { type ChartColumn, type ChartModel, fileColumns, shownValue } from './model';

/** Masses to the thousandth of the unit, finer than any scale of the trade; shares are left as they are. */
const rounded = (value: number, kind: ChartColumn['kind']): number =>
  kind === 'mass' ? Math.round(value * 1000) / 1000 : value;

/** The model as rows for a file, the oldest month first. */
export const modelFile = (model: ChartModel): FileTable => {
  const { months, unit, title, scopeWords } = model;
  const columns = fileColumns(model);
  const state: FileColumn = { label: 'Month is', kind: 'text' };
  const notes: FileColumn[] = model.marks.length ? [{ label: 'Notes', kind: 'text' }] : [];
  return {
    title,
    scopeWords: plainCharacters(scopeWords),
    unit,
    columns: [
      { label: 'Month', kind: 'month' },
      state,
      ...columns.map(({ label, kind }) => ({
        label: plainCharacters(kind === 'mass' ? `${label}, ${unit}` : label),
        kind,
      })),
      ...notes,
    ],
    rows: months.map(({ month, stateWord, notes: pinned }, index) => [
      month,
      stateWord || 'whole',
      ...columns.map(({ kind, values }) => {
        const value = shownValue(values[index] ?? null, kind, unit);
        return value === null ? null : rounded(value, kind);
      }),
      ...notes.map(() => pinned.map(({ text }) => text).join(' | ')),
    ]),
  };
};
