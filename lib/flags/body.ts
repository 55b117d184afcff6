import { z } from 'zod';
import { FLAG_DECISIONS } from '@/lib/vocabulary';
import { FLAG_NOTE_LENGTH } from './limits';

const note = z
  .string('Expected text')
  .trim()
  .max(FLAG_NOTE_LENGTH, `Longer than ${FLAG_NOTE_LENGTH} characters`)
  .refine((value) => !value.includes('\0'), 'Contains a character that is no text')
  .transform((value) => value || null);

/** What somebody says that the record is. `wholeRecord` closes the record's other open flags with this one. */
export const decisionBody = z.strictObject({
  decision: z.enum(FLAG_DECISIONS),
  note: note.nullish().transform((value) => value ?? null),
  wholeRecord: z.boolean().default(false),
});
export type DecisionBody = z.output<typeof decisionBody>;

/** Who is asked to look, and what he ought to know; what is left out stays as it is. */
export const assignmentBody = z
  .strictObject({ assignedTo: z.uuid().nullable().optional(), note: note.nullable().optional() })
  .refine(({ assignedTo, note: said }) => assignedTo !== undefined || said !== undefined, {
    message: 'Say who is asked to look (assignedTo), or what he ought to know (note)',
  });
export type AssignmentBody = z.output<typeof assignmentBody>;
