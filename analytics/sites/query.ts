import 'server-only';
import { and, isNull, sql } from 'drizzle-orm';
import { factFigures } from '@/analytics/fact-figures';
import type { Scope } from '@/analytics/scope';
import { inScope } from '@/analytics/scope-query';
import type { Tx } from '@/db/client';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import type { SiteRecoveries } from './contract';

/** Each site with a record that counts in scope, by name. */
export const getSiteRecoveries = async (tx: Tx, scope: Scope): Promise<SiteRecoveries> => {
  const { recoveries, recoveredMass, fullCharge } = factFigures;
  const items = await tx
    .select({
      site: f.site,
      siteId: f.siteId,
      recoveries,
      appliances: sql<number>`count(distinct ${f.applianceId})`.mapWith(Number),
      recoveredMass,
      fullCharge,
      totalYield: sql<number>`${factFigures.totalYield}`.mapWith(Number),
      medianYield: sql<number>`${factFigures.medianYield}`.mapWith(Number),
      lastRecoveredOn: sql<string>`max(${f.recoveredOn})`,
    })
    .from(f)
    .where(and(inScope(scope), isNull(f.exclusion)))
    .groupBy(f.siteId, f.site)
    .orderBy(sql`${f.site} collate reading_order`, f.siteId);
  return { items };
};
