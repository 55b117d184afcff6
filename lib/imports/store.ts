import 'server-only';
import { randomUUID } from 'node:crypto';
import { and, eq, sql } from 'drizzle-orm';
import { v5 as uuidOfName } from 'uuid';
import { type Tx, withCompany } from '@/db/client';
import { importRows, imports } from '@/db/schema/imports';
import { fieldErrors } from '@/lib/api/problem';
import { scopeOf, type Viewer } from '@/lib/auth/viewer';
import { AppError, badInput, conflict } from '@/lib/errors';
import { type Mapping, mappingSchema } from './contract';
import { writeChunks } from './file-chunks';
import type { ReceivedForm } from './multipart';
import { requireImport } from './view';

/** Puts work on an import into the queue, as part of the transaction. */
export const enqueue = (tx: Tx, task: 'take-in-file' | 'undo-import', viewer: Viewer, importId: string) =>
  tx.execute(
    sql`select work.enqueue(${task}, ${JSON.stringify({ companyId: viewer.companyId, importId, actor: viewer.actor })}::json, ${`${task}:${importId}`})`,
  );

/** The mapping out of a form field; throws 400 with what is wrong. */
const parseMapping = (text: string | undefined): Mapping => {
  if (!text?.trim()) return {};
  let told: unknown;
  try {
    told = JSON.parse(text);
  } catch {
    throw badInput([{ path: 'mapping', message: 'This is not JSON.' }]);
  }
  const mapping = mappingSchema.safeParse(told);
  if (mapping.success) return mapping.data;
  throw badInput(fieldErrors(mapping.error).map(({ path, message }) => ({ path: `mapping.${path}`, message })));
};

const parseDryRun = (text: string | undefined): boolean => {
  if (text === undefined || text === '' || text === 'false') return false;
  if (text === 'true') return true;
  throw badInput([{ path: 'dryRun', message: 'Expected true or false.' }]);
};

/** The same key of the same company names the same import, so that a repeated upload is one upload. */
const importIdFor = (viewer: Viewer, key: string | null) =>
  key ? uuidOfName(`idempotency key ${key}`, viewer.companyId) : randomUUID();

/**
 * Keeps the file, its import and the work to do in one transaction, so that what was promised survives any crash. Gives
 * the id. A repeated Idempotency-Key gives the id of the first time; throws 409 when it comes with another file.
 */
export const createImport = async (viewer: Viewer, form: ReceivedForm, key: string | null): Promise<string> => {
  const mapping = parseMapping(form.fields.get('mapping'));
  const dryRun = parseDryRun(form.fields.get('dryRun'));
  const { path, fileName, size, sha256 } = form.file;
  const { companyId } = viewer;
  const id = importIdFor(viewer, key);
  await withCompany(scopeOf(viewer), async (tx) => {
    const made = await tx
      .insert(imports)
      .values({ companyId, id, fileName, fileSize: size, fileSha256: sha256, mapping, dryRun, createdBy: viewer.actor })
      .onConflictDoNothing()
      .returning({ id: imports.id });
    if (!made.length) return requireSameFile(tx, id, sha256);
    await writeChunks(tx, companyId, id, path);
    await enqueue(tx, 'take-in-file', viewer, id);
  });
  return id;
};

const requireSameFile = async (tx: Tx, id: string, sha256: string) => {
  const known = await requireImport(tx, id);
  if (known.fileSha256 !== sha256)
    throw new AppError(409, 'Key used before', 'This Idempotency-Key came with another file before.');
};

/** Reads a file again that was previewed or could not be taken: with another mapping, or to take it in for good. */
export const readAgain = async (
  viewer: Viewer,
  id: string,
  change: { dryRun: boolean; mapping: Mapping | undefined },
): Promise<string> => {
  const { companyId } = viewer;
  await withCompany(scopeOf(viewer), async (tx) => {
    const known = await requireImport(tx, id, 'update');
    const over = known.status === 'failed' || (known.status === 'done' && known.dryRun);
    if (!over) throw conflict(refusalToReadAgain(known.status));
    await tx.delete(importRows).where(eq(importRows.importId, id));
    await tx
      .update(imports)
      .set({
        ...{ status: 'queued' as const, dryRun: change.dryRun, mapping: change.mapping ?? known.mapping },
        ...{ reading: null, summary: null, failure: null, startedAt: null, finishedAt: null },
        ...{ rowsRead: 0, rowsTotal: null, added: 0, updated: 0, unchanged: 0, rejected: 0 },
      })
      .where(and(eq(imports.companyId, companyId), eq(imports.id, id)));
    await enqueue(tx, 'take-in-file', viewer, id);
  });
  return id;
};

const refusalToReadAgain = (status: string): string => {
  if (status === 'done') return 'This file has been taken in already. Undo the import first, or send the file again.';
  if (status === 'undone') return 'This import was undone. Send the file again.';
  return 'This file is being read at the moment. Wait until that is done.';
};
