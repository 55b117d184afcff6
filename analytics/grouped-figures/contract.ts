import { z } from 'zod';

/**
 * What the recoveries of a group in scope come to: a technician's, a site's, an appliance's. Masses in kg to the gram;
 * total yield is the ratio of the sums, median yield the middle one of the records. Entry errors are left out.
 */
export const groupFigures = {
  recoveries: z.int().positive(),
  recoveredMass: z.number().nonnegative(),
  fullCharge: z.number().nonnegative(),
  totalYield: z.number().nonnegative(),
  medianYield: z.number().nonnegative(),
  firstRecoveredOn: z.iso.date(),
  lastRecoveredOn: z.iso.date(),
};

const figures = z.object(groupFigures);
export type GroupFigures = z.output<typeof figures>;
