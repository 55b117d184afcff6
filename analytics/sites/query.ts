import 'server-only';
import { sql } from 'drizzle-orm';
import { byName, countedInScope, countLow, groupFigures, readyFigures } from '@/analytics/grouped-figures/query';
import { readSites, readSuspectedAt, toldOfSite } from '@/analytics/leak-suspicion/kept';
import { isWhole, type Scope } from '@/analytics/scope';
import type { Tx } from '@/db/client';
import { recoveredBySite as ready } from '@/db/views/recovered-by-group';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import type { SiteRecoveries } from './contract';

const ofEveryRecord = (tx: Tx) =>
  tx
    .select({ site: ready.name, siteId: ready.groupId, appliances: ready.appliances, ...readyFigures(ready) })
    .from(ready)
    .orderBy(byName(ready.name), ready.groupId);

const inScope = (tx: Tx, scope: Scope) =>
  tx
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

/** Each site with a record that counts in scope, by name. */
export const getSiteRecoveries = async (tx: Tx, scope: Scope): Promise<SiteRecoveries> => {
  const sites = await (isWhole(scope) ? ofEveryRecord(tx) : inScope(tx, scope));
  const low = await countLow(tx, scope, f.siteId);
  const suspectedAt = await readSuspectedAt(tx);
  const suspicions = await readSites(tx);
  return {
    suspectedAt,
    items: sites.map((site) => ({
      ...site,
      lowRecoveries: low.get(site.siteId) ?? 0,
      ...toldOfSite(suspicions.get(site.siteId), suspectedAt),
    })),
  };
};
