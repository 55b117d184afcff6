import { z } from 'zod';
import { groupFigures } from '@/analytics/grouped-figures/contract';
import { scopeSchema } from '@/analytics/scope';
import { defineContract } from '@/lib/api/contract';
import { judgementShape } from './judgement-contract';

/**
 * What each technician's recoveries in scope add up to, in the order of names, and how they compare with what the same
 * jobs would have given his colleagues. The comparison is made on the scope that is asked for, with all technicians in
 * it: naming some of them only chooses who is shown.
 */
export const technicianRecoveries = defineContract({
  path: '/api/technicians',
  action: 'technicians:read',
  query: scopeSchema,
  response: z.object({
    items: z.array(z.object({ technician: z.string(), technicianId: z.uuid(), ...groupFigures, ...judgementShape })),
    /** What the comparison stands on. */
    judgedOn: z.object({
      recoveries: z.int().nonnegative(),
      technicians: z.int().nonnegative(),
      /** Whether enough of them are judged to know how sound people differ; if not, nobody is below or above. */
      spreadKnown: z.boolean(),
      /** Effect of the one in the middle, and how much sound technicians differ beyond luck (a standard deviation): points. */
      centre: z.number().nullable(),
      normalSpread: z.number().nonnegative(),
      /** Where the company's history ended in the records it stands on, and when it was made. */
      revision: z.int().nonnegative(),
      madeAt: z.iso.datetime(),
      /** False while a record or a decision that came since is not in it yet; the next comparison is then being made. */
      current: z.boolean(),
    }),
  }),
});

export type TechnicianRecoveries = z.output<typeof technicianRecoveries.response>;
export type TechnicianRow = TechnicianRecoveries['items'][number];
