import { z } from 'zod';
import { scopeShape } from '@/analytics/scope';
import { defineContract } from '@/lib/api/contract';

const day = z.string().regex(/^\d{4}-\d{2}-\d{2}$/);

/** A note pinned to a day or to a range of days, both ends included. */
export const noteSchema = z.object({
  id: z.uuid(),
  from: day,
  to: day,
  text: z.string(),
  /** By name; who changed it since stands in the history. */
  writtenBy: z.string(),
  writtenAt: z.string(),
  /** Counts edits; a change names the version it saw. */
  version: z.int().positive(),
});

/** The notes that touch a period, the earliest first. */
export const notesList = defineContract({
  path: '/api/notes',
  action: 'notes:read',
  query: z.object({ from: scopeShape.from, to: scopeShape.to }),
  response: z.object({
    items: z.array(noteSchema),
    /** How many notes touch the period; more than are given when it is very long. */
    total: z.int().nonnegative(),
  }),
});

export type NotesQuery = z.output<typeof notesList.query>;
export type NotesList = z.output<typeof notesList.response>;
export type Note = z.output<typeof noteSchema>;
