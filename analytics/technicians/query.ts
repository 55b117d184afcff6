import 'server-only';
import { and, isNull, sql } from 'drizzle-orm';
import { factFigures } from '@/analytics/fact-figures';
import type { Scope } from '@/analytics/scope';
import { inScope } from '@/analytics/scope-query';
import type { Tx } from '@/db/client';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import type { TechnicianRecoveries } from './contract';

/** Each technician with a record that counts in scope, by name. */
export const getTechnicianRecoveries = async (tx: Tx, scope: Scope): Promise<TechnicianRecoveries> => {
  const { recoveries, recoveredMass, fullCharge } = factFigures;
  const items = await tx
    .select({
      technician: f.technician,
      technicianId: f.technicianId,
      recoveries,
      recoveredMass,
      fullCharge,
      totalYield: sql<number>`${factFigures.totalYield}`.mapWith(Number),
      medianYield: sql<number>`${factFigures.medianYield}`.mapWith(Number),
      firstRecoveredOn: sql<string>`min(${f.recoveredOn})`,
      lastRecoveredOn: sql<string>`max(${f.recoveredOn})`,
    })
    .from(f)
    .where(and(inScope(scope), isNull(f.exclusion)))
    .groupBy(f.technicianId, f.technician)
    .orderBy(sql`${f.technician} collate reading_order`, f.technicianId);
  return { items };
};
