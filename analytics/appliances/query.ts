import 'server-only';
import { type SQL, type SQLWrapper, sql } from 'drizzle-orm';
import { toGram } from '@/analytics/fact-figures';
import { byName, countedInScope, countLow, groupFigures } from '@/analytics/grouped-figures/query';
import { readAppliances, readSuspectedAt, toldOfAppliance } from '@/analytics/leak-suspicion/kept';
import { type Scope, UNSTATED } from '@/analytics/scope';
import type { Tx } from '@/db/client';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import type { ApplianceRecoveries, ApplianceRow } from './contract';

/** What the last record of a group says. */
const last = <Value>(column: SQLWrapper): SQL<Value> =>
  sql<Value>`(array_agg(${column} order by ${f.recoveredOn} desc, ${f.recoveredAt} desc nulls last, ${f.id} desc))[1]`;

/** Each appliance with a record that counts in scope, by site and name. */
export const getApplianceRecoveries = async (tx: Tx, scope: Scope): Promise<ApplianceRecoveries> => {
  const appliances = await tx
    .select({
      appliance: f.appliance,
      applianceId: f.applianceId,
      site: f.site,
      siteId: f.siteId,
      refrigerant: last<string>(f.refrigerant),
      category: last<ApplianceRow['category']>(sql`coalesce(${f.category}, ${UNSTATED})`),
      unitCharge: toGram(last(f.fullChargeKg)),
      ...groupFigures,
    })
    .from(f)
    .where(countedInScope(scope))
    .groupBy(f.applianceId, f.appliance, f.siteId, f.site)
    .orderBy(byName(f.site), f.siteId, byName(f.appliance), f.applianceId);
  const low = await countLow(tx, scope, f.applianceId);
  const suspectedAt = await readSuspectedAt(tx);
  const suspicions = await readAppliances(tx);
  return {
    suspectedAt,
    items: appliances.map((one) => ({
      ...one,
      lowRecoveries: low.get(one.applianceId) ?? 0,
      ...toldOfAppliance(suspicions.get(one.applianceId), suspectedAt),
    })),
  };
};
