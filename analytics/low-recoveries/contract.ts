import { z } from 'zod';
import { scopeSchema, UNSTATED } from '@/analytics/scope';
import { defineContract } from '@/lib/api/contract';
import { APPLIANCE_CATEGORIES } from '@/lib/vocabulary';
import { LOW_ORDERS } from './orders';

const share = z.number().nonnegative();
const count = z.int().nonnegative();

/**
 * Recoveries far below like jobs (same refrigerant and appliance category, the company's whole record): yield under
 * Q1 - 1.5 (Q3 - Q1), J. W. Tukey, Exploratory Data Analysis, 1977, ch. 2. A reason to look, not a finding.
 * `order=extreme` puts the longest way below the fence first, measured in quartile ranges; `order=newest` the last day.
 */
export const lowRecoveriesList = defineContract({
  path: '/api/low-recoveries',
  action: 'flags:read',
  query: scopeSchema.safeExtend({
    order: z.enum(LOW_ORDERS).default('extreme'),
    limit: z.coerce.number().int().min(1).max(500).default(50),
    cursor: z.string().max(400).optional(),
  }),
  response: z.object({
    items: z.array(
      z.object({
        recordRef: z.string(),
        recoveryId: z.uuid(),
        recoveredOn: z.iso.date(),
        technician: z.string(),
        site: z.string(),
        appliance: z.string(),
        refrigerant: z.string(),
        category: z.enum([...APPLIANCE_CATEGORIES, UNSTATED]),
        /** kg, to the gram. */
        recoveredMass: z.number().nonnegative(),
        fullCharge: z.number().nonnegative(),
        yield: share,
        medianYield: share,
        lowerQuartile: share,
        upperQuartile: share,
        /** May lie below zero only for groups in which nothing can be low. */
        lowerFence: z.number(),
        likeJobs: count,
      }),
    ),
    nextCursor: z.string().nullable(),
    judged: z.object({
      /** Records in scope with enough like jobs to be judged, and in how many groups of like jobs. */
      records: count,
      groups: count,
      /** Records in scope about which nothing is said: fewer than 20 like jobs. */
      tooFewLikeJobs: count,
      /** Judged records in scope that lie below their fence. */
      low: count,
    }),
  }),
});

export type LowRecoveriesQuery = z.output<typeof lowRecoveriesList.query>;
export type LowRecoveries = z.output<typeof lowRecoveriesList.response>;
export type LowRecovery = LowRecoveries['items'][number];
