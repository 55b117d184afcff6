import 'server-only';
import { and, asc, eq, gt } from 'drizzle-orm';
import Papa from 'papaparse';
import { z } from 'zod';
import { type CompanyScope, withCompany } from '@/db/client';
import { importRows } from '@/db/schema/imports';
import { toFormulaSafe } from '@/lib/formula-safe';
import { readingSchema } from './contract';
import { requireImport } from './view';

const BATCH = 500;
const BOM = '\uFEFF';
const reasonsSchema = z.array(z.object({ column: z.string().nullable(), message: z.string() }));

const nextRefused = (scope: CompanyScope, importId: string, afterLine: number) =>
  withCompany(scope, (tx) =>
    tx
      .select({ line: importRows.line, cells: importRows.cells, reasons: importRows.reasons })
      .from(importRows)
      .where(and(eq(importRows.importId, importId), eq(importRows.outcome, 'rejected'), gt(importRows.line, afterLine)))
      .orderBy(asc(importRows.line))
      .limit(BATCH),
  );

const csvLines = (rows: string[][]) =>
  `${Papa.unparse(
    rows.map((row) => row.map(toFormulaSafe)),
    { newline: '\r\n' },
  )}\r\n`;

const reasonText = (reasons: unknown) =>
  reasonsSchema
    .parse(reasons)
    .map(({ column, message }) => (column ? `${column}: ${message}` : message))
    .join(' ');

/**
 * The refused rows as they came, in the columns of the file, with a last column that says why; in pieces of UTF-8 with a
 * byte order mark, which spreadsheets need. Mended, the file can be fed in again: the reader leaves `reason` out and
 * takes the apostrophes off that guard against formulas.
 */
export async function* rejectedCsv(scope: CompanyScope, importId: string): AsyncGenerator<string> {
  const record = await withCompany(scope, (tx) => requireImport(tx, importId));
  const reading = readingSchema.nullable().parse(record.reading);
  const headers = reading?.columns.map(({ header }) => header) ?? [];
  const kept = headers.map((header, index) => ({ header, index })).filter(({ header }) => header !== 'reason');
  yield BOM + csvLines([[...kept.map(({ header }) => header), 'reason']]);
  let rows = await nextRefused(scope, importId, 0);
  while (rows.length) {
    yield csvLines(
      rows.map(({ cells, reasons }) => [...kept.map(({ index }) => cells?.[index] ?? ''), reasonText(reasons)]),
    );
    rows = await nextRefused(scope, importId, rows.at(-1)?.line ?? Number.MAX_SAFE_INTEGER);
  }
}
