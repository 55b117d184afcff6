import 'server-only';
import { and, asc, desc, eq, inArray } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { flagDecisions, flags } from '@/db/schema/flags';
import type { Viewer } from '@/lib/auth/viewer';
import { notFound } from '@/lib/errors';

const columns = { id: flags.id, recoveryId: flags.recoveryId, rule: flags.rule, state: flags.state };
export type HeldFlag = { id: string; recoveryId: string; rule: string; state: 'open' | 'decided' };

/** A flag and all flags of its record, held until the transaction ends; throws 404 when there is none. */
export const holdFlags = async (
  tx: Tx,
  viewer: Viewer,
  id: string,
): Promise<{ flag: HeldFlag; ofRecord: HeldFlag[] }> => {
  const own = eq(flags.companyId, viewer.companyId);
  const [found] = await tx
    .select(columns)
    .from(flags)
    .where(and(own, eq(flags.id, id)));
  if (!found) throw notFound('This flag');
  const ofRecord = await tx
    .select(columns)
    .from(flags)
    .where(and(own, eq(flags.recoveryId, found.recoveryId)))
    .orderBy(asc(flags.id))
    .for('update');
  const flag = ofRecord.find((one) => one.id === id);
  // A renewal was faster and took it away.
  if (!flag) throw notFound('This flag');
  return { flag, ofRecord };
};

/** The last decision of each of some flags; a reopening counts as one without decision. */
export const lastDecisions = async (tx: Tx, viewer: Viewer, ids: readonly string[]) => {
  const rows = await tx
    .selectDistinctOn([flagDecisions.flagId], {
      id: flagDecisions.id,
      flagId: flagDecisions.flagId,
      decision: flagDecisions.decision,
      followsId: flagDecisions.followsId,
    })
    .from(flagDecisions)
    .where(and(eq(flagDecisions.companyId, viewer.companyId), inArray(flagDecisions.flagId, [...ids])))
    .orderBy(flagDecisions.flagId, desc(flagDecisions.decidedAt), desc(flagDecisions.id));
  return new Map(rows.map((row) => [row.flagId, row]));
};
