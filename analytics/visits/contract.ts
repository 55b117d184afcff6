import { z } from 'zod';
import { UNSTATED } from '@/analytics/scope';
import { APPLIANCE_CATEGORIES, JOB_TYPES } from '@/lib/vocabulary';

/** One recovery in the history of a unit or a site. Masses are kilograms to the gram, yield a share of the full charge. */
const visitSchema = z.object({
  recoveryId: z.uuid(),
  recordRef: z.string(),
  recoveredOn: z.iso.date(),
  technician: z.string(),
  appliance: z.string(),
  refrigerant: z.string(),
  jobType: z.enum([...JOB_TYPES, UNSTATED]),
  nameplateCharge: z.number().nonnegative(),
  fullCharge: z.number().nonnegative(),
  recoveredMass: z.number().nonnegative(),
  yield: z.number().nonnegative(),
  /** Far below like jobs: a reason to look. */
  low: z.boolean(),
  /** False for an entry error, which figures leave out. */
  counts: z.boolean(),
});
export type Visit = z.output<typeof visitSchema>;

/** The latest visits, in the order of time. */
const visits = z.array(visitSchema);

/** GET /api/appliances/{id}: what a unit is, and its recoveries of all time. */
export const applianceHistorySchema = z.object({
  applianceId: z.uuid(),
  appliance: z.string(),
  siteId: z.uuid(),
  site: z.string(),
  category: z.enum([...APPLIANCE_CATEGORIES, UNSTATED]),
  manufacturedOn: z.iso.date().nullable(),
  visits,
});
export type ApplianceHistory = z.output<typeof applianceHistorySchema>;

/** GET /api/sites/{id}: a site and its recoveries of all time. */
export const siteHistorySchema = z.object({
  siteId: z.uuid(),
  site: z.string(),
  address: z.string().nullable(),
  visits,
});
export type SiteHistory = z.output<typeof siteHistorySchema>;
