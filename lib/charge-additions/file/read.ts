import { tooLarge, unreadable } from '@/lib/errors';
import type { Mapping } from '@/lib/imports/contract';
import type { RawRow } from '@/lib/imports/csv';
import type { ColumnLayout } from '@/lib/imports/layout';
import type { FieldColumns } from '@/lib/imports/row-cells';
import { rowShapeFault } from '@/lib/imports/row-shape';
import type { OpenFile, RowReason } from '@/lib/imports/rows';
import { openTable } from '@/lib/imports/table';
import { countText } from '@/lib/imports/text';
import { additionLayout } from './columns';
import { type AdditionRow, readAdditionRow } from './row';

/** A contractor adds refrigerant some thousand times a year; a file of them is taken in while the person waits. */
export const MOST_ADDITION_ROWS = 20_000;

/** A row that was not taken: where it stands, its cells as they came, and why. */
export type RefusedRow = { line: number; additionRef: string | null; cells: string[]; reasons: RowReason[] };

export type ReadAdditions = {
  headers: string[];
  rows: { line: number; cells: string[]; row: AdditionRow }[];
  refused: RefusedRow[];
};

const allRows = async (batches: AsyncIterable<RawRow[]>): Promise<RawRow[]> => {
  const rows: RawRow[] = [];
  for await (const batch of batches) {
    rows.push(...batch);
    if (rows.length > MOST_ADDITION_ROWS)
      throw tooLarge(`The file has more than ${countText(MOST_ADDITION_ROWS)} rows. Send it in parts.`);
  }
  return rows;
};

const byField = (columns: readonly ColumnLayout[]): FieldColumns =>
  new Map(columns.flatMap((column) => (column.field ? [[column.field, column] as const] : [])));

/**
 * Reads a whole file of charge additions: separators, encodings, decimal marks, date orders and units as a recovery file
 * is read. Every row comes out once, taken or refused with all of its reasons. Throws 422 for what can't be read at all,
 * 413 for too many rows.
 */
export const readAdditionFile = async (
  open: OpenFile,
  told: Mapping,
  { fileName, today }: { fileName: string; today: string },
): Promise<ReadAdditions> => {
  const table = await openTable(open, told, fileName);
  const raw = await allRows(table.rows());
  const { headerLine, width, columns } = additionLayout(raw, told, table.numberColumns, today);
  const body = raw.filter(({ line }) => line > headerLine);
  if (body.length === 0) throw unreadable('The file names its columns but has no rows below them.');
  const read: ReadAdditions = { headers: columns.map(({ header }) => header), rows: [], refused: [] };
  for (const { line, cells, quoteFault } of body) {
    const fault = rowShapeFault({ line, cells, quoteFault }, { width, columns: columns.length });
    if (fault) {
      read.refused.push({ line, cells, additionRef: null, reasons: [fault] });
      continue;
    }
    const result = readAdditionRow(byField(columns), cells, { today, massUnit: told.massUnit ?? null });
    if (result.ok) read.rows.push({ line, cells, row: result.row });
    else read.refused.push({ line, cells, additionRef: result.additionRef, reasons: result.reasons });
  }
  return read;
};
