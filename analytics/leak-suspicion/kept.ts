import 'server-only';
import { inArray } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { applianceSuspicions as a, recordDigests, siteSuspicions as s } from '@/db/schema/record-digests';
import { lowAgainOf } from './company';

/** What is suspected of an appliance, as the last digest of the company's records left it. */
export type KeptAppliance = Omit<typeof a.$inferSelect, 'companyId'>;
/** What is suspected at a site, likewise. */
export type KeptSite = Omit<typeof s.$inferSelect, 'companyId'>;

/** When the suspicion was worked out; null before it was for the first time: then nothing is known of any appliance. */
export const readSuspectedAt = async (tx: Tx): Promise<string | null> => {
  const [digest] = await tx.select({ madeAt: recordDigests.madeAt }).from(recordDigests);
  return digest ? new Date(digest.madeAt).toISOString() : null;
};

/** What is suspected of each appliance of the company, its visits left out. */
export const readAppliances = async (tx: Tx) => {
  const rows = await tx.select({ applianceId: a.applianceId, shortVisits: a.shortVisits, chance: a.chance }).from(a);
  return new Map(rows.map((row) => [row.applianceId, row]));
};

/** What is suspected of some appliances, with their visits. */
export const readVisitedAppliances = async (
  tx: Tx,
  ids: readonly string[],
): Promise<ReadonlyMap<string, KeptAppliance>> => {
  const rows = ids.length
    ? await tx
        .select()
        .from(a)
        .where(inArray(a.applianceId, [...ids]))
    : [];
  return new Map(rows.map((row) => [row.applianceId, row]));
};

/** What is suspected at each site of the company. */
export const readSites = async (tx: Tx): Promise<ReadonlyMap<string, KeptSite>> =>
  new Map((await tx.select().from(s)).map((row) => [row.siteId, row]));

/** Probabilities are told to a tenth of a per cent: what they rest on is not finer. */
const told = (chance: number | null | undefined): number | null => (chance == null ? null : Number(chance.toFixed(3)));

/** What a list tells of an appliance; nothing while nothing has been worked out. */
export const toldOfAppliance = (
  own: Pick<KeptAppliance, 'shortVisits' | 'chance'> | undefined,
  suspectedAt: string | null,
) =>
  suspectedAt === null
    ? { lowAgain: null, leakSuspicion: null }
    : { lowAgain: own ? lowAgainOf(own) : 0, leakSuspicion: told(own?.chance) };

/** What a list tells of a site; nothing while nothing has been worked out. */
export const toldOfSite = (own: KeptSite | undefined, suspectedAt: string | null) =>
  suspectedAt === null
    ? { lowAgain: null, leakSuspicion: null, suspected: null, moreThanChance: false }
    : {
        lowAgain: own?.lowAgain ?? 0,
        leakSuspicion: told(own?.chance),
        suspected: own?.suspected ?? 0,
        moreThanChance: own?.look ?? false,
      };
