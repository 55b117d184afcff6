import 'server-only';
import { sql } from 'drizzle-orm';
import { byName, countedInScope, countLow, groupFigures } from '@/analytics/grouped-figures/query';
import type { Scope } from '@/analytics/scope';
import type { Tx } from '@/db/client';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import type { SiteRecoveries } from './contract';

/** Each site with a record that counts in scope, by name. */
export const getSiteRecoveries = async (tx: Tx, scope: Scope): Promise<SiteRecoveries> => {
  const sites = await tx
    .select({
      site: f.site,
      siteId: f.siteId,
      appliances: sql<number>`count(distinct ${f.applianceId})`.mapWith(Number),
      ...groupFigures,
    })
    .from(f)
    .where(countedInScope(scope))
    .groupBy(f.siteId, f.site)
    .orderBy(byName(f.site), f.siteId);
  const low = await countLow(tx, scope, f.siteId);
  return { items: sites.map((site) => ({ ...site, lowRecoveries: low.get(site.siteId) ?? 0 })) };
};
