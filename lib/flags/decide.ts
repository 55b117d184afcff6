import 'server-only';
import { randomUUID } from 'node:crypto';
import { and, eq, inArray, sql } from 'drizzle-orm';
import { type Tx, withCompany } from '@/db/client';
import { flagDecisions, flags } from '@/db/schema/flags';
import { recoveries } from '@/db/schema/recoveries';
import { scopeOf, type Viewer } from '@/lib/auth/viewer';
import { conflict } from '@/lib/errors';
import type { FlagDecision } from '@/lib/vocabulary';
import type { DecisionBody } from './body';
import { type HeldFlag, holdFlags } from './hold';
import { judgeAgain } from './request';

/** Leaves a record out of every figure, or takes it in again. */
export const excludeRecord = async (tx: Tx, viewer: Viewer, id: string, isEntryError: boolean): Promise<void> => {
  await tx
    .update(recoveries)
    .set({ exclusion: isEntryError ? 'entry_error' : null })
    .where(and(eq(recoveries.companyId, viewer.companyId), eq(recoveries.id, id)));
};

const close = async (tx: Tx, viewer: Viewer, closed: HeldFlag[], decision: FlagDecision): Promise<void> => {
  await tx
    .update(flags)
    .set({ state: 'decided', decision, decidedAt: sql`now()` })
    .where(
      and(
        eq(flags.companyId, viewer.companyId),
        inArray(
          flags.id,
          closed.map(({ id }) => id),
        ),
      ),
    );
};

/**
 * Decides a flag, in one transaction with everything that follows from it: an entry error leaves the figures and closes
 * the record's other open flags with it, which any decision does for the whole record when asked to. Throws 404 when there
 * is no such flag, 409 when it is decided already.
 */
export const decideFlag = (viewer: Viewer, id: string, { decision, note, wholeRecord }: DecisionBody): Promise<void> =>
  withCompany(scopeOf(viewer, `flag decided: ${decision.replaceAll('_', ' ')}`), async (tx) => {
    const { companyId, actor } = viewer;
    const { flag, ofRecord } = await holdFlags(tx, viewer, id);
    if (flag.state === 'decided')
      throw conflict('This flag has been decided already. Reopen it first to decide otherwise.');
    const withIt = wholeRecord || decision === 'entry_error';
    const followers = ofRecord.filter((other) => withIt && other.id !== id && other.state === 'open');
    const leadId = randomUUID();
    const decided = { companyId, decision, decidedBy: actor };
    await tx
      .insert(flagDecisions)
      .values([
        { ...decided, id: leadId, flagId: id, note },
        ...followers.map((other) => ({ ...decided, flagId: other.id, note: null, followsId: leadId })),
      ]);
    await close(tx, viewer, [flag, ...followers], decision);
    if (decision === 'entry_error') await excludeRecord(tx, viewer, flag.recoveryId, true);
    await judgeAgain(tx, companyId, flag.recoveryId);
  });
