import { z } from 'zod';
import { additionSchema } from '@/analytics/charge-additions/contract';
import { ADDITION_REASONS, APPLIANCE_CATEGORIES, LEAK_RATE_METHODS } from '@/lib/vocabulary';

const day = z.iso.date();
const kg = z.number().nonnegative();
const percent = z.number().nonnegative();
const probability = z.number().min(0).max(1);

/** A leak rate in percent; `low` and `high` lie twice its standard uncertainty to either side. */
export const leakRateSchema = z.object({
  percent,
  low: percent,
  high: percent,
  /** Additions after this day count; null where no earlier addition is known and 365 days are taken. */
  after: day.nullable(),
  /** The follow-up test with which the period begins. */
  leaksVerifiedOn: day.nullable(),
  /** The percentage above which leaks must be repaired, where a rule held on that day. */
  trigger: percent.nullable(),
  /** Paragraphs of the rules that held on that day. */
  paragraphs: z.array(z.string()),
  /** Against the trigger; null without one. */
  above: z.boolean().nullable(),
  /** The trigger lies within the range. */
  close: z.boolean(),
});
export type ShownLeakRate = z.output<typeof leakRateSchema>;

const eventSchema = z.object({
  addedOn: day,
  additionIds: z.array(z.uuid()),
  added: kg,
  /** What of it counts as leaked. */
  counted: kg,
  reasons: z.array(z.enum(ADDITION_REASONS)),
  rate: leakRateSchema.nullable(),
});

const ruleSchema = z.object({
  rule: z.enum(['ozone', 'hfc']),
  paragraph: z.string(),
  /** From this day on it is judged here. */
  since: day,
  leastCharge: kg,
  holds: z.enum(['yes', 'no', 'ask']),
  why: z.enum(['in_scope', 'refrigerant', 'charge', 'light_commercial', 'light_commercial_unstated']),
});
export type ShownRule = z.output<typeof ruleSchema>;

/** By which method a site's leak rates are computed. `method` is null while nobody has chosen. */
export const siteMethodSchema = z.object({
  method: z.enum(LEAK_RATE_METHODS).nullable(),
  /** Counts changes; 0 while nobody has chosen. */
  version: z.int().nonnegative(),
  /** Every choice, the newest first. */
  history: z.array(
    z.object({ method: z.enum(LEAK_RATE_METHODS), who: z.string(), changedAt: z.string(), why: z.string().nullable() }),
  ),
});
export type SiteMethod = z.output<typeof siteMethodSchema>;

const visitSchema = z.object({
  visitedOn: day,
  recoveryYield: z.number(),
  /** Probability that the unit came short. */
  short: probability,
});

const suspicionShape = {
  /** Visits of the last 36 months that tell what charge was there. */
  visits: z.int().nonnegative(),
  shortVisits: z.int().nonnegative(),
  /** How many short ones are usual for jobs like these. */
  expectedShort: z.number().nonnegative(),
  /** Probability that it leaks; null where nothing can be said. */
  leakSuspicion: probability.nullable(),
};

/** GET /api/appliances/{id}/leaks: what one appliance took in, lost and is suspected of. */
export const applianceLeaksSchema = z.object({
  appliance: z.string(),
  applianceId: z.uuid(),
  site: z.string(),
  siteId: z.uuid(),
  refrigerant: z.string().nullable(),
  category: z.enum(APPLIANCE_CATEGORIES).nullable(),
  /** As most of its records state it; null where none does. */
  fullCharge: kg.nullable(),
  lightCommercial: z.boolean().nullable(),
  method: siteMethodSchema,
  /** The method that was used: the chosen one, or annualizing while none is chosen. */
  methodUsed: z.enum(LEAK_RATE_METHODS),
  trigger: percent.nullable(),
  rules: z.array(ruleSchema),
  /** Days on which refrigerant was added, the earliest first. */
  events: z.array(eventSchema),
  /** What was added as leaked in each calendar year; `chronic` where a rule held in it. */
  years: z.array(z.object({ year: z.int(), added: kg, percent, chronic: z.boolean() })),
  additions: z.array(additionSchema),
  suspicion: z.object({ ...suspicionShape, history: z.array(visitSchema) }),
});
export type ApplianceLeaks = z.output<typeof applianceLeaksSchema>;

const siteApplianceSchema = z.object({
  appliance: z.string(),
  applianceId: z.uuid(),
  refrigerant: z.string().nullable(),
  category: z.enum(APPLIANCE_CATEGORIES).nullable(),
  fullCharge: kg.nullable(),
  additions: z.int().nonnegative(),
  /** Its last leak rate. */
  lastRate: leakRateSchema.extend({ addedOn: day }).nullable(),
  ...suspicionShape,
});
export type SiteAppliance = z.output<typeof siteApplianceSchema>;

/** GET /api/sites/{id}/leaks: the method of a site and what is known of each of its appliances. */
export const siteLeaksSchema = z.object({
  site: z.string(),
  siteId: z.uuid(),
  method: siteMethodSchema,
  methodUsed: z.enum(LEAK_RATE_METHODS),
  /** The most suspected first. */
  appliances: z.array(siteApplianceSchema),
  /** Suspected ones against what other sites have; null where nothing can be said of any appliance. */
  excess: z
    .object({
      judged: z.int().positive(),
      suspected: z.int().nonnegative(),
      expected: z.number().nonnegative(),
      /** Chance of so many or more if the site were like all others, adjusted for the number of sites. */
      adjustedP: probability,
      look: z.boolean(),
    })
    .nullable(),
});
export type SiteLeaks = z.output<typeof siteLeaksSchema>;
