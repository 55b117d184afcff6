import { sql } from 'drizzle-orm';
import { date, doublePrecision, integer, pgPolicy, pgTable, primaryKey, text } from 'drizzle-orm/pg-core';
import { companyId, companyPolicy, massKg, setting } from './columns';

/** Where months are added up by: the six dimensions of the records, and all of them together. */
export const SUMMARY_DIMENSIONS = [
  'all',
  'refrigerant',
  'technician',
  'site',
  'branch',
  'category',
  'job_type',
] as const;

/**
 * The months, added up: what the monthly views read, so that they answer at once however many records there are.
 * Kept by trigger in the transaction that changes a record (see the migration), never written by the application.
 * `key` is the designation, word or id of the dimension's value, '' where records do not state it.
 */
export const monthlySummary = pgTable(
  'monthly_summary',
  {
    companyId: companyId(),
    dimension: text('dimension', { enum: SUMMARY_DIMENSIONS }).notNull(),
    month: date('month', { mode: 'string' }).notNull(),
    key: text('key').notNull(),
    recoveries: integer('recoveries').notNull(),
    recoveredMassKg: massKg('recovered_mass_kg').notNull(),
    fullChargeKg: massKg('full_charge_kg').notNull(),
    medianYield: doublePrecision('median_yield').notNull(),
    /** CO2-equivalent of the recovered mass with AR4 values. */
    co2eKg: doublePrecision('co2e_kg').notNull(),
    /** Records that state a final vacuum, and those of them at or below the level of 40 CFR 82.156. */
    vacuumStated: integer('vacuum_stated').notNull(),
    downToLevel: integer('down_to_level').notNull(),
    /** Records that state a hold, and those of them that made one. */
    holdStated: integer('hold_stated').notNull(),
    held: integer('held').notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.dimension, t.month, t.key] }),
    companyPolicy(),
    // Sums over everybody's records are not one technician's to see.
    pgPolicy('not_for_a_technician', {
      as: 'restrictive',
      for: 'all',
      using: sql`${setting('technician_id')} is null`,
    }),
  ],
);
