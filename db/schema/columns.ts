import { sql } from 'drizzle-orm';
import { numeric, pgPolicy, timestamp, uuid } from 'drizzle-orm/pg-core';

/** The company every tenant row and every key begins with. */
export const companyId = () => uuid('company_id').notNull();

/** An instant that the database fills in. */
export const createdAt = () => timestamp('created_at', { withTimezone: true, mode: 'string' }).notNull().defaultNow();

/** A mass in kilograms, exact to the microgram; 1 lb = 0.45359237 kg fits without rounding. */
export const massKg = (name: string) => numeric(name, { precision: 16, scale: 9 });

/** A pressure in kilopascals. */
export const pressureKpa = (name: string) => numeric(name, { precision: 12, scale: 6 });

/** Reads a setting of the current transaction; unset and reset settings both read as NULL, and so match no row. */
export const setting = (name: string) => sql.raw(`(select nullif(current_setting('app.${name}', true), ''))`);

const ofCompany = sql`company_id = ${setting('company_id')}::uuid`;

/** The policy of a tenant table: only rows of the company that the transaction was opened for. */
export const companyPolicy = () =>
  pgPolicy('of_company', { as: 'permissive', for: 'all', using: ofCompany, withCheck: ofCompany });

/** What follows from everybody's records is not one technician's to see. */
export const notForATechnician = () =>
  pgPolicy('not_for_a_technician', {
    as: 'restrictive',
    for: 'all',
    using: sql`${setting('technician_id')} is null`,
  });
