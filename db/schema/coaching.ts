import { sql } from 'drizzle-orm';
import {
  check,
  date,
  foreignKey,
  index,
  integer,
  pgPolicy,
  pgTable,
  primaryKey,
  text,
  timestamp,
  uuid,
} from 'drizzle-orm/pg-core';
import { COACHING_LENGTH } from '@/lib/coaching/limits';
import { companyId, companyPolicy, createdAt, setting } from './columns';
import { technicians } from './places';

const ofTechnician = sql`case when ${setting('technician_id')} is null then true else technician_id = ${setting('technician_id')}::uuid end`;
const most = sql.raw(String(COACHING_LENGTH));

/** What a trainer agreed with a technician on a day, and what came of it. The technician reads his own. */
export const coaching = pgTable(
  'coaching',
  {
    companyId: companyId(),
    id: uuid('id').notNull().defaultRandom(),
    technicianId: uuid('technician_id').notNull(),
    /** Local date from which a change is looked for. */
    startedOn: date('started_on', { mode: 'string' }).notNull(),
    plan: text('plan').notNull(),
    /** Local date on which it was looked at again; NULL while it runs. */
    endedOn: date('ended_on', { mode: 'string' }),
    outcome: text('outcome'),
    writtenBy: text('written_by').notNull(),
    createdAt: createdAt(),
    updatedAt: timestamp('updated_at', { withTimezone: true, mode: 'string' }).notNull().defaultNow(),
    /** Counts edits; a change names the version it saw. */
    version: integer('version').notNull().default(1),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.technicianId], foreignColumns: [technicians.companyId, technicians.id] }),
    index('coaching_by_technician').on(t.companyId, t.technicianId, t.startedOn),
    check('coaching_days', sql`started_on <= ended_on`),
    check('coaching_outcome', sql`(ended_on is null) = (outcome is null)`),
    check(
      'coaching_words',
      sql`char_length(plan) between 1 and ${most} and char_length(outcome) between 1 and ${most}`,
    ),
    companyPolicy(),
    pgPolicy('of_technician', { as: 'restrictive', for: 'all', using: ofTechnician, withCheck: ofTechnician }),
  ],
);
