import { sql } from 'drizzle-orm';
import {
  check,
  date,
  doublePrecision,
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
import {
  APPLIANCE_CATEGORIES,
  CERTIFICATION_TYPES,
  DISPOSITIONS,
  JOB_TYPES,
  MASS_UNITS,
  VACUUM_UNITS,
} from '@/lib/vocabulary';
import { companyId, companyPolicy, createdAt, massKg, pressureKpa, setting } from './columns';
import { appliances, branches, cylinders, sites, technicians } from './places';
import { refrigerants } from './refrigerants';

// CASE and not OR: the planner takes an OR of a setting for a filter that leaves one row in fifty, and then loops where
// it should join.
const ofTechnician = sql`case when ${setting('technician_id')} is null then true else technician_id = ${setting('technician_id')}::uuid end`;

/** One pull of refrigerant out of one appliance into one cylinder, as the ticket tells it. */
export const recoveries = pgTable(
  'recoveries',
  {
    companyId: companyId(),
    id: uuid('id').notNull().defaultRandom(),
    /** The contractor's ticket number; the same ref again means the same record. */
    recordRef: text('record_ref').notNull(),
    /** Local date of the company; months are of this date. */
    recoveredOn: date('recovered_on', { mode: 'string' }).notNull(),
    /** The instant, when the ticket told a time of day. */
    recoveredAt: timestamp('recovered_at', { withTimezone: true, mode: 'string' }),
    recoveredMonth: date('recovered_month', { mode: 'string' })
      .notNull()
      .generatedAlwaysAs(sql`(date_trunc('month', recovered_on::timestamp))::date`),
    technicianId: uuid('technician_id').notNull(),
    siteId: uuid('site_id').notNull(),
    applianceId: uuid('appliance_id').notNull(),
    branchId: uuid('branch_id'),
    category: text('category', { enum: APPLIANCE_CATEGORIES }),
    jobType: text('job_type', { enum: JOB_TYPES }),
    refrigerant: text('refrigerant')
      .notNull()
      .references(() => refrigerants.designation),
    nameplateChargeKg: massKg('nameplate_charge_kg').notNull(),
    addedChargeKg: massKg('added_charge_kg').notNull().default('0'),
    /** Full charge = nameplate + added (long line sets). */
    fullChargeKg: massKg('full_charge_kg').notNull().generatedAlwaysAs(sql`nameplate_charge_kg + added_charge_kg`),
    startWeightKg: massKg('start_weight_kg'),
    endWeightKg: massKg('end_weight_kg'),
    recoveredMassKg: massKg('recovered_mass_kg').notNull(),
    /** Recovered mass over full charge, kept because every figure that judges asks for it in order. */
    recoveryYield: doublePrecision('recovery_yield')
      .notNull()
      .generatedAlwaysAs(sql`(recovered_mass_kg / (nameplate_charge_kg + added_charge_kg))::double precision`),
    massUnit: text('mass_unit', { enum: MASS_UNITS }).notNull(),
    /** Absolute pressure at the end of the pull; the reading as typed stands in `entered`. */
    finalVacuumKpaAbs: pressureKpa('final_vacuum_kpa_abs'),
    vacuumUnit: text('vacuum_unit', { enum: VACUUM_UNITS }),
    holdMinutes: doublePrecision('hold_minutes'),
    /** Pressure regained during the hold. */
    holdRiseKpa: pressureKpa('hold_rise_kpa'),
    cylinderId: uuid('cylinder_id'),
    disposition: text('disposition', { enum: DISPOSITIONS }),
    manufacturedOn: date('manufactured_on', { mode: 'string' }),
    technicianCertification: text('technician_certification', { enum: CERTIFICATION_TYPES }),
    notes: text('notes'),
    /** The fields as they were typed, by column of the recovery file, units included. */
    entered: jsonb('entered').$type<Record<string, string>>().notNull().default({}),
    /** Columns of an imported file that the product has no field for, kept with the row. */
    extra: jsonb('extra').$type<Record<string, string>>().notNull().default({}),
    /** Why the record does not count in aggregates; NULL when it counts. */
    exclusion: text('exclusion', { enum: ['entry_error'] }),
    /** The import that last added or changed the record, and the row it came from. */
    importId: uuid('import_id'),
    importLine: integer('import_line'),
    /** Fingerprint of the last imported row: the same row again says nothing new, even after a correction. */
    sourceHash: text('source_hash'),
    /** Counts edits; a correction names the version it saw. */
    version: integer('version').notNull().default(1),
    createdAt: createdAt(),
    updatedAt: timestamp('updated_at', { withTimezone: true, mode: 'string' }).notNull().defaultNow(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    uniqueIndex('recoveries_record_ref').on(t.companyId, t.recordRef),
    foreignKey({ columns: [t.companyId, t.technicianId], foreignColumns: [technicians.companyId, technicians.id] }),
    foreignKey({ columns: [t.companyId, t.siteId], foreignColumns: [sites.companyId, sites.id] }),
    foreignKey({ columns: [t.companyId, t.applianceId], foreignColumns: [appliances.companyId, appliances.id] }),
    foreignKey({ columns: [t.companyId, t.branchId], foreignColumns: [branches.companyId, branches.id] }),
    foreignKey({ columns: [t.companyId, t.cylinderId], foreignColumns: [cylinders.companyId, cylinders.id] }),
    index('recoveries_by_date').on(t.companyId, t.recoveredOn, t.id),
    index('recoveries_by_appliance').on(t.companyId, t.applianceId, t.recoveredOn),
    index('recoveries_by_cylinder').on(t.companyId, t.cylinderId),
    index('recoveries_by_import').on(t.companyId, t.importId),
    index('recoveries_by_yield').on(t.companyId, t.recoveryYield).where(sql`exclusion is null`),
    index('recoveries_left_out').on(t.companyId, t.recoveredOn).where(sql`exclusion is not null`),
    // The covering indexes of what is kept ready (recoveries_by_month, recoveries_by_technician, recoveries_by_site) and
    // of the like jobs (recoveries_by_kind) stand in the migrations: Drizzle 0.45 cannot write INCLUDE.
    check('recoveries_masses', sql`nameplate_charge_kg > 0 and added_charge_kg >= 0 and recovered_mass_kg >= 0`),
    companyPolicy(),
    pgPolicy('of_technician', { as: 'restrictive', for: 'all', using: ofTechnician, withCheck: ofTechnician }),
  ],
);
