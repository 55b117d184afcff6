import 'server-only';
import { and, sql } from 'drizzle-orm';
import Papa from 'papaparse';
import { type CompanyScope, type Tx, withCompany } from '@/db/client';
import { recoveries as r } from '@/db/schema/recoveries';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { toFormulaSafe } from '@/lib/formula-safe';
import { RECOVERY_FIELDS } from '@/lib/imports/fields';
import { FILE_COLUMNS, RECORD_FIELDS } from '@/lib/recoveries/fields';
import { sameRecord, storedColumns } from '@/lib/recoveries/stored';
import { type StoredRecord, storedTexts } from '@/lib/recoveries/stored-texts';
import type { RecordListQuery } from './contract';
import { recordsInList } from './filters';
import { keysetOf } from './keyset';

const ROWS_A_FETCH = 1000;

const csvLines = (rows: string[][]): string =>
  `${Papa.unparse(
    rows.map((cells) => cells.map(toFormulaSafe)),
    { newline: '\r\n' },
  )}\r\n`;

const exportQuery = (tx: Tx, query: RecordListQuery, timeZone: string) =>
  tx
    .select({ ...storedColumns(timeZone), extra: r.extra })
    .from(f)
    .innerJoin(r, sameRecord)
    .where(recordsInList(query))
    .orderBy(keysetOf(query.sort).orderBy);

type ExportRow = StoredRecord & { extra: Record<string, string> };

const camelCase = (column: string): string => column.replace(/_(\w)/g, (_, letter: string) => letter.toUpperCase());

/** Fetched rows under the names of `storedColumns`: a cursor gives the database's names. */
const toExportRows = (rows: Record<string, unknown>[]): ExportRow[] => {
  const names = Object.keys(rows[0] ?? {}).map((column) => [column, camelCase(column)] as const);
  // The columns are those of exportQuery, whose types Drizzle knows.
  return rows.map((row) => Object.fromEntries(names.map(([column, name]) => [name, row[column]])) as ExportRow);
};

/** Columns of imported files that the product has no field for, over the whole scope. */
const extraColumns = async (tx: Tx, query: RecordListQuery): Promise<string[]> => {
  const keys = await tx.execute<{ key: string }>(
    sql`select distinct jsonb_object_keys(${r.extra}) as key from ${f} inner join ${r} on ${sameRecord}
        where ${and(recordsInList(query), sql`${r.extra} <> '{}'::jsonb`)} order by 1`,
  );
  const known: readonly string[] = RECOVERY_FIELDS;
  return keys.rows.map((row) => row.key).filter((key) => !known.includes(key));
};

const cellsOf = (row: ExportRow, extra: string[]): string[] => {
  const texts = storedTexts(row);
  const byColumn = new Map<string, string>(RECORD_FIELDS.map((field) => [FILE_COLUMNS[field], texts[field]]));
  return [...RECOVERY_FIELDS.map((column) => byColumn.get(column) ?? ''), ...extra.map((key) => row.extra[key] ?? '')];
};

/**
 * Writes every record in scope as a recovery file, in the units entered, piece by piece: a cursor holds the place, so
 * that neither side keeps the whole. `write` is waited for.
 */
export const exportRecords = (
  scope: CompanyScope,
  query: RecordListQuery,
  timeZone: string,
  write: (lines: string) => Promise<void>,
): Promise<void> =>
  withCompany(scope, async (tx) => {
    const extra = await extraColumns(tx, query);
    await tx.execute(sql`declare export_rows no scroll cursor for ${exportQuery(tx, query, timeZone).getSQL()}`);
    await write(csvLines([[...RECOVERY_FIELDS, ...extra]]));
    for (;;) {
      const { rows } = await tx.execute(sql`fetch ${sql.raw(String(ROWS_A_FETCH))} from export_rows`);
      if (rows.length) await write(csvLines(toExportRows(rows).map((row) => cellsOf(row, extra))));
      if (rows.length < ROWS_A_FETCH) return;
    }
  });
