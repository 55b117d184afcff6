import { z } from 'zod';
import { groupFigures } from '@/analytics/grouped-figures/contract';
import { applianceSuspicion, suspectedAt } from '@/analytics/leak-suspicion/contract';
import { scopeSchema, UNSTATED } from '@/analytics/scope';
import { defineContract } from '@/lib/api/contract';
import { APPLIANCE_CATEGORIES } from '@/lib/vocabulary';

/**
 * What was recovered from each appliance in scope, in the order of sites and of names. What an appliance is, its last
 * recovery in scope says: units are converted, and their nameplates read anew.
 */
export const applianceRecoveries = defineContract({
  path: '/api/appliances',
  action: 'appliances:read',
  query: scopeSchema,
  response: z.object({
    suspectedAt,
    items: z.array(
      z.object({
        appliance: z.string(),
        applianceId: z.uuid(),
        site: z.string(),
        siteId: z.uuid(),
        refrigerant: z.string(),
        category: z.enum([...APPLIANCE_CATEGORIES, UNSTATED]),
        /** The unit's own full charge, kg; `fullCharge` adds up that of all its recoveries. */
        unitCharge: z.number().nonnegative(),
        /** Recoveries far below like jobs; more than one is a unit that came back low again. */
        lowRecoveries: z.int().nonnegative(),
        ...applianceSuspicion,
        ...groupFigures,
      }),
    ),
  }),
});

export type ApplianceRecoveries = z.output<typeof applianceRecoveries.response>;
export type ApplianceRow = ApplianceRecoveries['items'][number];
