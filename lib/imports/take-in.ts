import 'server-only';
import type { PoolClient } from 'pg';
import { withCompanyConnection } from '@/db/pool-client';
import { unreadable } from '@/lib/errors';
import { REQUEST_ALL_FLAGS } from '@/lib/flags/request';
import type { ImportPayload } from '@/lib/jobs/task';
import { keptFile } from './file-chunks';
import { type ImportWork, loadImportWork } from './import-work';
import { markAsked, markPlanned, markRead, markRunning } from './progress';
import { readRows } from './read-file';
import { RECORD_NAMES, type Stated, statedBy } from './record-columns';
import { planFile, rememberMapping } from './remembered-mapping';
import type { FilePlan } from './rows';
import { ANALYZE_DECIDED_ROWS, COUNT_OUTCOMES, createDecidedRows, INSERT_IMPORT_ROWS } from './sql/decide';
import { FINISH_IMPORT, IMPORT_STATUS, LOCK_IMPORT } from './sql/finish';
import { ANALYZE_MATCHED_ROWS, CREATE_MATCHED_ROWS, LOCK_KNOWN_RECORDS } from './sql/match';
import { ANALYZE_STAGED_NAMES, CREATE_STAGED_APPLIANCES, createStagedNames } from './sql/names';
import { FOR_MANY_ROWS, REFRESH_FROM_ROWS, REFRESH_STATISTICS } from './sql/settings';
import { INSERT_NAMES, INSERT_RECOVERIES, updateRecoveries } from './sql/write';
import { stageRows } from './stage';
import { summarize } from './summary';

const TELL_EVERY_ROWS = 5_000;

/*
 * Takes a file in, in these steps:
 *
 * 1. plan    one pass over the kept file decides how its columns are read; open questions end it here.
 * 2. stage   a second pass copies every row, taken or refused by the reader, into a temporary table.
 * 3. match   rows meet the records of the same ref, and rows of the file with the same ref meet each other.
 * 4. names   spellings meet the company's technicians, sites, appliances, branches and cylinders.
 * 5. decide  every row is added, updated, unchanged or rejected; the ledger (import_rows), the counts and the summary
 *            are written.
 * 6. write   new names, new records, changed records. A preview leaves this step out.
 *
 * Steps 2 to 6 are one transaction: after a crash at any moment nothing of them is there, and the queue begins again
 * with the kept file. The history's lock is taken by step 6 only, so that people can go on writing until then.
 */

const stage = async (client: PoolClient, work: ImportWork, plan: FilePlan, stated: Stated) => {
  const { scope, importId, context } = work;
  let told = 0;
  const batches = readRows(keptFile(scope, importId), plan, context);
  await stageRows(client, batches, stated, async (rowsRead) => {
    if (rowsRead - told < TELL_EVERY_ROWS) return;
    told = rowsRead;
    await markRead(scope, importId, rowsRead);
  });
};

const decide = async (client: PoolClient, work: ImportWork, plan: FilePlan, stated: Stated) => {
  const { companyId } = work.scope;
  await client.query(LOCK_KNOWN_RECORDS, [companyId]);
  await client.query(CREATE_MATCHED_ROWS, [companyId]);
  await client.query(ANALYZE_MATCHED_ROWS);
  for (const name of RECORD_NAMES)
    await client.query(name.table === 'appliances' ? CREATE_STAGED_APPLIANCES : createStagedNames(name), [companyId]);
  await client.query(ANALYZE_STAGED_NAMES);
  const refHeader = plan.reading.columns.find(({ field }) => field === 'record_ref')?.header ?? 'record_ref';
  const overwrite = work.told.overwriteCorrections === true;
  await client.query(createDecidedRows(stated), [companyId, overwrite, refHeader]);
  await client.query(ANALYZE_DECIDED_ROWS);
};

const write = async (client: PoolClient, { scope, importId }: ImportWork, plan: FilePlan, stated: Stated) => {
  const owner = [scope.companyId, importId];
  for (const statement of INSERT_NAMES) await client.query(statement, owner);
  await client.query(INSERT_RECOVERIES, owner);
  await client.query(updateRecoveries(stated), [...owner, plan.fields]);
};

const takeRows = (work: ImportWork, plan: FilePlan): Promise<void> =>
  withCompanyConnection(work.scope, async (client) => {
    const { scope, importId, context } = work;
    const owner = [scope.companyId, importId];
    // Should a worker be thought dead that is not, the second one waits here and then finds the work done.
    await client.query(LOCK_IMPORT, [importId]);
    const { rows } = await client.query<{ status: string }>(IMPORT_STATUS, owner);
    if (rows[0]?.status !== 'running') return;
    await client.query(FOR_MANY_ROWS);
    const stated = statedBy(plan.fields);
    await stage(client, work, plan, stated);
    await decide(client, work, plan, stated);
    await client.query(INSERT_IMPORT_ROWS, owner);
    const counts =
      await client.query<Record<'rowsRead' | 'added' | 'updated' | 'unchanged' | 'rejected', number>>(COUNT_OUTCOMES);
    const summary = await summarize(client, scope.companyId, context.timeZone, stated);
    if (!work.dryRun) {
      await rememberMapping(client, work, plan);
      await write(client, work, plan, stated);
      const { added = 0, updated = 0 } = counts.rows[0] ?? {};
      if (added + updated >= REFRESH_FROM_ROWS) await client.query(REFRESH_STATISTICS);
      if (added + updated > 0) await client.query(REQUEST_ALL_FLAGS, [scope.companyId]);
    }
    await client.query(FINISH_IMPORT, [...owner, counts.rows[0], summary]);
  });

/**
 * The work of the queue behind an upload. Does nothing when the import is over already. Throws AppError with a sentence
 * for the person when the file cannot be taken in.
 */
export const takeIn = async (payload: ImportPayload): Promise<void> => {
  const work = await loadImportWork(payload);
  if (!work) return;
  const { scope, importId, dryRun } = work;
  await markRunning(scope, importId);
  const plan = await planFile(work);
  await markPlanned(scope, importId, plan);
  const { questions } = plan.reading;
  if (!questions.length) return takeRows(work, plan);
  if (dryRun) return markAsked(scope, importId);
  throw unreadable(
    `Nothing was taken in, because only you can say this: ${questions.map((q) => q.sentence).join(' ')}`,
  );
};
