import 'server-only';
import { setTimeout as sleep } from 'node:timers/promises';
import { and, eq } from 'drizzle-orm';
import { withCompany, withCompanyJob } from '@/db/client';
import { withCompanyConnection } from '@/db/pool-client';
import { imports } from '@/db/schema/imports';
import { scopeOf, type Viewer } from '@/lib/auth/viewer';
import { AppError, conflict } from '@/lib/errors';
import { REQUEST_ALL_FLAGS } from '@/lib/flags/request';
import type { ImportPayload } from '@/lib/jobs/task';
import { IMPORT_STATUS, LOCK_IMPORT } from './sql/finish';
import { FOR_MANY_ROWS, REFRESH_FROM_ROWS, REFRESH_STATISTICS } from './sql/settings';
import {
  CREATE_TAKEN_ROWS,
  DELETE_ADDED,
  DELETE_FLAGS,
  DELETE_NAMES,
  FINISH_UNDO,
  KEPT_RECORDS,
  RENEW_EARLIER_LEDGER,
  RESTORE_UPDATED,
} from './sql/undo';
import { enqueue } from './store';
import { type ImportRecord, requireImport } from './view';

const WAIT_MS = 50_000;
const LOOK_EVERY_MS = 150;

/**
 * Takes an import back, all or nothing: added records go, changed ones get their former values, records changed since
 * are kept and listed, names that it brought go when nothing else uses them. The history keeps all of it.
 */
export const undoImport = ({ companyId, importId, actor }: ImportPayload): Promise<void> =>
  withCompanyConnection({ companyId, actor, reason: `undo of import ${importId}` }, async (client) => {
    const owner = [companyId, importId];
    await client.query(LOCK_IMPORT, [importId]);
    const { rows } = await client.query<{ status: string }>(IMPORT_STATUS, owner);
    if (rows[0]?.status !== 'done') return;
    await client.query(FOR_MANY_ROWS);
    await client.query(CREATE_TAKEN_ROWS, owner);
    await client.query('analyze taken_rows');
    const kept = await client.query<{ recordRef: string; reason: string }>(KEPT_RECORDS, [importId]);
    for (const statement of [DELETE_FLAGS, DELETE_ADDED, RESTORE_UPDATED, RENEW_EARLIER_LEDGER])
      await client.query(statement, [companyId]);
    for (const statement of DELETE_NAMES) await client.query(statement, owner);
    const { rows: taken } = await client.query<{ count: number }>('select count(*)::int as count from taken_rows');
    if ((taken[0]?.count ?? 0) >= REFRESH_FROM_ROWS) await client.query(REFRESH_STATISTICS);
    await client.query(REQUEST_ALL_FLAGS, [companyId]);
    await client.query(FINISH_UNDO, [...owner, JSON.stringify(kept.rows)]);
  });

/** An undo that could not be done leaves the import as it was and says why. */
export const failUndo = async ({ companyId, importId }: ImportPayload, sentence: string): Promise<void> => {
  await withCompanyJob({ companyId, actor: 'import' }, (tx) =>
    tx
      .update(imports)
      .set({ failure: sentence })
      .where(and(eq(imports.companyId, companyId), eq(imports.id, importId), eq(imports.status, 'done'))),
  );
};

const askForUndo = (viewer: Viewer, id: string) =>
  withCompany(scopeOf(viewer), async (tx) => {
    const known = await requireImport(tx, id, 'update');
    if (known.status === 'undone') throw conflict('This import has been undone already.');
    if (known.status !== 'done' || known.dryRun)
      throw conflict('This import has taken nothing in that could be undone.');
    await tx
      .update(imports)
      .set({ failure: null })
      .where(and(eq(imports.companyId, viewer.companyId), eq(imports.id, id)));
    await enqueue(tx, 'undo-import', viewer, id);
  });

/**
 * Puts the undo into the queue and waits for it a while; the status of what is given tells whether it is done. Throws 409
 * when there is nothing to undo.
 */
export const undoAndWait = async (viewer: Viewer, id: string): Promise<ImportRecord> => {
  await askForUndo(viewer, id);
  const until = Date.now() + WAIT_MS;
  for (;;) {
    const record = await withCompany(scopeOf(viewer), (tx) => requireImport(tx, id));
    if (record.failure) throw new AppError(500, 'The import was not undone', record.failure);
    if (record.status === 'undone' || Date.now() > until) return record;
    await sleep(LOOK_EVERY_MS);
  }
};
