import 'server-only';
import { randomUUID } from 'node:crypto';
import { and, asc, eq } from 'drizzle-orm';
import { v5 as uuidFromName } from 'uuid';
import { type Tx, withCompany } from '@/db/client';
import { history } from '@/db/schema/history';
import { recoveries } from '@/db/schema/recoveries';
import { scopeOf, type Viewer } from '@/lib/auth/viewer';
import { AppError, badInput } from '@/lib/errors';
import { requestFlags } from '@/lib/flags/request';
import type { RecoveryRow } from '@/lib/imports/rows';
import { newTexts, type RecordBody } from './body';
import { keepCertification } from './certification';
import { recordColumns } from './columns';
import { todayIn } from './local-time';
import { resolveNames } from './names';
import { ownTechnician, withOwnTechnician } from './own-records';
import { readTexts } from './read-texts';
import { refusingTakenRef } from './record-ref';
import { getDesignations } from './refrigerants';

// The same key of the same writer is the same record: its id follows from the two, so that no second table is needed.
const idFor = (viewer: Viewer, idempotencyKey: string | null): string =>
  idempotencyKey === null
    ? randomUUID()
    : uuidFromName(JSON.stringify([viewer.companyId, viewer.actor, idempotencyKey]), uuidFromName.URL);

const firstEntered = async (tx: Tx, id: string): Promise<unknown> => {
  const [entry] = await tx
    .select({ after: history.after })
    .from(history)
    .where(and(eq(history.tableName, 'recoveries'), eq(history.rowId, id), eq(history.action, 'insert')))
    .orderBy(asc(history.entryNo));
  return entry?.after?.entered;
};

const sameTexts = (one: unknown, other: Record<string, string>): boolean => {
  const sorted = (texts: object) => JSON.stringify(Object.entries(texts).sort());
  return typeof one === 'object' && one !== null && sorted(one) === sorted(other);
};

const refuseOtherRecord = async (tx: Tx, id: string, row: RecoveryRow): Promise<void> => {
  if (!sameTexts(await firstEntered(tx, id), row.entered))
    throw new AppError(409, 'Key used before', 'This Idempotency-Key was used for another record. Send a new key.');
};

const typedRecord = async (tx: Tx, viewer: Viewer, body: RecordBody): Promise<RecoveryRow> => {
  const texts = withOwnTechnician(newTexts(body), await ownTechnician(tx, viewer));
  const context = {
    timeZone: viewer.timeZone,
    refrigerants: await getDesignations(tx),
    today: todayIn(viewer.timeZone),
  };
  const read = readTexts(texts, context);
  if (!read.ok) throw badInput(read.errors);
  return read.row;
};

/**
 * Writes a new record and gives its id. The same idempotency key with the same fields gives the record that it wrote
 * before; with others it throws 409. Throws 400 for faults by field and 409 for a record ref that is taken.
 */
export const createRecovery = (
  viewer: Viewer,
  body: RecordBody,
  idempotencyKey: string | null,
): Promise<{ id: string; replayed: boolean }> =>
  withCompany(scopeOf(viewer), async (tx) => {
    const id = idFor(viewer, idempotencyKey);
    const row = await typedRecord(tx, viewer, body);
    const [before] = await tx.select({ id: recoveries.id }).from(recoveries).where(eq(recoveries.id, id));
    if (before) {
      await refuseOtherRecord(tx, id, row);
      return { id, replayed: true };
    }
    const ids = await resolveNames(tx, viewer.companyId, row, body.createNames ?? false);
    await keepCertification(tx, viewer.companyId, ids.technicianId, row.technicianCertification);
    const written = await refusingTakenRef(row.recordRef, () =>
      tx
        .insert(recoveries)
        .values({ companyId: viewer.companyId, id, ...recordColumns(row, ids) })
        .onConflictDoNothing({ target: [recoveries.companyId, recoveries.id] })
        .returning({ id: recoveries.id }),
    );
    // Another request with the same key was faster.
    if (written.length === 0) await refuseOtherRecord(tx, id, row);
    else await requestFlags(tx, viewer.companyId);
    return { id, replayed: written.length === 0 };
  });
