import { z } from 'zod';
import { defineContract } from '@/lib/api/contract';
import { APPLIANCE_CATEGORIES } from '@/lib/vocabulary';

/** GET /api/recoveries/names: what is known to write a record with; the appliances are those of `site`. */
export const knownNamesContract = defineContract({
  path: '/api/recoveries/names',
  action: 'records:write',
  query: z.object({
    site: z
      .string()
      .max(200)
      .regex(/^[^\0]*$/, 'Expected text')
      .optional(),
  }),
  response: z.object({
    technicians: z.array(z.string()),
    branches: z.array(z.string()),
    sites: z.array(z.string()),
    cylinders: z.array(z.string()),
    refrigerants: z.array(z.string()),
    appliances: z.array(
      z.object({
        name: z.string(),
        refrigerant: z.string().nullable(),
        category: z.enum(APPLIANCE_CATEGORIES).nullable(),
        /** Kilograms; a form writes it in its own unit. */
        nameplateCharge: z.number().nullable(),
      }),
    ),
  }),
});
export type KnownNames = z.output<typeof knownNamesContract.response>;
