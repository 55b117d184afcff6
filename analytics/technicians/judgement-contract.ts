import { z } from 'zod';

const ranged = z.object({ value: z.number(), low: z.number(), high: z.number() });
const share = z.number().min(0).max(1);
const count = z.int().nonnegative();

/** How one habit is kept: jobs of which it is known, the share with it, colleagues' share, and points it costs. */
const habit = z.object({
  known: count,
  share: share.nullable(),
  others: share.nullable(),
  costs: z.number().nullable(),
});
const habitName = z.enum(['hold made', 'level reached', 'weighed twice', 'written the same day']);

/**
 * How a technician compares with colleagues on like jobs. Effects are points of nameplate, ranges hold at 95 %, masses are
 * kg, vacuums kPa. Null where nothing is said of him.
 */
export const judgementShape = {
  /** What was recovered, and what colleagues' like jobs would have given; units known to have come short left out. */
  observedMass: z.number().nonnegative(),
  expectedMass: z.number().nonnegative(),
  effect: z.number().nullable(),
  low: z.number().nullable(),
  high: z.number().nullable(),
  /** Worth a trainer's look; on its own no finding. */
  look: z.boolean(),
  /** `below` and `above` only where it is clear: by chance, by size, and with the final vacuum bearing it out. */
  verdict: z.enum(['below', 'within', 'above', 'too few']),
  restsOn: z.enum(['usual pull', 'early stops']).nullable(),
  /** The verdict in words, with its numbers. */
  why: z.string(),
  method: z.enum(['short units excused', 'all jobs']),
  judgedJobs: count,
  weakShare: share,
  judgedFrom: z.iso.date().nullable(),
  leftOut: z.object({ firstJobs: count, scaleInDoubt: count, shortOnArrival: count, beforeChange: count }),
  plainEffect: ranged.nullable(),
  shrunkEffect: ranged.nullable(),
  chance: share.nullable(),
  adjustedChance: share.nullable(),
  shallowerKpa: ranged.nullable(),
  earlyStops: z.object({ found: z.number(), of: z.number(), share, usualShare: share }).nullable(),
  funnel: z.object({ equivalentJobs: z.number(), inner: z.number(), outer: z.number() }).nullable(),
  scale: z.object({ from: z.iso.date(), to: z.iso.date().nullable(), jobs: count, readsLow: ranged }).nullable(),
  workChange: z
    .object({
      from: z.iso.date(),
      of: z.enum(['full pulls', 'early stops']),
      before: z.number(),
      after: z.number(),
      better: z.boolean(),
    })
    .nullable(),
  habits: z.record(habitName, habit),
  habitBehind: habitName.nullable(),
  /** Points a year. */
  trend: ranged.nullable(),
  /** Points: a newcomer's first forty jobs against those since. */
  learning: z
    .object({ first: z.number(), since: z.number(), gain: z.number(), low: z.number(), high: z.number() })
    .nullable(),
  /** The run of jobs above or below what is expected that is still going on, and when it began. */
  run: z.object({ side: z.enum(['above', 'below']), from: z.iso.date() }).nullable(),
};
