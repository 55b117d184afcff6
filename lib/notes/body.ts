import { z } from 'zod';
import { isDay } from '@/lib/calendar';
import { NOTE_LENGTH } from './limits';

const day = z.string('Expected a day: YYYY-MM-DD').refine(isDay, 'Expected a day: YYYY-MM-DD');

const text = z
  .string('Write what is to be known')
  .trim()
  .min(1, 'Write what is to be known')
  .max(NOTE_LENGTH, `Longer than ${NOTE_LENGTH} characters`)
  .refine((value) => !value.includes('\0'), 'Contains a character that is no text');

const inOrder = ({ from, to }: { from?: string | undefined; to?: string | undefined }): boolean =>
  !from || !to || from <= to;
const NOT_IN_ORDER = { path: ['to'], message: 'The end lies before the beginning' };

/** A new note; without `to` it is of one day. */
export const noteBody = z.strictObject({ from: day, to: day.optional(), text }).refine(inOrder, NOT_IN_ORDER);
export type NoteBody = z.output<typeof noteBody>;

/** A change of a note: the version it was made from, and what changes. */
export const noteChange = z
  .strictObject({
    version: z.number().int().positive(),
    from: day.optional(),
    to: day.optional(),
    text: text.optional(),
  })
  .refine(inOrder, NOT_IN_ORDER);
export type NoteChange = z.output<typeof noteChange>;

/** Which version of a note is meant to go. */
export const noteDeletion = z.object({
  version: z
    .string('Expected the version that was seen')
    .regex(/^[1-9]\d{0,8}$/, 'Expected a version')
    .transform(Number),
});
