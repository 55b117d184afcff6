import { z } from 'zod';
import { scopeSchema } from '@/analytics/scope';
import { defineContract } from '@/lib/api/contract';

/**
 * What was recovered at each site in scope, in the order of names. Masses in kg to the gram; total yield is the ratio of
 * the sums, median yield the middle one of the records. Entry errors are left out.
 */
export const siteRecoveries = defineContract({
  path: '/api/sites',
  action: 'sites:read',
  query: scopeSchema,
  response: z.object({
    items: z.array(
      z.object({
        site: z.string(),
        siteId: z.uuid(),
        recoveries: z.int().positive(),
        /** Appliances with at least one recovery in scope. */
        appliances: z.int().positive(),
        recoveredMass: z.number().nonnegative(),
        fullCharge: z.number().nonnegative(),
        totalYield: z.number().nonnegative(),
        medianYield: z.number().nonnegative(),
        lastRecoveredOn: z.iso.date(),
      }),
    ),
  }),
});

export type SiteRecoveries = z.output<typeof siteRecoveries.response>;
export type SiteRow = SiteRecoveries['items'][number];
