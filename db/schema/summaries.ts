import { bigint, date, doublePrecision, integer, numeric, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { companyId, companyPolicy, notForATechnician } from './columns';

// Kept by trigger in the transaction that changes a record (see the migration), never written by the application.
// Entry errors are left out of all of them.

const totalKg = (name: string) => numeric(name, { precision: 20, scale: 9 });

/** The groups whose figures over all records stand ready. */
export const SUMMARY_GROUPS = ['technician', 'site'] as const;

/** Each technician and each site over all of its records. */
export const groupSummary = pgTable(
  'group_summary',
  {
    companyId: companyId(),
    dimension: text('dimension', { enum: SUMMARY_GROUPS }).notNull(),
    groupId: uuid('group_id').notNull(),
    recoveries: integer('recoveries').notNull(),
    recoveredMassKg: totalKg('recovered_mass_kg').notNull(),
    fullChargeKg: totalKg('full_charge_kg').notNull(),
    medianYield: doublePrecision('median_yield').notNull(),
    /** Appliances of a site with at least one record. */
    appliances: integer('appliances'),
    firstRecoveredOn: date('first_recovered_on', { mode: 'string' }).notNull(),
    lastRecoveredOn: date('last_recovered_on', { mode: 'string' }).notNull(),
  },
  (t) => [primaryKey({ columns: [t.companyId, t.dimension, t.groupId] }), companyPolicy(), notForATechnician()],
);

/** Quartiles of the yield among jobs of one refrigerant and kind: the appliance category, '' where none is stated. */
export const likeJobs = pgTable(
  'like_jobs',
  {
    companyId: companyId(),
    refrigerant: text('refrigerant').notNull(),
    kind: text('kind').notNull(),
    records: integer('records').notNull(),
    lowerQuartile: doublePrecision('lower_quartile').notNull(),
    medianYield: doublePrecision('median_yield').notNull(),
    upperQuartile: doublePrecision('upper_quartile').notNull(),
  },
  (t) => [primaryKey({ columns: [t.companyId, t.refrigerant, t.kind] }), companyPolicy(), notForATechnician()],
);

/** The two yields in the middle of all of a company's, the same one twice when the number of records is odd. */
export const middleYields = pgTable(
  'middle_yields',
  {
    companyId: companyId().primaryKey(),
    records: bigint('records', { mode: 'number' }).notNull(),
    /** How many yields are less than the lower one of the middle. */
    below: bigint('below', { mode: 'number' }).notNull(),
    lower: doublePrecision('lower').notNull(),
    upper: doublePrecision('upper').notNull(),
  },
  () => [companyPolicy(), notForATechnician()],
);
