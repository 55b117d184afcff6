import { z } from 'zod';
import { DIMENSIONS, scopeSchema } from '@/analytics/scope';
import { defineContract } from '@/lib/api/contract';
import { parseVersus } from './versus';

/** Reports of the IPCC that global warming potentials are taken from. */
const GWP_SOURCES = ['ar4', 'ar6'] as const;

const massKg = z.number().nonnegative();
const count = z.int().nonnegative();
const share = z.number().nonnegative().nullable();
const day = z.string().regex(/^\d{4}-\d{2}-\d{2}$/);

/** Figures of one period. Masses in kg to the gram; shares are null where nothing can be said. */
const figures = z.object({
  /** First and last day, both included. */
  from: day,
  to: day,
  recoveredMass: massKg,
  /** Standard error of the sum in kg: the square root of the sum of the squared masses of the jobs. */
  massStandardError: massKg,
  recoveries: count,
  totalYield: share,
  medianYield: share,
  /** Records that state a hold, those of them that made one, and their share. */
  holdStated: count,
  held: count,
  heldShare: share,
  /** Records that state a final vacuum, those of them at or below the level of 40 CFR 82.156, and their share. */
  vacuumStated: count,
  downToLevel: count,
  downToLevelShare: share,
  /** Recoveries far below their like jobs: a reason to look. */
  flagged: count,
  flaggedShare: share,
  /** CO2-equivalent kept out of the air, kg, and the recovered mass whose GWP the source does not have. */
  co2e: massKg,
  massWithoutGwp: massKg,
  excluded: count,
});

const versus = z.string('Expected one period: 2024-01..2024-12').transform((text, context) => {
  const period = parseVersus(text);
  if (period) return period;
  context.addIssue({
    code: 'custom',
    message: 'Expected months or days, the first before the last: 2024-01..2024-12 or 2024-03-01..2024-03-09',
  });
  return z.NEVER;
});

/** A period against another one, like for like. */
export const trendsComparison = defineContract({
  path: '/api/trends/comparison',
  action: 'trends:read',
  query: scopeSchema.safeExtend({
    by: z.enum(DIMENSIONS).default('refrigerant'),
    versus: versus.optional(),
    gwp: z.enum(GWP_SOURCES).default('ar4'),
  }),
  response: z.object({
    by: z.enum(DIMENSIONS),
    gwp: z.enum(GWP_SOURCES),
    /** Null when there is nothing to compare: no records yet, or none before the period. */
    comparison: z
      .object({
        now: figures,
        before: figures,
        /** Whether a part of a month is compared with the same days of its counterpart. */
        sameDays: z.boolean(),
        /** Why less is compared than was asked for. */
        shortened: z.enum(['to twelve months', 'to the shorter one', 'to where records begin']).nullable(),
        /** Recovered mass now minus before, kg, with the 95 % interval that chance gives it. */
        difference: z.object({ mass: z.number(), low: z.number(), high: z.number() }),
        /** Now over before with its 95 % interval; null where either is nothing. */
        ratio: z.object({ value: z.number(), low: z.number(), high: z.number() }).nullable(),
        /** Whether the interval leaves out "no change". */
        clear: z.boolean(),
        /** Keys of the split by how much they moved, the largest first, kg. */
        movers: z.array(z.object({ key: z.string(), now: massKg, before: massKg, difference: z.number() })),
        /** What the keys that are not named come to together. */
        otherKeys: z.object({ keys: count, difference: z.number() }),
      })
      .nullable(),
  }),
});

export type TrendsComparisonQuery = z.output<typeof trendsComparison.query>;
export type TrendsComparison = z.output<typeof trendsComparison.response>;
export type Comparison = NonNullable<TrendsComparison['comparison']>;
export type PeriodFigures = Comparison['now'];
