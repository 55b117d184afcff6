import { z } from 'zod';
import { defineContract } from '@/lib/api/contract';

/** GET /api/recoveries/cylinder: what a cylinder holds as far as is known, so that no other refrigerant is put in. */
export const cylinderContentContract = defineContract({
  path: '/api/recoveries/cylinder',
  action: 'records:write',
  query: z.object({
    name: z
      .string()
      .min(1)
      .max(200)
      .regex(/^[^\0]*$/, 'Expected text'),
  }),
  response: z.object({
    /** The refrigerant that the cylinder itself is set down for. */
    meantFor: z.string().nullable(),
    /** What was recovered into it last, of the records that the viewer may see. */
    last: z.object({ refrigerant: z.string(), recoveredOn: z.iso.date() }).nullable(),
  }),
});
export type CylinderContent = z.output<typeof cylinderContentContract.response>;
