import 'server-only';
import { once } from 'node:events';
import { finished } from 'node:stream/promises';
import type { PoolClient } from 'pg';
import { from as copyFrom } from 'pg-copy-streams';
import { copyJson, copyLine } from './copy-text';
import { RECORD_COLUMNS, RECORD_NAMES, type Stated } from './record-columns';
import type { ParsedRow } from './rows';
import { sourceHash } from './source-hash';
import { ANALYZE_STAGED_ROWS, COPY_STAGED_ROWS, CREATE_STAGED_ROWS } from './sql/staging';

const NOTHING_STATED = Array.from({ length: 3 + RECORD_COLUMNS.length + RECORD_NAMES.length }, () => null);

const staged = (parsed: ParsedRow, stated: Stated): string => {
  const head = [parsed.line, parsed.recordRef, copyJson(parsed.cells)];
  if (!parsed.ok) return copyLine([...head, copyJson(parsed.reasons), ...NOTHING_STATED]);
  const { row } = parsed;
  return copyLine([
    ...head,
    null,
    sourceHash(row, stated),
    copyJson(row.entered),
    copyJson(row.extra),
    ...RECORD_COLUMNS.map(({ value }) => value(row)),
    ...RECORD_NAMES.map(({ value }) => value(row)),
  ]);
};

/**
 * Streams the rows of the file into a temporary table of the transaction, no faster than the database takes them.
 * `tell` hears after each batch how many rows have been read.
 */
export const stageRows = async (
  client: PoolClient,
  batches: AsyncIterable<ParsedRow[]>,
  stated: Stated,
  tell: (rowsRead: number) => Promise<void>,
): Promise<void> => {
  await client.query(CREATE_STAGED_ROWS);
  const copy = client.query(copyFrom(COPY_STAGED_ROWS));
  const ended = finished(copy);
  // Heard here while the file is read, and once more below.
  ended.catch(() => undefined);
  let rowsRead = 0;
  try {
    for await (const batch of batches) {
      const text = batch.map((parsed) => staged(parsed, stated)).join('');
      if (!copy.write(text)) await Promise.race([once(copy, 'drain'), ended]);
      rowsRead += batch.length;
      await tell(rowsRead);
    }
    copy.end();
  } catch (error) {
    copy.destroy();
    throw error;
  }
  await ended;
  await client.query(ANALYZE_STAGED_ROWS);
};
