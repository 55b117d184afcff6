import { z } from 'zod';
import { DIMENSIONS, scopeSchema } from '@/analytics/scope';
import { defineContract } from '@/lib/api/contract';

const month = z.string().regex(/^\d{4}-\d{2}$/);
const massKg = z.number().nonnegative();
const share = z.number().nonnegative();
const count = z.int().nonnegative();

/** Figures of one month and key: masses in kg rounded to the gram, yields as shares of the full charge. */
const figures = {
  recoveredMass: massKg,
  recoveries: count,
  medianYield: share,
  /** Records with an open flag that counts: a reason to look. */
  flagged: count,
  /** CO2-equivalent kept out of the air, kg: recovered mass times GWP (IPCC AR4, 100 years). */
  co2e: massKg,
};

/** Records that state a hold and that made one, that state a final vacuum and that reached the level of 40 CFR 82.156. */
const habits = { holdStated: count, held: count, vacuumStated: count, downToLevel: count };

const ofMonth = {
  month,
  recoveredMass: massKg,
  recoveries: count,
  medianYield: share,
  totalYield: share,
  co2e: massKg,
  ...habits,
};

/** Recovered mass by month, split by one dimension. Entry errors are left out of everything but `excluded`. */
export const monthlyTrends = defineContract({
  path: '/api/trends/monthly',
  action: 'trends:read',
  query: scopeSchema.safeExtend({
    by: z.enum(DIMENSIONS).default('refrigerant'),
    /**
     * How many keys are told by name, those of the largest mass in scope; `otherKeys` tells the rest together. A single
     * one that would be left over is named too. Without it all keys are.
     */
    keys: z.coerce.number().int().min(1).max(500).optional(),
  }),
  response: z.object({
    by: z.enum(DIMENSIONS),
    /** Only months and keys with records; ordered by month, then key. */
    rows: z.array(z.object({ month, key: z.string(), ...figures })),
    /** What the keys that are not named come to by month; null when all are. */
    otherKeys: z
      .object({
        keys: count,
        rows: z.array(z.object({ month, recoveredMass: massKg, recoveries: count, flagged: count, co2e: massKg })),
      })
      .nullable(),
    /** The same figures of each month over all keys, with the mass of the same month a year before (null before the first record). */
    months: z.array(z.object({ ...ofMonth, flagged: count, yearBefore: massKg.nullable() })),
    /** The months that come a year before those of the scope and that the scope does not hold. */
    earlier: z.array(z.object(ofMonth)),
    /** Yields are null when nothing was recovered. Total yield is the ratio of the sums. */
    totals: z.object({ ...figures, medianYield: share.nullable(), totalYield: share.nullable() }),
    /** The running month in the company's zone, when the scope reaches it. */
    partialMonth: month.nullable(),
    /** Months that the scope's own days cut: not whole, and not to be compared. */
    cutMonths: z.array(month),
    /** Records in scope left out as entry errors. */
    excluded: count,
  }),
});

export type MonthlyTrendsQuery = z.output<typeof monthlyTrends.query>;
export type MonthlyTrends = z.output<typeof monthlyTrends.response>;
export type MonthlyTrendsRow = MonthlyTrends['rows'][number];
export type EarlierMonth = MonthlyTrends['earlier'][number];
export type MonthFigures = MonthlyTrends['months'][number];
