import { z } from 'zod';
import { scopeSchema } from '@/analytics/scope';
import { defineContract } from '@/lib/api/contract';

const month = z.string().regex(/^\d{4}-\d{2}$/);
const massKg = z.number().nonnegative();
const factor = z.number().nonnegative();
const count = z.int().nonnegative();

/**
 * Season and trend of routine jobs by the whole months up to the scope's end, from the first record on: a season cannot be told from a
 * part of the history. The running month and a cut one are left out.
 */
export const monthlyPattern = defineContract({
  path: '/api/trends/pattern',
  action: 'trends:read',
  query: scopeSchema,
  response: z.object({
    /** Large plant is left out of the months below: full charges of so many kg and more. How much of all mass it was. */
    large: z.object({ fromFullCharge: massKg, recoveries: count, recoveredMass: massKg, allMass: massKg }),
    /** Null where the months do not carry it; `missing` says why. */
    pattern: z
      .object({
        months: z.array(
          z.object({
            month,
            recoveredMass: massKg,
            recoveries: count,
            /** Mass of the month without season and chance. */
            trend: massKg,
            seasonFactor: factor,
            remainderFactor: factor,
            /** Trend and season together, and the band in which a usual month falls. */
            expected: massKg,
            low: massKg,
            high: massKg,
            /** Whether it has recoveries enough to be judged. */
            counts: z.boolean(),
            /** `beyondLimits`: outside of the band. `eightOneSide`: the eighth month in a row on one side of it. */
            signals: z.array(z.string()),
          }),
        ),
        /** How much of what moves is season, 0 to 1; below 0.3 there is no steady one. */
        seasonStrength: z.number(),
        steady: z.boolean(),
        /** The months whose spread sets the band; factors of what was expected. */
        baseline: z.object({
          from: month,
          to: month,
          months: count,
          form: z.enum(['mean', 'median']),
          lower: factor,
          upper: factor,
        }),
      })
      .nullable(),
    missing: z.object({ needs: count, has: count, of: z.string() }).nullable(),
  }),
});

export type MonthlyPatternQuery = z.output<typeof monthlyPattern.query>;
export type MonthlyPattern = z.output<typeof monthlyPattern.response>;
export type ShownPattern = NonNullable<MonthlyPattern['pattern']>;
export type ShownPatternMonth = ShownPattern['months'][number];
