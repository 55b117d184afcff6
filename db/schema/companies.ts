import { sql } from 'drizzle-orm';
import { jsonb, pgPolicy, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { DATABASE_ROLES } from '@/db/cluster/urls';
import { DISPLAY_UNITS } from '@/lib/vocabulary';
import { companyId, companyPolicy, createdAt, setting } from './columns';

/** A contractor: the tenant that every other row belongs to. */
export const companies = pgTable(
  'companies',
  {
    id: uuid('id').primaryKey().defaultRandom(),
    name: text('name').notNull(),
    /** IANA name; local dates and months of records are in this zone. */
    timeZone: text('time_zone').notNull().default('America/New_York'),
    massUnit: text('mass_unit', { enum: DISPLAY_UNITS }).notNull().default('lb'),
    createdAt: createdAt(),
  },
  () => [
    pgPolicy('of_company', {
      for: 'all',
      using: sql`id = ${setting('company_id')}::uuid`,
      withCheck: sql`id = ${setting('company_id')}::uuid`,
    }),
    // The command line finds a company by its name.
    pgPolicy('by_name', { for: 'select', using: sql`name = ${setting('company_name')}` }),
    // A person sees the names of the companies he belongs to before one is chosen.
    pgPolicy('of_member', {
      for: 'select',
      using: sql`id in (select m.company_id from memberships m where m.person_id = ${setting('person_id')}::uuid)`,
    }),
    // Background work asks at its start which companies there are; requests cannot. A name of a role that does not exist
    // is only a text that nobody is called.
    pgPolicy('for_upkeep', {
      for: 'select',
      using: sql`${setting('upkeep')} = 'companies' and current_user = ${sql.raw(`'${DATABASE_ROLES.job}'`)}`,
    }),
  ],
);

/** Settings of a company by key; the shape of each value is a zod schema beside its use. */
export const settings = pgTable(
  'settings',
  {
    companyId: companyId().references(() => companies.id, { onDelete: 'cascade' }),
    key: text('key').notNull(),
    value: jsonb('value').notNull(),
  },
  (t) => [primaryKey({ columns: [t.companyId, t.key] }), companyPolicy()],
);
