import { z } from 'zod';
import { scopeShape } from '@/analytics/scope';
import { defineContract } from '@/lib/api/contract';
import { ADDITION_REASONS, MASS_UNITS } from '@/lib/vocabulary';

const day = z.iso.date();

/** Refrigerant put into an appliance. `addedCharge` in kg to the gram; what was typed stands beside it in its unit. */
export const additionSchema = z.object({
  id: z.uuid(),
  additionRef: z.string().nullable(),
  appliance: z.string(),
  applianceId: z.uuid(),
  site: z.string(),
  siteId: z.uuid(),
  addedOn: day,
  addedCharge: z.number().nonnegative(),
  enteredMass: z.string(),
  massUnit: z.enum(MASS_UNITS),
  reason: z.enum(ADDITION_REASONS),
  /** The day on which a follow-up test showed all leaks repaired. */
  leaksVerifiedOn: day.nullable(),
  notes: z.string().nullable(),
  /** The import that brought it. */
  importId: z.uuid().nullable(),
  /** By name; who changed it since stands in the history. */
  writtenBy: z.string(),
  /** Counts edits; a change names the version it saw. */
  version: z.int().positive(),
});

/** Charge additions, the newest first; those of an appliance or of a site where one is named. */
export const additionsList = defineContract({
  path: '/api/charge-additions',
  action: 'leaks:read',
  query: z.object({
    from: scopeShape.from,
    to: scopeShape.to,
    appliance: z.uuid().optional(),
    site: z.uuid().optional(),
    limit: z
      .string()
      .regex(/^[1-9]\d{0,2}$/, 'Expected 1 to 500')
      .transform(Number)
      .refine((limit) => limit <= 500, 'Expected 1 to 500')
      .optional(),
    cursor: z
      .string()
      .regex(/^\d{4}-\d{2}-\d{2}_[0-9a-f-]{36}$/, 'Expected a cursor of this list')
      .optional(),
  }),
  response: z.object({ items: z.array(additionSchema), nextCursor: z.string().nullable() }),
});

export type AdditionsQuery = z.output<typeof additionsList.query>;
export type AdditionsList = z.output<typeof additionsList.response>;
export type Addition = z.output<typeof additionSchema>;

/** Every change of the additions of one appliance, removals included, the newest first. */
export const additionChanges = defineContract({
  path: '/api/charge-additions/changes',
  action: 'leaks:read',
  query: z.object({ appliance: z.uuid('Expected the id of an appliance') }),
  response: z.object({
    items: z.array(
      z.object({
        entryNo: z.int().positive(),
        additionId: z.uuid(),
        changedAt: z.string(),
        action: z.enum(['insert', 'update', 'delete']),
        who: z.string(),
        why: z.string().nullable(),
        /** In words, before and after; null where there was or is nothing. */
        before: z.record(z.string(), z.string().nullable()).nullable(),
        after: z.record(z.string(), z.string().nullable()).nullable(),
      }),
    ),
  }),
});
export type AdditionChanges = z.output<typeof additionChanges.response>;
