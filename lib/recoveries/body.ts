import { z } from 'zod';
import { RECORD_FIELDS, type RecordField, type RecordTexts } from './fields';

const NO_TEXT = 'Contains a character that is no text';
const isText = (value: string): boolean => !value.includes('\0');

// A script sends numbers, a form what was typed; both are read as text, so that no figure is rounded on the way.
const text = z
  .union([z.string(), z.number(), z.null()], 'Expected text or a number')
  .transform((value) => (value === null ? '' : String(value).trim()))
  .refine(isText, NO_TEXT);

const fields = Object.fromEntries(RECORD_FIELDS.map((field) => [field, text.optional()])) as Record<
  RecordField,
  z.ZodOptional<typeof text>
>;

/** Fields of a record by name; masses are in `massUnit` (kg when not stated), pressures in `vacuumUnit`. */
export const recordBody = z.strictObject({
  ...fields,
  /** Names that the company does not know yet are meant, and are created. */
  createNames: z.boolean().optional(),
});
export type RecordBody = z.output<typeof recordBody>;

/** A correction: the version it was made from, why, and the fields that change; null or '' empties a field. */
export const correctionBody = z.strictObject({
  version: z.number().int().positive(),
  reason: z
    .string('Say in a few words why the record is corrected')
    .trim()
    .min(3, 'Say in a few words why the record is corrected')
    .max(500, 'Longer than 500 characters')
    .refine(isText, NO_TEXT),
  changes: z.strictObject(fields).refine((changes) => Object.keys(changes).length > 0, 'Nothing is changed'),
  createNames: z.boolean().optional(),
});
export type CorrectionBody = z.output<typeof correctionBody>;

/** The texts of a new record, fields that are not stated as ''. */
export const newTexts = ({ createNames: _, ...body }: RecordBody): RecordTexts =>
  Object.fromEntries(
    RECORD_FIELDS.map((field) => [field, body[field] || (field === 'massUnit' ? 'kg' : '')]),
  ) as RecordTexts;

/** The texts of a record with a correction laid over them. */
export const correctedTexts = (texts: RecordTexts, changes: CorrectionBody['changes']): RecordTexts => ({
  ...texts,
  ...Object.fromEntries(Object.entries(changes).filter(([, value]) => value !== undefined)),
});
