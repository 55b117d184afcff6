import { sql } from 'drizzle-orm';
import { boolean, date, foreignKey, index, pgTable, primaryKey, text, uniqueIndex, uuid } from 'drizzle-orm/pg-core';
import { APPLIANCE_CATEGORIES, CERTIFICATION_TYPES } from '@/lib/vocabulary';
import { companyId, companyPolicy, createdAt, massKg } from './columns';
import { companies } from './companies';
import { refrigerants } from './refrigerants';

const named = () => ({
  companyId: companyId().references(() => companies.id, { onDelete: 'cascade' }),
  id: uuid('id').notNull().defaultRandom(),
  name: text('name').notNull(),
  /** What two spellings of one name share: letters lowered, white space folded. */
  nameKey: text('name_key')
    .notNull()
    .generatedAlwaysAs(sql`lower(btrim(regexp_replace(normalize(name, NFC), '[[:space:]]+', ' ', 'g')))`),
  /** The import that created the row; undo takes the row back if nothing else uses it. */
  importId: uuid('import_id'),
  createdAt: createdAt(),
});

export const branches = pgTable('branches', named(), (t) => [
  primaryKey({ columns: [t.companyId, t.id] }),
  uniqueIndex('branches_name').on(t.companyId, t.nameKey),
  companyPolicy(),
]);

export const technicians = pgTable(
  'technicians',
  { ...named(), branchId: uuid('branch_id'), active: boolean('active').notNull().default(true) },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    uniqueIndex('technicians_name').on(t.companyId, t.nameKey),
    foreignKey({ columns: [t.companyId, t.branchId], foreignColumns: [branches.companyId, branches.id] }),
    companyPolicy(),
  ],
);

/** Certifications under 40 CFR 82.161; a card does not expire. */
export const technicianCertifications = pgTable(
  'technician_certifications',
  {
    companyId: companyId(),
    technicianId: uuid('technician_id').notNull(),
    type: text('type', { enum: CERTIFICATION_TYPES }).notNull(),
    cardNumber: text('card_number'),
    certifiedOn: date('certified_on', { mode: 'string' }),
    importId: uuid('import_id'),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.technicianId, t.type] }),
    foreignKey({
      columns: [t.companyId, t.technicianId],
      foreignColumns: [technicians.companyId, technicians.id],
    }).onDelete('cascade'),
    companyPolicy(),
  ],
);

export const sites = pgTable('sites', { ...named(), branchId: uuid('branch_id'), address: text('address') }, (t) => [
  primaryKey({ columns: [t.companyId, t.id] }),
  uniqueIndex('sites_name').on(t.companyId, t.nameKey),
  foreignKey({ columns: [t.companyId, t.branchId], foreignColumns: [branches.companyId, branches.id] }),
  companyPolicy(),
]);

/** A unit at a site. Two sites may both have an "RTU-1". */
export const appliances = pgTable(
  'appliances',
  {
    ...named(),
    siteId: uuid('site_id').notNull(),
    category: text('category', { enum: APPLIANCE_CATEGORIES }),
    refrigerant: text('refrigerant').references(() => refrigerants.designation),
    nameplateChargeKg: massKg('nameplate_charge_kg'),
    manufacturedOn: date('manufactured_on', { mode: 'string' }),
    /**
     * Whether it is of the residential and light commercial air-conditioning and heat pump subsector, which 40 CFR 84.106
     * leaves out; NULL: nobody has said.
     */
    lightCommercial: boolean('light_commercial'),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    uniqueIndex('appliances_name').on(t.companyId, t.siteId, t.nameKey),
    foreignKey({ columns: [t.companyId, t.siteId], foreignColumns: [sites.companyId, sites.id] }),
    index('appliances_import').on(t.companyId, t.importId),
    companyPolicy(),
  ],
);

/** A recovery cylinder; its serial is its name. */
export const cylinders = pgTable(
  'cylinders',
  {
    ...named(),
    refrigerant: text('refrigerant').references(() => refrigerants.designation),
    tareWeightKg: massKg('tare_weight_kg'),
    waterCapacityKg: massKg('water_capacity_kg'),
    specification: text('specification'),
    requalifiedOn: date('requalified_on', { mode: 'string' }),
    branchId: uuid('branch_id'),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    uniqueIndex('cylinders_name').on(t.companyId, t.nameKey),
    foreignKey({ columns: [t.companyId, t.branchId], foreignColumns: [branches.companyId, branches.id] }),
    index('cylinders_import').on(t.companyId, t.importId),
    companyPolicy(),
  ],
);
