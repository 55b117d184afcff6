import { z } from 'zod';
import { LIKE_JOBS_STANDINGS, PLANT_SIZES, STATED_READINGS } from '@/analytics/figures/measures';
import { scopeSchema } from '@/analytics/scope';
import { defineContract } from '@/lib/api/contract';
import { RECORD_FIELDS } from '@/lib/recoveries/fields';
import {
  APPLIANCE_CATEGORIES,
  CERTIFICATION_TYPES,
  DISPOSITIONS,
  JOB_TYPES,
  MASS_UNITS,
  VACUUM_UNITS,
} from '@/lib/vocabulary';
import { DEFAULT_SORT, EXCLUSIONS, MOST_ROWS_A_PAGE, SORTS } from './constants';

const nullable = <Value extends z.ZodType>(value: Value) => value.nullable();

/** One row of the table of records. Masses are kilograms rounded to the gram; yield is recovered mass over full charge. */
export const recordRowSchema = z.object({
  id: z.uuid(),
  recordRef: z.string(),
  recoveredOn: z.iso.date(),
  recoveredAt: nullable(z.string()),
  technician: z.string(),
  site: z.string(),
  appliance: z.string(),
  branch: nullable(z.string()),
  category: nullable(z.enum(APPLIANCE_CATEGORIES)),
  jobType: nullable(z.enum(JOB_TYPES)),
  refrigerant: z.string(),
  fullCharge: z.number(),
  recoveredMass: z.number(),
  yield: z.number(),
  cylinder: nullable(z.string()),
  exclusion: nullable(z.enum(['entry_error'])),
  version: z.number().int(),
});
export type RecordRow = z.output<typeof recordRowSchema>;

/** Everything one record says. `entered` holds each field as it was typed, in the units it was typed in. */
export const recordSchema = recordRowSchema.extend({
  nameplateCharge: z.number(),
  addedCharge: z.number(),
  startWeight: nullable(z.number()),
  endWeight: nullable(z.number()),
  massUnit: z.enum(MASS_UNITS),
  finalVacuumKpaAbs: nullable(z.number()),
  vacuumUnit: nullable(z.enum(VACUUM_UNITS)),
  holdMinutes: nullable(z.number()),
  holdRiseKpa: nullable(z.number()),
  disposition: nullable(z.enum(DISPOSITIONS)),
  manufacturedOn: nullable(z.iso.date()),
  technicianCertification: nullable(z.enum(CERTIFICATION_TYPES)),
  notes: nullable(z.string()),
  entered: z.record(z.enum(RECORD_FIELDS), z.string()),
  extra: z.record(z.string(), z.string()),
  /** The file and line that last added or changed the record; null for one written by hand. */
  source: nullable(z.object({ importId: z.uuid(), fileName: z.string(), line: nullable(z.number().int()) })),
  /** What is usual among like jobs (same refrigerant and category); null where there are too few to say. */
  likeJobs: nullable(
    z.object({
      count: z.number().int(),
      lowerFence: z.number(),
      lowerQuartile: z.number(),
      median: z.number(),
      upperQuartile: z.number(),
    }),
  ),
  createdAt: z.string(),
  updatedAt: z.string(),
});
export type RecordDetail = z.output<typeof recordSchema>;

export const recordListQuery = scopeSchema.safeExtend({
  sort: z.enum(SORTS, `Sort by one of ${SORTS.join(', ')}`).default(DEFAULT_SORT),
  /** Looked for in record ref, technician, site and appliance. */
  q: z
    .string()
    .trim()
    .max(200)
    .regex(/^[^\0]*$/, 'Expected text')
    .optional(),
  importId: z.uuid().optional(),
  /** `none`: only records that count in figures; `entry_error`: only those left out. */
  exclusion: z.enum(EXCLUSIONS).optional(),
  /** Only records that count as flagged; for who may read flags. */
  flagged: z.enum(['yes']).optional(),
  /** How the record stands among its like jobs; for who may read flags. */
  likeJobs: z.enum(LIKE_JOBS_STANDINGS).optional(),
  /** Only records that state a hold, or a final vacuum. */
  states: z.enum(STATED_READINGS).optional(),
  /** Only records that do not state a hold, or a final vacuum. */
  lacks: z.enum(STATED_READINGS).optional(),
  /** Only routine jobs, or only those at large plant (full charge of 100 lb and more). */
  plant: z.enum(PLANT_SIZES).optional(),
  limit: z.coerce.number().int().min(1).max(MOST_ROWS_A_PAGE).default(50),
  cursor: z.string().max(2000).optional(),
  format: z.enum(['json', 'csv']).default('json'),
});
export type RecordListQuery = z.output<typeof recordListQuery>;

/** GET /api/recoveries: one page of the records in scope; `total` counts all of them and comes with the first page. */
export const recordListContract = defineContract({
  path: '/api/recoveries',
  action: 'records:read',
  query: recordListQuery,
  response: z.object({
    items: z.array(recordRowSchema),
    nextCursor: nullable(z.string()),
    previousCursor: nullable(z.string()),
    total: z.number().int().optional(),
  }),
});
export type RecordList = z.output<typeof recordListContract.response>;

/** GET /api/recoveries/{id}/history: newest first. `who` is a person, a program, or the file that was imported. */
export const recordHistorySchema = z.object({
  items: z.array(
    z.object({
      entryNo: z.number().int(),
      changedAt: z.string(),
      action: z.enum(['insert', 'update', 'delete']),
      who: z.string(),
      reason: nullable(z.string()),
      changes: z.array(z.object({ field: z.string(), before: nullable(z.string()), after: nullable(z.string()) })),
    }),
  ),
});
export type RecordHistory = z.output<typeof recordHistorySchema>;
export type HistoryEntry = RecordHistory['items'][number];
