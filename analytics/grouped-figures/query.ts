import 'server-only';
import { and, eq, isNull, type SQL, type SQLWrapper, sql } from 'drizzle-orm';
import { factFigures, toGram } from '@/analytics/fact-figures';
import type { Scope } from '@/analytics/scope';
import { inScope } from '@/analytics/scope-query';
import type { Tx } from '@/db/client';
import type { recoveredBySite, recoveredByTechnician } from '@/db/views/recovered-by-group';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { lowRecoveries as low } from '@/db/views/yield-limits';

const { recoveries, recoveredMass, fullCharge, totalYield, medianYield } = factFigures;

/** Figures of a group that has at least one record that counts: its yields are never null. */
export const groupFigures = {
  recoveries,
  recoveredMass,
  fullCharge,
  totalYield: sql<number>`${totalYield}`.mapWith(Number),
  medianYield: sql<number>`${medianYield}`.mapWith(Number),
  firstRecoveredOn: sql<string>`min(${f.recoveredOn})`,
  lastRecoveredOn: sql<string>`max(${f.recoveredOn})`,
};

/** The same figures of a group over all of its records, out of what stands ready. */
export const readyFigures = (v: typeof recoveredByTechnician | typeof recoveredBySite) => ({
  recoveries: v.recoveries,
  recoveredMass: toGram(v.recoveredMassKg),
  fullCharge: toGram(v.fullChargeKg),
  totalYield: v.totalYield,
  medianYield: v.medianYield,
  firstRecoveredOn: v.firstRecoveredOn,
  lastRecoveredOn: v.lastRecoveredOn,
});

/** The records that groups are made of: those in scope that count. */
export const countedInScope = (scope: Scope): SQL | undefined => and(inScope(scope), isNull(f.exclusion));

/** Names in the order in which people read them. */
export const byName = (name: SQLWrapper): SQL => sql`${name} collate reading_order`;

/** How many recoveries of each group in scope lie far below like jobs, by the group's id; none of a group left out. */
export const countLow = async (
  tx: Tx,
  scope: Scope,
  groupId: typeof f.siteId | typeof f.applianceId,
): Promise<ReadonlyMap<string, number>> => {
  const rows = await tx
    .select({ id: groupId, low: sql<number>`count(*)`.mapWith(Number) })
    .from(low)
    .innerJoin(f, and(eq(f.companyId, low.companyId), eq(f.id, low.recoveryId)))
    .where(inScope(scope))
    .groupBy(groupId);
  return new Map(rows.map((row) => [row.id, row.low]));
};
