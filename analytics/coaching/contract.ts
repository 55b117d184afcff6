import { z } from 'zod';
import { defineContract } from '@/lib/api/contract';

const day = z.string().regex(/^\d{4}-\d{2}-\d{2}$/);

/** What was agreed with a technician on a day, and what came of it. */
export const coachingSchema = z.object({
  id: z.uuid(),
  technicianId: z.uuid(),
  /** From this local day on a change is looked for. */
  startedOn: day,
  plan: z.string(),
  /** When it was looked at again, and what came of it; null while it runs. */
  endedOn: day.nullable(),
  outcome: z.string().nullable(),
  /** By name; who changed it since stands in the history. */
  writtenBy: z.string(),
  writtenAt: z.string(),
  /** Counts edits; a change names the version it saw. */
  version: z.int().positive(),
});

/** The coachings of one technician, or of all that the viewer may see, the latest first. */
export const coachingList = defineContract({
  path: '/api/coaching',
  action: 'coaching:read',
  query: z.object({ technicianId: z.uuid('Expected the id of a technician').optional() }),
  response: z.object({ items: z.array(coachingSchema) }),
});

export type CoachingQuery = z.output<typeof coachingList.query>;
export type CoachingList = z.output<typeof coachingList.response>;
export type Coaching = z.output<typeof coachingSchema>;
