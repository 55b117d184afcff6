import { z } from 'zod';
import { scopeSchema } from '@/analytics/scope';
import { defineContract } from '@/lib/api/contract';

/**
 * What each technician's recoveries in scope add up to, in the order of names: no ranking and no judgement. Masses in kg
 * to the gram; total yield is the ratio of the sums, median yield the middle one of the records. Entry errors are left out.
 */
export const technicianRecoveries = defineContract({
  path: '/api/technicians',
  action: 'technicians:read',
  query: scopeSchema,
  response: z.object({
    items: z.array(
      z.object({
        technician: z.string(),
        technicianId: z.uuid(),
        recoveries: z.int().positive(),
        recoveredMass: z.number().nonnegative(),
        fullCharge: z.number().nonnegative(),
        totalYield: z.number().nonnegative(),
        medianYield: z.number().nonnegative(),
        firstRecoveredOn: z.iso.date(),
        lastRecoveredOn: z.iso.date(),
      }),
    ),
  }),
});

export type TechnicianRecoveries = z.output<typeof technicianRecoveries.response>;
export type TechnicianRow = TechnicianRecoveries['items'][number];
