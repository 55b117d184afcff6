import { clsx } from 'clsx';
import type { ReactNode } from 'react';
import { FigureLink } from '@/components/figures/figure-link';
import { NoteNumber } from '@/components/notes/note-number';
import { Table, Td, Th } from '@/components/ui/table';
import { formatChange, formatCount, formatMass, formatMonth, formatNumber, formatPercent } from '@/lib/format';
import { type ChartColumn, type ChartModel, tableColumns } from './model';

/** A heading with its unit on a line of its own, so that many columns fit. */
const Head = ({ column, unit, colour }: { column: ChartColumn; unit: string; colour: string | undefined }) => (
  <Th
    numeric
    className={column.kind === 'mass' ? 'max-w-36 whitespace-normal!' : 'max-w-28 min-w-16 whitespace-normal!'}
  >
    {colour ? (
      <span className="inline-flex items-baseline gap-1.5">
        <span aria-hidden="true" className="size-2.5 shrink-0" style={{ background: colour }} />
        <span className="w-min">{column.label}</span>
      </span>
    ) : (
      column.label
    )}
    {column.kind === 'mass' ? (
      <>
        <span className="sr-only">,</span> <span className="block font-normal">{unit}</span>
      </>
    ) : null}
  </Th>
);

const textOf = (value: number, kind: ChartColumn['kind'], unit: ChartModel['unit']): string => {
  switch (kind) {
    case 'mass':
      return formatMass(value, unit);
    case 'count':
      return formatCount(value);
    case 'share':
      return formatPercent(value);
    case 'change':
      return formatChange(value);
    case 'factor':
      return formatNumber(value, 2);
  }
};

const Cell = ({ model, column, index }: { model: ChartModel; column: ChartColumn; index: number }): ReactNode => {
  const value = column.values[index] ?? null;
  const month = model.months[index]?.month ?? '';
  if (value === null) return '—';
  // A stack has no layer there: an empty place is easier to see than a zero.
  if (value === 0 && model.series.some(({ key }) => key === column.key)) return <span className="text-ink-3">–</span>;
  const text = textOf(value, column.kind, model.unit);
  const figure = model.open(month, column.key);
  return figure ? (
    <FigureLink {...figure} className="figure-link decoration-transparent hover:decoration-current">
      {text}
    </FigureLink>
  ) : (
    text
  );
};

/** A chart in figures, newest month first; every figure opens the records behind it. */
export const ModelTable = ({ model, label }: { model: ChartModel; label: string }) => {
  const columns = tableColumns(model);
  const colours = new Map(model.series.map(({ key, colour }) => [key, colour]));
  const newestFirst = model.months.map((month, index) => ({ ...month, index })).reverse();
  return (
    <Table label={label}>
      <thead>
        <tr>
          <Th>Month</Th>
          {columns.map((column) => (
            <Head key={column.key} column={column} unit={model.unit} colour={colours.get(column.key)} />
          ))}
        </tr>
      </thead>
      <tbody>
        {newestFirst.map(({ month, state, stateWord, notes, index }) => (
          <tr key={month} className={state === 'whole' ? undefined : 'text-ink-2'}>
            <Th scope="row" className="whitespace-nowrap">
              {formatMonth(month, 'short')}
              {notes.map((note) => (
                <span key={note.id} className="ml-1.5">
                  <NoteNumber note={note} />
                </span>
              ))}
              {stateWord ? (
                <span className={clsx('ml-2 px-1.5 py-0.5 text-xs', state === 'whole' ? 'marked' : 'bg-sheet-2')}>
                  {stateWord}
                </span>
              ) : null}
            </Th>
            {columns.map((column) => (
              <Td key={column.key} numeric className={column.key === model.total.key ? 'font-semibold' : undefined}>
                <Cell model={model} column={column} index={index} />
              </Td>
            ))}
          </tr>
        ))}
      </tbody>
    </Table>
  );
};
