import { z } from 'zod';
import { scopeSchema, UNSTATED } from '@/analytics/scope';
import { defineContract } from '@/lib/api/contract';
import { APPLIANCE_CATEGORIES, DISPLAY_UNITS, FLAG_DECISIONS, FLAG_RULES, JOB_TYPES } from '@/lib/vocabulary';
import { FLAG_STATES } from './states';

const count = z.int().nonnegative();
const mass = z.number();
const share = z.number();
const rules = z.enum(FLAG_RULES);
const unit = z.enum(DISPLAY_UNITS).optional();

/** One decision on a flag, or a reopening, which has none. */
const decisionSchema = z.object({
  decision: z.enum(FLAG_DECISIONS).nullable(),
  note: z.string().nullable(),
  /** By name. */
  by: z.string(),
  at: z.string(),
});

/** Why a record is worth a look: one rule, how sure, in words with numbers. */
const reasonSchema = z.object({
  id: z.uuid(),
  rule: rules,
  /** Probability that the record is bad in this way, 0 to 1. */
  certainty: z.number().min(0).max(1),
  explanation: z.string(),
  state: z.enum(['open', 'decided']),
  decision: z.enum(FLAG_DECISIONS).nullable(),
});

/** Where a yield lies among like jobs, as shares of full charge. */
const likeJobsSchema = z.object({
  jobs: count,
  lowerFence: share,
  lowerQuartile: share,
  median: share,
  upperQuartile: share,
});

/** Where a final vacuum lies among like jobs, kPa absolute. */
const vacuumSchema = z.object({ kpaAbs: z.number(), usualKpaAbs: z.number(), spreadKpa: z.number() });

export const flagSchema = reasonSchema.extend({
  recordRef: z.string(),
  recoveryId: z.uuid(),
  recoveredOn: z.iso.date(),
  technician: z.string(),
  site: z.string(),
  appliance: z.string(),
  refrigerant: z.string(),
  category: z.enum([...APPLIANCE_CATEGORIES, UNSTATED]),
  jobType: z.enum([...JOB_TYPES, UNSTATED]),
  /** kg, to the gram. */
  recoveredMass: mass,
  fullCharge: mass,
  /** What like jobs, or the likely meaning of the ticket, would have given, kg; null where nothing says so. */
  expectedMass: mass.nullable(),
  yield: share,
  likeJobs: likeJobsSchema.nullable(),
  vacuum: vacuumSchema.nullable(),
  assignedTo: z.object({ id: z.uuid(), name: z.string() }).nullable(),
  note: z.string().nullable(),
  /** Everything that was decided on this flag, the last first. */
  decisions: z.array(decisionSchema),
  /** The other reasons of the same record, the surest first. */
  others: z.array(reasonSchema),
});
export type Flag = z.output<typeof flagSchema>;
export type FlagReason = z.output<typeof reasonSchema>;

const ofMany = <Item extends z.ZodType<string>>(item: Item) =>
  z
    .union([item, z.array(item)])
    .transform((value) => (Array.isArray(value) ? value : [value]))
    .optional();

/** The flags of the records in scope, the surest first. `unit` is that of the explanations; figures are kg. */
export const flagsList = defineContract({
  path: '/api/flags',
  action: 'flags:read',
  query: scopeSchema.safeExtend({
    state: z.enum(FLAG_STATES).default('open'),
    rule: ofMany(rules),
    /** The flags of one record. */
    recovery: z.uuid().optional(),
    unit,
    limit: z.coerce.number().int().min(1).max(500).default(50),
    cursor: z.string().max(400).optional(),
    format: z.enum(['json', 'csv']).default('json'),
  }),
  response: z.object({
    items: z.array(flagSchema),
    nextCursor: z.string().nullable(),
    /** Whether flags of the company are being renewed: what is listed may change in a moment. */
    renewing: z.boolean(),
    /** Open flags in scope, whatever page, state and rule are asked for. */
    open: z.object({
      flags: count,
      records: count,
      /** Records that count as flagged everywhere else: certainty 0.5 or more, not merely short on arrival. */
      flagged: count,
      byRule: z.array(z.object({ rule: rules, flags: count })),
    }),
    /** How many of the last decided flags of the company were borne out, with a Wilson interval of 95 %. */
    borneOut: z.object({ decided: count, confirmed: count, low: share.nullable(), high: share.nullable() }),
  }),
});
export type FlagsQuery = z.output<typeof flagsList.query>;
export type FlagsList = z.output<typeof flagsList.response>;

export const flagQuery = z.object({ unit });

/** Who may be asked to look at a flag. */
export const assignableList = defineContract({
  path: '/api/flags/people',
  action: 'flags:decide',
  query: z.object({}),
  response: z.object({ items: z.array(z.object({ id: z.uuid(), name: z.string(), role: z.string() })) }),
});
export type AssignableList = z.output<typeof assignableList.response>;
