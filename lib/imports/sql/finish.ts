/** One worker at a time works on an import. $1 import. */
export const LOCK_IMPORT = `select pg_advisory_xact_lock(hashtextextended('import ' || $1::uuid, 0))`;

/** $1 company, $2 import. A statement of its own: one that waits for the lock sees the import as it was before. */
export const IMPORT_STATUS = 'select status from imports where company_id = $1 and id = $2::uuid';

/** $1 company, $2 import, $3 counts, $4 summary. */
export const FINISH_IMPORT = `
  update imports set status = 'done', failure = null, finished_at = clock_timestamp(), summary = $4::jsonb,
         rows_read = (c->>'rowsRead')::int, rows_total = (c->>'rowsRead')::int, added = (c->>'added')::int,
         updated = (c->>'updated')::int, unchanged = (c->>'unchanged')::int, rejected = (c->>'rejected')::int
  from (select $3::jsonb as c) counts
  where company_id = $1 and id = $2`;
