import { groupBy } from '@/analytics/statistics/group-by';
import type { LeakModel } from './leaking-appliances';
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
  /** What was fitted to the company's visits; null where too few appliances tell. */
  model: LeakModel | null;
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
  const { appliances, model } = leakSuspicion(records);
  const siteOf = new Map(records.map(({ applianceId, siteId }) => [applianceId, siteId]));
  const bySite = groupBy([...appliances.values()], ({ applianceId }) => siteOf.get(applianceId) ?? '');
  const sites = [...bySite].map(([siteId, units]) => ofSite(siteId, units));
  const excess = siteExcess(sites);
  const none: SiteExcess = { expected: 0, adjustedP: 1, look: false };
  return {
    appliances,
    sites: new Map(sites.map((site, index) => [site.siteId, { ...site, excess: excess[index] ?? none }])),
    model,
  };
};
