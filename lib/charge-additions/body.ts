import { z } from 'zod';
import { isDay } from '@/lib/calendar';
import { ADDITION_REASONS, MASS_UNITS } from '@/lib/vocabulary';
import { ADDITION_NOTE_LENGTH, ADDITION_REF_LENGTH } from './limits';

const isText = (value: string): boolean => !value.includes('\0');
const NO_TEXT = 'Contains a character that is no text';

const text = (longest: number) =>
  z.string('Expected text').trim().max(longest, `Longer than ${longest} characters`).refine(isText, NO_TEXT);
const day = z.string('Expected a day: YYYY-MM-DD').refine(isDay, 'Expected a day: YYYY-MM-DD');
const orNothing = <Schema extends z.ZodType>(schema: Schema) =>
  z
    .union([z.literal(''), z.null(), schema])
    .transform((value) => (value === '' ? null : value))
    .optional();

// A script sends a number, a form what was typed; both are read as text, so that no figure is rounded on the way.
const mass = z
  .union([z.string(), z.number()], 'Write how much was added')
  .transform((value) => String(value).trim())
  .refine((value) => value !== '', 'Write how much was added')
  .refine(isText, NO_TEXT);

const fields = {
  addedOn: day,
  addedCharge: mass,
  massUnit: z.enum(MASS_UNITS, `Expected one of ${MASS_UNITS.join(', ')}`),
  reason: z.enum(ADDITION_REASONS, `Expected one of ${ADDITION_REASONS.join(', ')}`),
  leaksVerifiedOn: orNothing(day),
  additionRef: orNothing(text(ADDITION_REF_LENGTH)),
  notes: orNothing(text(ADDITION_NOTE_LENGTH)),
};

/** A new addition: which appliance, when, how much in which unit (kg when not stated), and why. */
export const additionBody = z.strictObject({
  applianceId: z.uuid('Expected the id of an appliance'),
  ...fields,
  massUnit: fields.massUnit.default('kg'),
  reason: fields.reason.default('unknown'),
});
export type AdditionBody = z.output<typeof additionBody>;

const why = text(ADDITION_NOTE_LENGTH).min(3, 'Say in a few words why');

/** A correction: the version it was made from, why, and the fields that change; a mass comes with its unit. */
export const additionChange = z
  .strictObject({
    version: z.number().int().positive(),
    why,
    addedOn: fields.addedOn.optional(),
    addedCharge: fields.addedCharge.optional(),
    massUnit: fields.massUnit.optional(),
    reason: fields.reason.optional(),
    leaksVerifiedOn: fields.leaksVerifiedOn,
    additionRef: fields.additionRef,
    notes: fields.notes,
  })
  .refine(({ addedCharge, massUnit }) => (addedCharge === undefined) === (massUnit === undefined), {
    path: ['massUnit'],
    message: 'A mass and its unit change together',
  });
export type AdditionChange = z.output<typeof additionChange>;

/** Which version of an addition is meant to go, and why. */
export const additionRemoval = z.object({
  version: z
    .string('Expected the version that was seen')
    .regex(/^[1-9]\d{0,8}$/, 'Expected a version')
    .transform(Number),
  why,
});
export type AdditionRemoval = z.output<typeof additionRemoval>;
