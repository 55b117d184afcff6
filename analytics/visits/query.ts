import 'server-only';
import { and, desc, eq, isNotNull, isNull, type SQL, sql } from 'drizzle-orm';
import { toGram } from '@/analytics/fact-figures';
import { UNSTATED } from '@/analytics/scope';
import type { Tx } from '@/db/client';
import { appliances, sites } from '@/db/schema/places';
import { recoveries as r } from '@/db/schema/recoveries';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { lowRecoveries as low } from '@/db/views/yield-limits';
import type { ApplianceHistory, SiteHistory, Visit } from './contract';

/** Of a place with more visits than this the latest are told; its list of records has all. */
const MOST_VISITS = 500;

// Not a join: the records and their facts call their columns alike.
const nameplateChargeKg = sql`(select ${r.nameplateChargeKg} from ${r} where ${r.companyId} = ${f.companyId} and ${r.id} = ${f.id})`;

const getVisits = async (tx: Tx, of: SQL): Promise<Visit[]> => {
  const latest = await tx
    .select({
      recoveryId: f.id,
      recordRef: f.recordRef,
      recoveredOn: f.recoveredOn,
      technician: f.technician,
      appliance: f.appliance,
      refrigerant: f.refrigerant,
      jobType: sql<Visit['jobType']>`coalesce(${f.jobType}, ${UNSTATED})`,
      nameplateCharge: toGram(nameplateChargeKg),
      fullCharge: toGram(f.fullChargeKg),
      recoveredMass: toGram(f.recoveredMassKg),
      yield: sql<number>`${f.recoveryYield}`.mapWith(Number),
      low: sql<boolean>`${isNotNull(low.recoveryId)}`,
      counts: sql<boolean>`${isNull(f.exclusion)}`,
    })
    .from(f)
    .leftJoin(low, and(eq(low.companyId, f.companyId), eq(low.recoveryId, f.id)))
    .where(of)
    .orderBy(desc(f.recoveredOn), sql`${f.recoveredAt} desc nulls last`, desc(f.id))
    .limit(MOST_VISITS);
  return latest.reverse();
};

/** A unit with its recoveries of all time; null when there is none that this transaction may see. */
export const getApplianceHistory = async (tx: Tx, applianceId: string): Promise<ApplianceHistory | null> => {
  const [unit] = await tx
    .select({
      applianceId: appliances.id,
      appliance: appliances.name,
      siteId: sites.id,
      site: sites.name,
      category: sql<ApplianceHistory['category']>`coalesce(${appliances.category}, ${UNSTATED})`,
      manufacturedOn: appliances.manufacturedOn,
    })
    .from(appliances)
    .innerJoin(sites, and(eq(sites.companyId, appliances.companyId), eq(sites.id, appliances.siteId)))
    .where(eq(appliances.id, applianceId));
  return unit ? { ...unit, visits: await getVisits(tx, eq(f.applianceId, applianceId)) } : null;
};

/** A site with its recoveries of all time; null when there is none that this transaction may see. */
export const getSiteHistory = async (tx: Tx, siteId: string): Promise<SiteHistory | null> => {
  const [site] = await tx
    .select({ siteId: sites.id, site: sites.name, address: sites.address })
    .from(sites)
    .where(eq(sites.id, siteId));
  return site ? { ...site, visits: await getVisits(tx, eq(f.siteId, siteId)) } : null;
};
