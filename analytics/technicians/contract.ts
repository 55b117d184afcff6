import { z } from 'zod';
import { groupFigures } from '@/analytics/grouped-figures/contract';
import { scopeSchema } from '@/analytics/scope';
import { defineContract } from '@/lib/api/contract';

/** What each technician's recoveries in scope add up to, in the order of names: no ranking and no judgement. */
export const technicianRecoveries = defineContract({
  path: '/api/technicians',
  action: 'technicians:read',
  query: scopeSchema,
  response: z.object({
    items: z.array(z.object({ technician: z.string(), technicianId: z.uuid(), ...groupFigures })),
  }),
});

export type TechnicianRecoveries = z.output<typeof technicianRecoveries.response>;
export type TechnicianRow = TechnicianRecoveries['items'][number];
