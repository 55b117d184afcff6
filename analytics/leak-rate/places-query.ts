import 'server-only';
import { eq } from 'drizzle-orm';
import { getAdditions } from '@/analytics/charge-additions/query';
import { type KeptAppliance, readSites, readVisitedAppliances } from '@/analytics/leak-suspicion/kept';
import type { Tx } from '@/db/client';
import { sites } from '@/db/schema/places';
import { notFound } from '@/lib/errors';
import { kgToGram } from '@/lib/units';
import type { LeakRateMethod } from '@/lib/vocabulary';
import type { ChargeAddition } from './addition-events';
import type { ApplianceLeaks, SiteAppliance, SiteLeaks } from './contract';
import { getSiteMethod } from './method-query';
import { getChargeAdditions, getLeakAppliances, type LeakAppliance } from './query';
import { shownLeaks, USUAL_METHOD } from './shown';

/** As many additions of one appliance as a page can bear. */
const MOST_ADDITIONS = 500;

const share = (value: number): number => Number(value.toFixed(4));

const suspicionOf = (own: KeptAppliance | undefined) => ({
  visits: own?.visits ?? 0,
  shortVisits: own?.shortVisits ?? 0,
  expectedShort: Number((own?.expectedShort ?? 0).toFixed(2)),
  leakSuspicion: own?.chance == null ? null : share(own.chance),
});

const visitsOf = (own: KeptAppliance | undefined) =>
  (own?.visitedOn ?? []).map((visitedOn, at) => ({
    visitedOn,
    recoveryYield: share(own?.yields[at] ?? 0),
    short: share(own?.shortChances[at] ?? 0),
  }));

const massOrNull = (kg: number | null) => (kg === null ? null : kgToGram(kg));

/** What one appliance took in, lost and is suspected of. Throws 404 when the company has none with this id. */
export const getApplianceLeaks = async (tx: Tx, applianceId: string): Promise<ApplianceLeaks> => {
  const [unit] = await getLeakAppliances(tx, { applianceId });
  if (!unit) throw notFound('This appliance');
  const { appliance, site, siteId, category, lightCommercial, designation, fullChargeKg } = unit;
  const method = await getSiteMethod(tx, siteId);
  const methodUsed = method.method ?? USUAL_METHOD;
  const additions = (await getChargeAdditions(tx, [applianceId])).get(applianceId) ?? [];
  const suspicion = (await readVisitedAppliances(tx, [applianceId])).get(applianceId);
  const { items } = await getAdditions(tx, { appliance: applianceId, limit: MOST_ADDITIONS });
  return {
    ...{ appliance, applianceId, site, siteId, category, lightCommercial, method, methodUsed },
    refrigerant: designation,
    fullCharge: massOrNull(fullChargeKg),
    ...shownLeaks(unit, additions, methodUsed),
    additions: items,
    suspicion: { ...suspicionOf(suspicion), history: visitsOf(suspicion) },
  };
};

const siteAppliance = (
  unit: LeakAppliance,
  additions: readonly ChargeAddition[],
  method: LeakRateMethod,
  suspicion: KeptAppliance | undefined,
): SiteAppliance => {
  const { appliance, applianceId, category, designation, fullChargeKg } = unit;
  const { events } = shownLeaks(unit, additions, method);
  const last = events.findLast(({ rate }) => rate !== null);
  return {
    ...{ appliance, applianceId, category },
    refrigerant: designation,
    fullCharge: massOrNull(fullChargeKg),
    additions: additions.length,
    lastRate: last?.rate ? { ...last.rate, addedOn: last.addedOn } : null,
    ...suspicionOf(suspicion),
  };
};

const mostSuspectedFirst = (a: SiteAppliance, b: SiteAppliance): number =>
  (b.leakSuspicion ?? -1) - (a.leakSuspicion ?? -1) ||
  (b.lastRate?.percent ?? -1) - (a.lastRate?.percent ?? -1) ||
  a.appliance.localeCompare(b.appliance, 'en', { numeric: true });

/** The method of a site and what is known of each of its appliances. Throws 404 when the company has none with this id. */
export const getSiteLeaks = async (tx: Tx, siteId: string): Promise<SiteLeaks> => {
  const [site] = await tx.select({ name: sites.name }).from(sites).where(eq(sites.id, siteId));
  if (!site) throw notFound('This site');
  const method = await getSiteMethod(tx, siteId);
  const methodUsed = method.method ?? USUAL_METHOD;
  const units = await getLeakAppliances(tx, { siteId });
  const ids = units.map(({ applianceId }) => applianceId);
  const additions = await getChargeAdditions(tx, ids);
  const suspicions = await readVisitedAppliances(tx, ids);
  const suspicion = (await readSites(tx)).get(siteId);
  return {
    site: site.name,
    siteId,
    method,
    methodUsed,
    appliances: units
      .map((unit) =>
        siteAppliance(unit, additions.get(unit.applianceId) ?? [], methodUsed, suspicions.get(unit.applianceId)),
      )
      .sort(mostSuspectedFirst),
    excess: suspicion?.judged
      ? {
          judged: suspicion.judged,
          suspected: suspicion.suspected,
          expected: Number(suspicion.expected.toFixed(2)),
          adjustedP: share(suspicion.adjustedP),
          look: suspicion.look,
        }
      : null,
  };
};
