import { type FileColumn, type FileTable, massCell } from '@/components/files/file-table';
import { plainCharacters } from '@/lib/format';
import { type ChartModel, fileColumns } from './model';

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
      stateWord || model.plainState,
      ...columns.map(({ kind, values }) => {
        const value = values[index] ?? null;
        return value === null || kind !== 'mass' ? value : massCell(value, unit);
      }),
      ...notes.map(() => pinned.map(({ text }) => text).join(' | ')),
    ]),
  };
};
