import { z } from 'zod';
import { noteSchema } from '@/analytics/notes/contract';
import { trendsComparison } from '@/analytics/trends-comparison/contract';
import { defineContract } from '@/lib/api/contract';

const massKg = z.number().nonnegative();
const count = z.int().nonnegative();
const share = z.number().nonnegative().nullable();
const day = z.string().regex(/^\d{4}-\d{2}-\d{2}$/);
const month = z.string().regex(/^\d{4}-\d{2}$/);

/** One month of the records that the viewer may see. Masses in kg to the gram; shares are null where none can be said. */
const monthFigures = z.object({
  recoveredMass: massKg,
  recoveries: count,
  totalYield: share,
  medianYield: share,
  /** Records that state a hold, and those of them that made one. */
  holdStated: count,
  held: count,
  /** Records that state a final vacuum, and those of them at or below the level of 40 CFR 82.156. */
  vacuumStated: count,
  downToLevel: count,
  /** CO2-equivalent kept out of the air with the GWP of AR4, kg. */
  co2e: massKg,
});

/** Something that waits for somebody: how many, of what, why it matters, and where it is dealt with. */
const waitingItem = z.object({
  kind: z.string(),
  count,
  /** Stands behind the count: `rows were refused and are still not among the records`. */
  what: z.string(),
  why: z.string(),
  /** The verb of the link, and where it leads: the records or rows that make the count. */
  verb: z.string(),
  href: z.string(),
});

/** GET /api/start: what changed and what waits, as far as the viewer's role is concerned with it. */
export const start = defineContract({
  path: '/api/start',
  action: 'records:read',
  query: z.object({}),
  response: z.object({
    /** The company's local date that the answer is of. */
    today: day,
    /** Records that count, those left out as entry errors, and the first and last day of all. */
    recoveries: count,
    excluded: count,
    firstOn: day.nullable(),
    lastOn: day.nullable(),
    /** The last whole month with a record; the running one (`whole` false) where there is none before it. */
    latest: z.object({ month, whole: z.boolean(), now: monthFigures, yearBefore: monthFigures.nullable() }).nullable(),
    /** That month against the same one a year before, like for like; for who may read trends. */
    comparison: trendsComparison.response.shape.comparison,
    /** What the month's recoveries far below like jobs fall short of the median of like jobs; for who decides flags. */
    shortfall: z.object({ recoveries: count, mass: massKg }).nullable(),
    /** How many records of the last days need a look; for who may read flags. */
    lately: z
      .object({
        from: day,
        to: day,
        flagged: count,
      })
      .nullable(),
    /** The file that was taken in last; for who may import. */
    lastFile: z
      .object({
        importId: z.uuid(),
        fileName: z.string(),
        takenInAt: z.string(),
        added: count,
        updated: count,
        rejected: count,
      })
      .nullable(),
    waiting: z.array(waitingItem),
    /** Notes written lately, the newest first; for who may read notes. */
    notes: z.array(noteSchema),
  }),
});

export type Start = z.output<typeof start.response>;
export type MonthFigures = z.output<typeof monthFigures>;
export type WaitingItem = z.output<typeof waitingItem>;
