import {
  bigint,
  boolean,
  date,
  doublePrecision,
  integer,
  jsonb,
  pgTable,
  primaryKey,
  timestamp,
  uuid,
} from 'drizzle-orm/pg-core';
import { companyId, companyPolicy, notForATechnician } from './columns';

// What is worked out from all of a company's records in the background, after they have changed. It follows from the
// records alone and can be made anew at any time: no history.

/** One row a company: what its digest stands on, and what is said of the company as a whole. */
export const recordDigests = pgTable(
  'record_digests',
  {
    companyId: companyId().primaryKey(),
    /** How it was worked out; another way makes everything anew. */
    version: integer('version').notNull(),
    /** Counts on with each digest, so that answers kept under the one before are not given any more. */
    digests: bigint('digests', { mode: 'number' }).notNull().default(1),
    /** Where the company's history ended in the records that were read. */
    revision: bigint('revision', { mode: 'number' }).notNull(),
    madeAt: timestamp('made_at', { withTimezone: true, mode: 'string' }).notNull().defaultNow(),
    /** The fitted shares of leaking appliances and of short visits; null where too few appliances tell. */
    leakModel: jsonb('leak_model').$type<unknown>(),
    /** How technicians compare over all records. */
    comparison: jsonb('comparison').$type<unknown>().notNull(),
  },
  () => [companyPolicy(), notForATechnician()],
);

/** The suspicion that an appliance leaks. Those of which no visit tells have no row. */
export const applianceSuspicions = pgTable(
  'appliance_suspicions',
  {
    companyId: companyId(),
    applianceId: uuid('appliance_id').notNull(),
    visits: integer('visits').notNull(),
    shortVisits: integer('short_visits').notNull(),
    expectedShort: doublePrecision('expected_short').notNull(),
    /** Probability that it leaks; null where nothing can be said. */
    chance: doublePrecision('chance'),
    /** Its visits that tell, the earliest first: days, yields and the probability that each came short. */
    visitedOn: date('visited_on', { mode: 'string' }).array().notNull(),
    yields: doublePrecision('yields').array().notNull(),
    shortChances: doublePrecision('short_chances').array().notNull(),
  },
  (t) => [primaryKey({ columns: [t.companyId, t.applianceId] }), companyPolicy(), notForATechnician()],
);

/** What is suspected at a site. Sites without an appliance above have no row. */
export const siteSuspicions = pgTable(
  'site_suspicions',
  {
    companyId: companyId(),
    siteId: uuid('site_id').notNull(),
    judged: integer('judged').notNull(),
    suspected: integer('suspected').notNull(),
    lowAgain: integer('low_again').notNull(),
    /** That of its most suspected appliance; null where nothing can be said of any. */
    chance: doublePrecision('chance'),
    expected: doublePrecision('expected').notNull(),
    adjustedP: doublePrecision('adjusted_p').notNull(),
    look: boolean('look').notNull(),
  },
  (t) => [primaryKey({ columns: [t.companyId, t.siteId] }), companyPolicy(), notForATechnician()],
);
