import { unreadable } from '@/lib/errors';
import { askUnits } from '@/lib/imports/ask-units';
import { ColumnProfile } from '@/lib/imports/column-profile';
import type { Mapping } from '@/lib/imports/contract';
import type { RawRow } from '@/lib/imports/csv';
import { decideColumns } from '@/lib/imports/decide-columns';
import { nameHeaders } from '@/lib/imports/headers';
import type { ColumnLayout } from '@/lib/imports/layout';
import type { MappedColumn } from '@/lib/imports/map-columns';
import { rowShapeFault, tableWidth } from '@/lib/imports/row-shape';
import { cleanText, listWords } from '@/lib/imports/text';
import { massUnitOf, splitMassUnit } from '@/lib/imports/units';
import { type AdditionField, additionFieldOf, NEEDED_ADDITION_FIELDS, READ_AS } from './fields';

/** How a file of additions is read: its header row, the cells a row must have, and its columns. */
export type AdditionLayout = { headerLine: number; width: number; columns: ColumnLayout[] };

const HEADER_AMONG = 20;

const fieldOf = (header: string): AdditionField | null =>
  additionFieldOf(header) ?? additionFieldOf(splitMassUnit(header)?.rest ?? '');

/** The row among the first with the most names of columns. */
const headerRow = (rows: readonly RawRow[]): RawRow => {
  const known = ({ cells }: RawRow) => new Set(cells.map(fieldOf).filter((field) => field !== null)).size;
  const [best] = rows.slice(0, HEADER_AMONG).sort((a, b) => known(b) - known(a));
  if (!best) throw unreadable('The file has no rows.');
  return best;
};

const mapped = (headers: readonly string[]): MappedColumn[] => {
  const taken = new Set<AdditionField>();
  return headers.map((header, index): MappedColumn => {
    const field = fieldOf(header);
    const none = { index, header, field: null, fieldFrom: 'none' as const, meaning: null };
    if (!field || taken.has(field)) return none;
    taken.add(field);
    const as = READ_AS[field];
    const massUnit = field === 'added_charge' ? (splitMassUnit(header)?.unit ?? null) : null;
    return { ...none, field: as, fieldFrom: 'name', meaning: { field: as, exact: true, massUnit, vacuumUnit: null } };
  });
};

const requireNeeded = (columns: readonly MappedColumn[]): void => {
  const missing = NEEDED_ADDITION_FIELDS.filter((needed) => !columns.some(({ field }) => field === READ_AS[needed]));
  if (missing.length)
    throw unreadable(`No column is called ${listWords(missing, 'or')}. The first row must name the columns.`);
};

/**
 * Decides from all rows how each column is read. Throws 422 when needed columns are missing, and with what only the person
 * can say when the order of dates, the decimal mark or the unit is left open by the file; `told` answers that.
 */
export const additionLayout = (
  rows: readonly RawRow[],
  told: Mapping,
  numberColumns: ReadonlySet<number>,
  today: string,
): AdditionLayout => {
  const header = headerRow(rows);
  const width = tableWidth(header.cells);
  const columns = mapped(nameHeaders(header.cells));
  requireNeeded(columns);
  const profiles = columns.map((column) => new ColumnProfile(column, today));
  const unitIndex = columns.find(({ field }) => field === 'mass_unit')?.index;
  for (const row of rows) {
    if (row.line <= header.line || rowShapeFault(row, { width, columns: columns.length })) continue;
    const unit = unitIndex === undefined ? null : massUnitOf(row.cells[unitIndex] ?? '');
    for (const profile of profiles) profile.add(cleanText(row.cells[profile.column.index] ?? ''), unit);
  }
  const { decisions, questions } = decideColumns(profiles, numberColumns, told, null);
  const open = [...questions, ...askUnits(profiles, told.massUnit ?? null, null)];
  if (open.length)
    throw unreadable(`Nothing was taken in, because only you can say this: ${open.map((q) => q.sentence).join(' ')}`);
  return {
    headerLine: header.line,
    width,
    columns: decisions.map(({ profile, dateOrder, decimalMark }) => ({
      index: profile.column.index,
      header: profile.column.header,
      field: profile.column.field,
      dateOrder: dateOrder?.value ?? null,
      decimalMark: decimalMark?.value ?? null,
      massUnit: profile.column.meaning?.massUnit ?? null,
      vacuumUnit: null,
      decimals: {},
    })),
  };
};
