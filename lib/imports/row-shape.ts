import type { RawRow } from './csv';
import type { RowReason } from './rows';
import { cleanText } from './text';

/** Cells a row must have: up to the last column with a name. Blank headers behind it are tails of a spreadsheet. */
export const tableWidth = (headerCells: readonly string[]): number =>
  headerCells.findLastIndex((cell) => cleanText(cell) !== '') + 1;

const overflow = (cells: readonly string[], columns: number) =>
  cells.slice(columns).find((cell) => cell.trim() !== '') ?? null;

/**
 * Why the cells of a row can't be matched to the columns, or null. Too many or too few cells mean a separator inside a
 * cell or a lost one: every later cell may stand under a wrong header, so nothing else of the row is looked at.
 */
export const rowShapeFault = (
  { cells, quoteFault }: RawRow,
  { width, columns }: { width: number; columns: number },
): RowReason | null => {
  const fault = (code: string, message: string, value: string) => ({ column: null, code, message, value });
  if (quoteFault)
    return fault('quote_not_closed', 'A quotation mark opens in this line and does not close.', cells[0] ?? '');
  if (cells.length < width)
    return fault('too_few_cells', `The row has ${cells.length} cells where the header has ${width}.`, '');
  const extra = overflow(cells, columns);
  return extra === null
    ? null
    : fault('too_many_cells', `The row has ${cells.length} cells where the header has ${width}.`, extra);
};
