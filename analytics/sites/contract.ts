import { z } from 'zod';
import { groupFigures } from '@/analytics/grouped-figures/contract';
import { siteSuspicion, suspectedAt } from '@/analytics/leak-suspicion/contract';
import { scopeSchema } from '@/analytics/scope';
import { defineContract } from '@/lib/api/contract';

/** What was recovered at each site in scope, in the order of names. */
export const siteRecoveries = defineContract({
  path: '/api/sites',
  action: 'sites:read',
  query: scopeSchema,
  response: z.object({
    suspectedAt,
    items: z.array(
      z.object({
        site: z.string(),
        siteId: z.uuid(),
        /** Appliances with at least one recovery in scope. */
        appliances: z.int().positive(),
        /** Recoveries far below like jobs: a reason to look. */
        lowRecoveries: z.int().nonnegative(),
        ...siteSuspicion,
        ...groupFigures,
      }),
    ),
  }),
});

export type SiteRecoveries = z.output<typeof siteRecoveries.response>;
export type SiteRow = SiteRecoveries['items'][number];
