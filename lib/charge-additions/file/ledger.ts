import { z } from 'zod';
import { ADDITION_REASONS, MASS_UNITS } from '@/lib/vocabulary';

/** What an update replaces, so that an undo can put it back. */
export const replacedSchema = z.object({
  applianceId: z.string(),
  addedOn: z.string(),
  addedChargeKg: z.string(),
  massUnit: z.enum(MASS_UNITS),
  enteredMass: z.string(),
  reason: z.enum(ADDITION_REASONS),
  leaksVerifiedOn: z.string().nullable(),
  notes: z.string().nullable(),
  importId: z.string().nullable(),
  sourceHash: z.string().nullable(),
});
export type Replaced = z.output<typeof replacedSchema>;

/**
 * What an import did to one addition: `before` null where it was added. When its content has another fingerprint than
 * `hashAfter`, somebody changed it since, and an undo keeps it.
 */
export const ledgerSchema = z.array(
  z.object({
    additionId: z.string(),
    additionRef: z.string(),
    before: replacedSchema.nullable(),
    hashAfter: z.string(),
  }),
);
export type Ledger = z.output<typeof ledgerSchema>;
