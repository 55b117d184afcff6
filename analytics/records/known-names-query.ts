import 'server-only';
import { and, asc, desc, eq } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { appliances, branches, cylinders, sites, technicians } from '@/db/schema/places';
import { refrigerants } from '@/db/schema/refrigerants';
import { nameKey } from '@/lib/recoveries/names';
import { kgToGram } from '@/lib/units';
import type { KnownNames } from './known-names-contract';

/** More than this no list of suggestions helps; a name beyond is typed out. */
const MOST_NAMES = 2000;

const namesOf = async (tx: Tx, table: typeof technicians | typeof branches | typeof sites | typeof cylinders) => {
  const rows = await tx.select({ name: table.name }).from(table).orderBy(desc(table.createdAt)).limit(MOST_NAMES);
  return rows.map(({ name }) => name).sort((one, other) => one.localeCompare(other, 'en', { numeric: true }));
};

const appliancesAt = async (tx: Tx, site: string): Promise<KnownNames['appliances']> => {
  const rows = await tx
    .select({
      name: appliances.name,
      refrigerant: appliances.refrigerant,
      category: appliances.category,
      nameplateChargeKg: appliances.nameplateChargeKg,
    })
    .from(appliances)
    .innerJoin(sites, and(eq(sites.companyId, appliances.companyId), eq(sites.id, appliances.siteId)))
    .where(eq(sites.nameKey, nameKey(site)))
    .orderBy(asc(appliances.name))
    .limit(MOST_NAMES);
  return rows.map(({ nameplateChargeKg, ...appliance }) => ({
    ...appliance,
    nameplateCharge: nameplateChargeKg === null ? null : kgToGram(Number(nameplateChargeKg)),
  }));
};

/** The names of a company that a new record can use; appliances only of the given site. */
export const getKnownNames = async (tx: Tx, site: string | undefined): Promise<KnownNames> => {
  const catalogue = await tx
    .select({ designation: refrigerants.designation })
    .from(refrigerants)
    .orderBy(asc(refrigerants.designation));
  return {
    technicians: await namesOf(tx, technicians),
    branches: await namesOf(tx, branches),
    sites: await namesOf(tx, sites),
    cylinders: await namesOf(tx, cylinders),
    refrigerants: catalogue.map(({ designation }) => designation),
    appliances: site ? await appliancesAt(tx, site) : [],
  };
};
