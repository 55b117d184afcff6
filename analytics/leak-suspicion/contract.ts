import { z } from 'zod';

const chance = z.number().min(0).max(1).nullable();
const count = z.int().nonnegative().nullable();

/** When it was worked out, in the background after the records changed. Null before the first time: all of it is null. */
export const suspectedAt = z.iso.datetime().nullable();

/** What lists tell of an appliance: from its visits of the last 36 months, whatever the scope. */
export const applianceSuspicion = {
  /** How often it came short of charge after it had once. */
  lowAgain: count,
  /** Probability that it leaks; null where too few visits tell. */
  leakSuspicion: chance,
};

/** What lists tell of a site, from the same visits. */
export const siteSuspicion = {
  /** Appliances that came short of charge more than once. */
  lowAgain: count,
  /** That of its most suspected appliance; null where nothing can be said of any. */
  leakSuspicion: chance,
  /** Appliances that are suspected to leak. */
  suspected: count,
  /** More of them than at other sites, beyond what chance explains over all sites. */
  moreThanChance: z.boolean(),
};
