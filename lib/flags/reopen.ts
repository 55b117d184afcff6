import 'server-only';
import { and, eq, inArray } from 'drizzle-orm';
import { withCompany } from '@/db/client';
import { flagDecisions, flags } from '@/db/schema/flags';
import { scopeOf, type Viewer } from '@/lib/auth/viewer';
import { conflict } from '@/lib/errors';
import { excludeRecord } from './decide';
import { holdFlags, lastDecisions } from './hold';
import { judgeAgain } from './request';

/**
 * Takes a decision back with everything that followed from it: flags that it closed open again, and a record that it left
 * out counts again. Throws 404 when there is no such flag, 409 when it is open.
 */
export const reopenFlag = (viewer: Viewer, id: string): Promise<void> =>
  withCompany(scopeOf(viewer, 'flag reopened'), async (tx) => {
    const { companyId, actor } = viewer;
    const { flag, ofRecord } = await holdFlags(tx, viewer, id);
    if (flag.state === 'open') throw conflict('This flag is open already.');
    const decided = ofRecord.filter(({ state }) => state === 'decided');
    const last = await lastDecisions(
      tx,
      viewer,
      decided.map((one) => one.id),
    );
    const lead = last.get(id)?.followsId ?? last.get(id)?.id;
    const together = decided.filter((one) => {
      const its = last.get(one.id);
      return one.id === id || (its !== undefined && (its.id === lead || its.followsId === lead));
    });
    const ids = together.map((one) => one.id);
    await tx
      .insert(flagDecisions)
      .values(ids.map((flagId) => ({ companyId, flagId, decision: null, decidedBy: actor })));
    await tx
      .update(flags)
      .set({ state: 'open', decision: null, decidedAt: null })
      .where(and(eq(flags.companyId, companyId), inArray(flags.id, ids)));
    const isError = (flagId: string) => last.get(flagId)?.decision === 'entry_error';
    const stillError = decided.some((one) => !ids.includes(one.id) && isError(one.id));
    if (ids.some(isError) && !stillError) await excludeRecord(tx, viewer, flag.recoveryId, false);
    await judgeAgain(tx, companyId, flag.recoveryId);
  });
