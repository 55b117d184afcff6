import { z } from 'zod';

const chance = z.number().min(0).max(1).nullable();

/** What lists tell of an appliance: from its visits of the last 36 months, whatever the scope. */
export const applianceSuspicion = {
  /** How often it came short of charge after it had once. */
  lowAgain: z.int().nonnegative(),
  /** Probability that it leaks; null where too few visits tell. */
  leakSuspicion: chance,
};

/** What lists tell of a site, from the same visits. */
export const siteSuspicion = {
  /** Appliances that came short of charge more than once. */
  lowAgain: z.int().nonnegative(),
  /** That of its most suspected appliance; null where nothing can be said of any. */
  leakSuspicion: chance,
  /** Appliances that are suspected to leak. */
  suspected: z.int().nonnegative(),
  /** More of them than at other sites, beyond what chance explains over all sites. */
  moreThanChance: z.boolean(),
};
