import { unreadable } from '@/lib/errors';
import type { MassUnit } from '@/lib/vocabulary';
import { askUnits, toldUnits } from './ask-units';
import { ColumnProfile } from './column-profile';
import type { ColumnReading, Mapping } from './contract';
import type { RawRow } from './csv';
import { parseDateText } from './date-text';
import { type ColumnDecision, decideColumns } from './decide-columns';
import { findHeader, headerKeyOf, nameHeaders } from './headers';
import type { ColumnLayout, FileLayout } from './layout';
import { mapColumns } from './map-columns';
import { parseDecimal } from './numbers';
import { rowShapeFault, tableWidth } from './row-shape';
import type { FilePlan, ReadContext } from './rows';
import type { Table } from './table';
import { cleanText } from './text';
import { unitEvidence } from './unit-evidence';
import { massUnitOf } from './units';
import { yearSpanOf } from './year-span';

const HEADER_AMONG = 100;

const firstRows = async (table: Table): Promise<RawRow[]> => {
  const rows: RawRow[] = [];
  for await (const batch of table.rows()) {
    rows.push(...batch);
    if (rows.length >= HEADER_AMONG) break;
  }
  return rows;
};

/** The row that names the columns; throws 422 when there is none, so that a row of data is never taken for it. */
const headerRow = (rows: readonly RawRow[], today: string): RawRow => {
  const { position, known } = findHeader(rows);
  const header = rows[position];
  if (!header) throw unreadable('The file has no rows.');
  const span = yearSpanOf('recovered_at', today);
  const looksLikeData = header.cells.some(
    (cell) =>
      parseDecimal(cell, 'point') !== null || parseDateText(cell, 'mdy', span) || parseDateText(cell, 'dmy', span),
  );
  if (known === 0 && looksLikeData)
    throw unreadable('The first row must name the columns, and this one looks like data.');
  if (header.cells.filter((cell) => cell.trim() !== '').length < 2)
    throw unreadable('The first row must name the columns, and only one name was found.');
  return header;
};

/** One pass over all rows below the header; gives how many there are. */
const gather = async (table: Table, headerLine: number, profiles: readonly ColumnProfile[], width: number) => {
  const unitIndex = profiles.find(({ column }) => column.field === 'mass_unit')?.column.index;
  let rowsTotal = 0;
  for await (const batch of table.rows()) {
    for (const raw of batch) {
      if (raw.line <= headerLine) continue;
      rowsTotal += 1;
      if (rowShapeFault(raw, { width, columns: profiles.length })) continue;
      const unit: MassUnit | null = unitIndex === undefined ? null : massUnitOf(raw.cells[unitIndex] ?? '');
      for (const profile of profiles) profile.add(cleanText(raw.cells[profile.column.index] ?? ''), unit);
    }
  }
  return rowsTotal;
};

const layoutOf = ({ profile, dateOrder, decimalMark }: ColumnDecision): ColumnLayout => ({
  index: profile.column.index,
  header: profile.column.header,
  field: profile.column.field,
  dateOrder: dateOrder?.value ?? null,
  decimalMark: decimalMark?.value ?? null,
  massUnit: profile.column.meaning?.massUnit ?? null,
  vacuumUnit: profile.column.meaning?.vacuumUnit ?? null,
  decimals: profile.steps(),
});

/** Identifies the header row of a table, by its first rows alone. Throws 422 when there is none. */
export const headerKeyOfTable = async (table: Table, context: ReadContext): Promise<string> => {
  const { cells } = headerRow(await firstRows(table), context.today);
  return headerKeyOf(nameHeaders(cells).slice(0, tableWidth(cells)));
};

/** Decides how a table is read, from one pass over all of its rows. */
export const profileTable = async (
  table: Table,
  told: Mapping,
  remembered: Mapping | null,
  context: ReadContext,
): Promise<FilePlan> => {
  const header = headerRow(await firstRows(table), context.today);
  const headers = nameHeaders(header.cells);
  const width = tableWidth(header.cells);
  const { columns, questions } = mapColumns(headers, told, remembered);
  const profiles = columns.map((column) => new ColumnProfile(column, context.today));
  const rowsTotal = await gather(table, header.line, profiles, width);
  if (rowsTotal === 0) throw unreadable('The file names its columns but has no rows below them.');
  const decided = decideColumns(profiles, table.numberColumns, told, remembered);
  const units = toldUnits(told, remembered);
  const readingOf = ({ profile, dateOrder, decimalMark }: ColumnDecision): ColumnReading => ({
    header: profile.column.header,
    field: profile.column.field,
    fieldFrom: profile.column.fieldFrom,
    dateOrder,
    decimalMark,
    unit: unitEvidence(profile.column, columns, units),
    filled: profile.filled,
    examples: profile.examples,
  });
  const layout: FileLayout = {
    format: table.format,
    encoding: table.encoding?.value ?? 'utf-8',
    delimiter: table.delimiter?.value ?? ',',
    headerLine: header.line,
    width,
    columns: decided.decisions.map(layoutOf),
    ...units,
  };
  const isWorthShowing = ({ profile }: ColumnDecision) => profile.column.index < width || profile.filled > 0;
  return {
    reading: {
      format: table.format,
      encoding: table.encoding,
      delimiter: table.delimiter,
      headerLine: header.line,
      columns: decided.decisions.filter(isWorthShowing).map(readingOf),
      questions: [...questions, ...decided.questions, ...askUnits(profiles, units.massUnit, units.vacuumUnit)],
    },
    headerKey: headerKeyOf(headers.slice(0, width)),
    headers,
    rowsTotal,
    fields: columns.flatMap(({ field }) => field ?? []),
    layout,
  };
};
