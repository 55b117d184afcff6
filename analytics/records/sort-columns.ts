import 'server-only';
import { type SQL, sql } from 'drizzle-orm';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import type { SortKey } from './constants';

/** A column as the database compares it. `type` is what a cursor's text is cast back to. */
export type SortColumn = { value: SQL; type: 'date' | 'text' | 'numeric' | 'float8'; nullable: boolean };

/** Letters as people order them, and digits by their worth: RTU-2 before RTU-10. */
const inReadingOrder = (column: SQL): SQL => sql`(${column} collate reading_order)`;

// The table and the view share names of columns: in a join only the qualified ones are clear.
const fact = (name: string): SQL => sql`${f}.${sql.identifier(name)}`;

const text = (name: string, nullable = false): SortColumn => ({
  value: inReadingOrder(fact(name)),
  type: 'text',
  nullable,
});

/** Where each sort key stands in the facts. */
export const SORT_COLUMNS: Record<SortKey, SortColumn> = {
  recoveredOn: { value: fact('recovered_on'), type: 'date', nullable: false },
  recordRef: text('record_ref'),
  technician: text('technician'),
  site: text('site'),
  appliance: text('appliance'),
  branch: text('branch', true),
  category: text('category', true),
  jobType: text('job_type', true),
  refrigerant: text('refrigerant'),
  recoveredMass: { value: fact('recovered_mass_kg'), type: 'numeric', nullable: false },
  fullCharge: { value: fact('full_charge_kg'), type: 'numeric', nullable: false },
  yield: { value: fact('recovery_yield'), type: 'float8', nullable: false },
  cylinder: text('cylinder', true),
};
