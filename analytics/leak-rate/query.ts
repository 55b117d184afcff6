import 'server-only';
import { and, asc, eq, inArray } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { chargeAdditions as a } from '@/db/schema/charge-additions';
import { appliances, sites } from '@/db/schema/places';
import { refrigerantComponents, refrigerants } from '@/db/schema/refrigerants';
import { applianceCharges as c } from '@/db/views/appliance-charges';
import { APPLIANCE_CATEGORIES } from '@/lib/vocabulary';
import type { ChargeAddition } from './addition-events';
import type { RuledRefrigerant } from './rules';
import { enteredUncertaintyKg, type LeakingUnit } from './shown';

/** An appliance as leak rates need it, with its name and place. */
export type LeakAppliance = LeakingUnit & {
  appliance: string;
  applianceId: string;
  site: string;
  siteId: string;
  designation: string | null;
};

const getRuled = async (tx: Tx, designations: readonly string[]): Promise<ReadonlyMap<string, RuledRefrigerant>> => {
  if (designations.length === 0) return new Map();
  const wanted = [...new Set(designations)];
  const known = await tx
    .select({ designation: refrigerants.designation, gwpAr4: refrigerants.gwpAr4 })
    .from(refrigerants)
    .where(inArray(refrigerants.designation, wanted));
  const parts = await tx
    .select({ designation: refrigerantComponents.designation, component: refrigerantComponents.component })
    .from(refrigerantComponents)
    .where(inArray(refrigerantComponents.designation, wanted));
  const componentsOf = (designation: string) =>
    parts.filter((part) => part.designation === designation).map(({ component }) => component);
  return new Map(
    known.map(({ designation, gwpAr4 }) => [designation, { gwpAr4, components: componentsOf(designation) }]),
  );
};

const getRecorded = async (tx: Tx, applianceIds: readonly string[]) => {
  if (applianceIds.length === 0) return new Map<string, never>();
  const rows = await tx
    .select()
    .from(c)
    .where(inArray(c.applianceId, [...applianceIds]));
  return new Map(rows.map((row) => [row.applianceId, row]));
};

/**
 * Appliances of the company with what most of their records say of them: all of a site, or one. What no record says is
 * taken from the appliance's own row.
 */
export const getLeakAppliances = async (
  tx: Tx,
  which: { siteId: string } | { applianceId: string },
): Promise<LeakAppliance[]> => {
  const rows = await tx
    .select({
      appliance: appliances.name,
      applianceId: appliances.id,
      site: sites.name,
      siteId: appliances.siteId,
      lightCommercial: appliances.lightCommercial,
      own: {
        nameplateChargeKg: appliances.nameplateChargeKg,
        refrigerant: appliances.refrigerant,
        category: appliances.category,
      },
    })
    .from(appliances)
    .innerJoin(sites, and(eq(sites.companyId, appliances.companyId), eq(sites.id, appliances.siteId)))
    .where('siteId' in which ? eq(appliances.siteId, which.siteId) : eq(appliances.id, which.applianceId));
  const recordedOf = await getRecorded(
    tx,
    rows.map(({ applianceId }) => applianceId),
  );
  const designationOf = ({ applianceId, own }: (typeof rows)[number]) =>
    recordedOf.get(applianceId)?.refrigerant ?? own.refrigerant;
  const ruled = await getRuled(
    tx,
    rows.flatMap((row) => designationOf(row) ?? []),
  );
  return rows.map((row) => {
    const { own, ...names } = row;
    const recorded = recordedOf.get(row.applianceId);
    const designation = designationOf(row);
    const category = recorded?.category ?? own.category;
    const plate = own.nameplateChargeKg === null ? null : Number(own.nameplateChargeKg);
    return {
      ...names,
      designation,
      fullChargeKg: recorded?.fullChargeKg ?? plate,
      category: APPLIANCE_CATEGORIES.find((known) => known === category) ?? null,
      refrigerant: designation === null ? null : (ruled.get(designation) ?? null),
    };
  });
};

/** The additions of appliances as the methods need them, by appliance. */
export const getChargeAdditions = async (
  tx: Tx,
  applianceIds: readonly string[],
): Promise<ReadonlyMap<string, ChargeAddition[]>> => {
  const byAppliance = new Map<string, ChargeAddition[]>(applianceIds.map((id) => [id, []]));
  if (applianceIds.length === 0) return byAppliance;
  const rows = await tx
    .select()
    .from(a)
    .where(inArray(a.applianceId, [...applianceIds]))
    .orderBy(asc(a.addedOn), asc(a.id));
  for (const { id, applianceId, addedOn, addedChargeKg, enteredMass, massUnit, reason, leaksVerifiedOn } of rows)
    byAppliance.get(applianceId)?.push({
      ...{ id, addedOn, reason, leaksVerifiedOn },
      addedChargeKg: Number(addedChargeKg),
      uncertaintyKg: enteredUncertaintyKg(enteredMass, massUnit),
    });
  return byAppliance;
};
