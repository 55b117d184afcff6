import { z } from 'zod';
import { isDay } from '@/lib/calendar';
import { COACHING_LENGTH } from './limits';

const day = z.string('Expected a day: YYYY-MM-DD').refine(isDay, 'Expected a day: YYYY-MM-DD');

const words = (missing: string) =>
  z
    .string(missing)
    .trim()
    .min(1, missing)
    .max(COACHING_LENGTH, `Longer than ${COACHING_LENGTH} characters`)
    .refine((value) => !value.includes('\0'), 'Contains a character that is no text');

const plan = words('Write what was agreed');

/** A new coaching: with whom, from which day, what was agreed. */
export const coachingBody = z.strictObject({
  technicianId: z.uuid('Expected the id of a technician'),
  startedOn: day,
  plan,
});
export type CoachingBody = z.output<typeof coachingBody>;

/** A change: the version it was made from, and what changes. An outcome has a day and words; both null reopens. */
export const coachingChange = z
  .strictObject({
    version: z.number().int().positive(),
    startedOn: day.optional(),
    plan: plan.optional(),
    endedOn: day.nullable().optional(),
    outcome: words('Write what came of it').nullable().optional(),
  })
  .refine(({ endedOn, outcome }) => endedOn === undefined || outcome !== undefined, {
    path: ['outcome'],
    message: 'Write what came of it',
  })
  .refine(({ endedOn, outcome }) => outcome === undefined || endedOn !== undefined, {
    path: ['endedOn'],
    message: 'Say on which day it was looked at again',
  })
  .refine(({ endedOn, outcome }) => (endedOn === null) === (outcome === null) || endedOn === undefined, {
    path: ['outcome'],
    message: 'A day and what came of it belong together',
  });
export type CoachingChange = z.output<typeof coachingChange>;

/** Which version of a coaching is meant to go. */
export const coachingDeletion = z.object({
  version: z
    .string('Expected the version that was seen')
    .regex(/^[1-9]\d{0,8}$/, 'Expected a version')
    .transform(Number),
});
