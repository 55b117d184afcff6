import { sql } from 'drizzle-orm';
import {
  check,
  date,
  foreignKey,
  index,
  integer,
  jsonb,
  pgPolicy,
  pgTable,
  primaryKey,
  text,
  timestamp,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';
import { ADDITION_REASONS, LEAK_RATE_METHODS, MASS_UNITS } from '@/lib/vocabulary';
import { companyId, companyPolicy, createdAt, massKg, setting } from './columns';
import { companies } from './companies';
import { appliances, sites } from './places';

const instant = (name: string) => timestamp(name, { withTimezone: true, mode: 'string' });

/** What is said of a whole appliance or site is no business of a technician's own records. */
const notForTechnician = () =>
  pgPolicy('not_for_a_technician', {
    as: 'restrictive',
    for: 'all',
    using: sql`${setting('technician_id')} is null`,
  });

/** A file of charge additions that was taken in, and what it did, so that it can be taken back. */
export const additionImports = pgTable(
  'addition_imports',
  {
    companyId: companyId().references(() => companies.id, { onDelete: 'cascade' }),
    id: uuid('id').notNull().defaultRandom(),
    fileName: text('file_name').notNull(),
    fileSha256: text('file_sha256').notNull(),
    rowsRead: integer('rows_read').notNull(),
    added: integer('added').notNull(),
    updated: integer('updated').notNull(),
    unchanged: integer('unchanged').notNull(),
    rejected: integer('rejected').notNull(),
    /** Refused rows: line, cells as they came, reasons. */
    refused: jsonb('refused').notNull(),
    /** What was added or changed, with the row before and the version after. */
    ledger: jsonb('ledger').notNull(),
    createdBy: text('created_by').notNull(),
    createdAt: createdAt(),
    undoneAt: instant('undone_at'),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    index('addition_imports_by_time').on(t.companyId, t.createdAt),
    companyPolicy(),
    notForTechnician(),
  ],
);

/** Refrigerant put into an appliance: what leak rates are computed from. */
export const chargeAdditions = pgTable(
  'charge_additions',
  {
    companyId: companyId(),
    id: uuid('id').notNull().defaultRandom(),
    /** The contractor's own number of it; the same ref again means the same addition. */
    additionRef: text('addition_ref'),
    applianceId: uuid('appliance_id').notNull(),
    /** Local date of the company. */
    addedOn: date('added_on', { mode: 'string' }).notNull(),
    addedChargeKg: massKg('added_charge_kg').notNull(),
    massUnit: text('mass_unit', { enum: MASS_UNITS }).notNull(),
    /** The mass as it was typed, in `massUnit`. */
    enteredMass: text('entered_mass').notNull(),
    reason: text('reason', { enum: ADDITION_REASONS }).notNull(),
    /** The day on which a follow-up test showed all leaks repaired. */
    leaksVerifiedOn: date('leaks_verified_on', { mode: 'string' }),
    notes: text('notes'),
    importId: uuid('import_id'),
    /** Fingerprint of the imported row; a correction by hand leaves it as it is. */
    sourceHash: text('source_hash'),
    createdBy: text('created_by').notNull(),
    createdAt: createdAt(),
    updatedAt: instant('updated_at').notNull().defaultNow(),
    /** Counts edits; a change names the version it saw. */
    version: integer('version').notNull().default(1),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    uniqueIndex('charge_additions_ref').on(t.companyId, t.additionRef),
    index('charge_additions_by_appliance').on(t.companyId, t.applianceId, t.addedOn),
    foreignKey({
      columns: [t.companyId, t.applianceId],
      foreignColumns: [appliances.companyId, appliances.id],
    }),
    check('charge_additions_mass', sql`added_charge_kg > 0`),
    check('charge_additions_verified', sql`leaks_verified_on >= added_on`),
    companyPolicy(),
    notForTechnician(),
  ],
);

/** By which method of 40 CFR 82.152 the leak rates of a site are computed; without a row nobody has chosen yet. */
export const siteLeakMethods = pgTable(
  'site_leak_methods',
  {
    companyId: companyId(),
    id: uuid('id').notNull().defaultRandom(),
    siteId: uuid('site_id').notNull(),
    method: text('method', { enum: LEAK_RATE_METHODS }).notNull(),
    chosenBy: text('chosen_by').notNull(),
    updatedAt: instant('updated_at').notNull().defaultNow(),
    version: integer('version').notNull().default(1),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    uniqueIndex('site_leak_methods_site').on(t.companyId, t.siteId),
    foreignKey({ columns: [t.companyId, t.siteId], foreignColumns: [sites.companyId, sites.id] }),
    companyPolicy(),
    notForTechnician(),
  ],
);
