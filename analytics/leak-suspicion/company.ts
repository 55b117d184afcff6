import { groupBy } from '@/analytics/statistics/group-by';
import type { PulledAtSite } from './query';
import { type SiteExcess, siteExcess } from './site-excess';
import { type ApplianceSuspicion, isSuspected, leakSuspicion } from './suspicion';

/** What is suspected at one site. */
export type SiteSuspicion = {
  siteId: string;
  /** Appliances of which something can be said. */
  judged: number;
  suspected: number;
  /** Appliances that came short more than once. */
  lowAgain: number;
  /** The probability of the surest of its appliances; null where nothing can be said of any. */
  chance: number | null;
  excess: SiteExcess;
};

export type CompanySuspicion = {
  appliances: ReadonlyMap<string, ApplianceSuspicion>;
  sites: ReadonlyMap<string, SiteSuspicion>;
};

/** How often an appliance came short after it had once. */
export const lowAgainOf = ({ shortVisits }: Pick<ApplianceSuspicion, 'shortVisits'>): number =>
  Math.max(0, shortVisits - 1);

/** The probability that an appliance leaks, or null where nothing is said. */
export const chanceOf = (suspicion: ApplianceSuspicion | undefined): number | null =>
  suspicion?.chance.enough ? suspicion.chance.value : null;

const ofSite = (siteId: string, appliances: readonly ApplianceSuspicion[]): Omit<SiteSuspicion, 'excess'> => {
  const chances = appliances.flatMap((one) => chanceOf(one) ?? []);
  return {
    siteId,
    judged: chances.length,
    suspected: appliances.filter(isSuspected).length,
    lowAgain: appliances.filter((one) => lowAgainOf(one) > 0).length,
    chance: chances.length ? Math.max(...chances) : null,
  };
};

/** The suspicion for every appliance and site of a company, from its recoveries. */
export const companySuspicion = (records: readonly PulledAtSite[]): CompanySuspicion => {
  const { appliances } = leakSuspicion(records);
  const siteOf = new Map(records.map(({ applianceId, siteId }) => [applianceId, siteId]));
  const bySite = groupBy([...appliances.values()], ({ applianceId }) => siteOf.get(applianceId) ?? '');
  const sites = [...bySite].map(([siteId, units]) => ofSite(siteId, units));
  const excess = siteExcess(sites);
  const none: SiteExcess = { expected: 0, adjustedP: 1, look: false };
  return {
    appliances,
    sites: new Map(sites.map((site, index) => [site.siteId, { ...site, excess: excess[index] ?? none }])),
  };
};

/** Probabilities are told to a tenth of a per cent: what they rest on is not finer. */
const told = (chance: number | null): number | null => (chance === null ? null : Number(chance.toFixed(3)));

/** What a list tells of one appliance. */
export const toldOfAppliance = ({ appliances }: CompanySuspicion, applianceId: string) => {
  const suspicion = appliances.get(applianceId);
  return { lowAgain: suspicion ? lowAgainOf(suspicion) : 0, leakSuspicion: told(chanceOf(suspicion)) };
};

/** What a list tells of one site. */
export const toldOfSite = ({ sites }: CompanySuspicion, siteId: string) => {
  const site = sites.get(siteId);
  return {
    lowAgain: site?.lowAgain ?? 0,
    leakSuspicion: told(site?.chance ?? null),
    suspected: site?.suspected ?? 0,
    moreThanChance: site?.excess.look ?? false,
  };
};
