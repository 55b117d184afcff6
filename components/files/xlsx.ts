import type { Cell, Row, SheetData } from 'write-excel-file/universal';
import type { FileCell, FileColumn, FileOrigin, FileTable } from './file-table';

const NUMBER_FORMATS: Record<'mass' | 'count' | 'share' | 'change' | 'factor' | 'points', string> = {
  mass: '#,##0.0',
  count: '#,##0',
  share: '0.0%',
  change: '+0%;-0%;0%',
  factor: '0.00',
  points: '+0.0;-0.0;0.0',
};

const head = (value: string): Cell => ({ value, type: String, fontWeight: 'bold', wrap: true });
const text = (value: string): Cell => ({ value, type: String });

const cellOf = (cell: FileCell, { kind }: FileColumn): Cell => {
  if (cell === null || cell === '') return null;
  if (kind === 'text') return text(String(cell));
  // Excel's dates have no zone: midnight in UTC is the day itself.
  if (kind === 'month') return { value: new Date(`${cell}-01T00:00:00Z`), type: Date, format: 'mmm yyyy' };
  if (kind === 'day') return { value: new Date(`${cell}T00:00:00Z`), type: Date, format: 'yyyy-mm-dd' };
  return { value: Number(cell), type: Number, format: NUMBER_FORMATS[kind] };
};

const aboutRows = ({ title, scopeWords, unit, rows }: FileTable, { madeAt, address }: FileOrigin): Row[] => [
  [head('What'), text(title)],
  [head('Recoveries'), text(scopeWords)],
  [head('Masses in'), text(unit)],
  [head('Made (UTC)'), { value: madeAt, type: Date, format: 'yyyy-mm-dd hh:mm' }],
  [head('Rows'), { value: rows.length, type: Number, format: '#,##0' }],
  [head('Address'), text(address)],
];

type WorkbookSheet = { sheet: string; data: SheetData; columns: { width: number }[]; stickyRowsCount?: number };

/**
 * The table as the sheets of an Excel workbook: its figures as numbers and its months as dates, and a second sheet that
 * says what they are, of which records, when and where it was made.
 */
export const toWorkbook = (table: FileTable, origin: FileOrigin): WorkbookSheet[] => [
  {
    sheet: 'Figures',
    stickyRowsCount: 1,
    columns: table.columns.map(({ kind }) => ({ width: kind === 'text' ? 24 : 14 })),
    data: [
      table.columns.map(({ label }) => head(label)),
      ...table.rows.map((row) => table.columns.map((column, index) => cellOf(row[index] ?? null, column))),
    ],
  },
  { sheet: 'About', columns: [{ width: 14 }, { width: 90 }], data: aboutRows(table, origin) },
];
