import { z } from 'zod';
import { MEASURES } from '@/analytics/figures/measures';
import { scopeSchema } from '@/analytics/scope';
import { defineContract } from '@/lib/api/contract';

const LEFT_OUT_REASONS = [
  'entry_error',
  'too_few_like_jobs',
  'no_hold_stated',
  'no_vacuum_stated',
  'large_plant',
] as const;

const massKg = z.number().nonnegative();
const share = z.number().nonnegative();
const count = z.int().nonnegative();

/** What goes into a measure's formula. Masses in kg to the gram, yields as shares. */
const parts = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('sum'), recoveries: count }),
  z.object({ kind: z.literal('count') }),
  /** Total yield: the ratio of the two sums. */
  z.object({ kind: z.literal('ratio'), recoveredMass: massKg, fullCharge: massKg }),
  /** Median yield: the mean of the two in the middle, which are one and the same when the number is odd. */
  z.object({ kind: z.literal('median'), recoveries: count, lower: share.nullable(), upper: share.nullable() }),
  /** CO2-equivalent: mass times GWP of each refrigerant, the largest first. */
  z.object({
    kind: z.literal('gwp'),
    refrigerants: z.array(z.object({ refrigerant: z.string(), recoveredMass: massKg, gwp: massKg, co2e: massKg })),
  }),
  /** A part of the records that state a reading. */
  z.object({ kind: z.literal('part'), part: count, of: count }),
  /** Standing among like jobs: how many were judged, in how many groups of like jobs. */
  z.object({ kind: z.literal('standing'), judged: count, groups: count }),
]);
export type ExplainParts = z.output<typeof parts>;

/** How one figure was computed, and which records make it. */
export const explain = defineContract({
  path: '/api/explain',
  action: 'records:read',
  query: scopeSchema.safeExtend({ measure: z.enum(MEASURES) }),
  response: z.object({
    measure: z.enum(MEASURES),
    /** Null where no record is in scope and the measure is no sum. */
    value: z.number().nullable(),
    unit: z.enum(['kg', 'share', 'count']),
    /** Recoveries that make the figure, and their recovered mass in kg. */
    count,
    sum: massKg,
    parts,
    /** In words, with the numbers put in, in kilograms. */
    formula: z.object({ words: z.string(), filled: z.string() }),
    /** Where the formula or its constants come from; null for plain sums and counts. */
    source: z.string().nullable(),
    /** Records in scope that do not count, by reason. */
    leftOut: z.array(z.object({ reason: z.enum(LEFT_OUT_REASONS), count: z.int().positive() })),
    fresh: z.object({
      /** The last day that has a record, of whatever scope; null without any. */
      recordsUntil: z.iso.date().nullable(),
      /** When a record was last added, changed or taken away. */
      lastChangeAt: z.string().nullable(),
    }),
    /** The records themselves: an address of this API, `count` of them. */
    records: z.string(),
  }),
});

export type ExplainQuery = z.output<typeof explain.query>;
export type Explained = z.output<typeof explain.response>;
