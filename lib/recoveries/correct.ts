import 'server-only';
import { and, eq } from 'drizzle-orm';
import { type Tx, withCompany } from '@/db/client';
import { recoveries } from '@/db/schema/recoveries';
import { scopeOf, type Viewer } from '@/lib/auth/viewer';
import { badInput, conflict, notFound } from '@/lib/errors';
import { requestFlags } from '@/lib/flags/request';
import { type CorrectionBody, correctedTexts } from './body';
import { keepCertification } from './certification';
import { recordColumns } from './columns';
import { lastChange } from './last-change';
import { todayIn } from './local-time';
import { resolveNames } from './names';
import { ownTechnician, withOwnTechnician } from './own-records';
import { readTexts } from './read-texts';
import { refusingTakenRef } from './record-ref';
import { getDesignations } from './refrigerants';
import { getStored } from './stored';
import { storedTexts } from './stored-texts';

/** What decides whether the weights and the recovered mass agree. */
const WEIGHED = ['startWeight', 'endWeight', 'recoveredMass', 'massUnit'] as const;

const refuseOlder = async (tx: Tx, viewer: Viewer, id: string, seen: number, now: number): Promise<void> => {
  if (seen === now) return;
  const change = await lastChange(tx, id, viewer.timeZone);
  throw conflict(
    `${change} since you opened it: it is now version ${now}, you corrected version ${seen}. Look at the newer version, then save again.`,
  );
};

/**
 * Corrects a record by hand and keeps the reason in its history. Only the fields of `changes` change; the whole record
 * must be sound afterwards. Throws 404 when there is none, 409 when somebody changed it since `version`, 400 for faults
 * by field. The fingerprint of an imported row stays: the same file again does not undo the correction.
 */
export const correctRecovery = (viewer: Viewer, id: string, body: CorrectionBody): Promise<void> =>
  withCompany(scopeOf(viewer, body.reason), async (tx) => {
    await tx.select({ id: recoveries.id }).from(recoveries).where(eq(recoveries.id, id)).for('update');
    const stored = await getStored(tx, id, viewer.timeZone);
    if (!stored) throw notFound('This record');
    await refuseOlder(tx, viewer, id, body.version, stored.version);
    const corrected = correctedTexts(storedTexts(stored.record), body.changes);
    const texts = withOwnTechnician(corrected, await ownTechnician(tx, viewer));
    const today = todayIn(viewer.timeZone);
    const context = {
      timeZone: viewer.timeZone,
      refrigerants: await getDesignations(tx),
      // A doubtful day that an import brought does not stand in the way of correcting something else.
      today: body.changes.recoveredAt === undefined && stored.recoveredOn > today ? stored.recoveredOn : today,
    };
    const read = readTexts(texts, context, {
      weightsKept: !WEIGHED.some((field) => body.changes[field] !== undefined),
    });
    if (!read.ok) throw badInput(read.errors);
    const ids = await resolveNames(tx, viewer.companyId, read.row, body.createNames ?? false);
    await keepCertification(tx, viewer.companyId, ids.technicianId, read.row.technicianCertification);
    await refusingTakenRef(read.row.recordRef, () =>
      tx
        .update(recoveries)
        .set(recordColumns(read.row, ids))
        .where(and(eq(recoveries.companyId, viewer.companyId), eq(recoveries.id, id))),
    );
    await requestFlags(tx, viewer.companyId);
  });
