import Papa from 'papaparse';
import { toFormulaSafe } from '@/lib/formula-safe';
import type { FileCell, FileTable } from './file-table';

/** Excel takes a file for Windows-1252 unless it begins with this. */
const BYTE_ORDER_MARK = '\uFEFF';

const csvCell = (cell: FileCell): string | number => (typeof cell === 'string' ? toFormulaSafe(cell) : (cell ?? ''));

/** The table as CSV (RFC 4180, UTF-8): a head and its rows, texts safe to open in a spreadsheet, no value an empty cell. */
export const toCsv = ({ columns, rows }: FileTable): string =>
  `${BYTE_ORDER_MARK}${Papa.unparse(
    [columns.map(({ label }) => toFormulaSafe(label)), ...rows.map((row) => row.map(csvCell))],
    { newline: '\r\n' },
  )}\r\n`;
