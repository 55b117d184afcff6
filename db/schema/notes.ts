import { sql } from 'drizzle-orm';
import { check, date, index, integer, pgPolicy, pgTable, primaryKey, text, timestamp, uuid } from 'drizzle-orm/pg-core';
import { NOTE_LENGTH } from '@/lib/notes/limits';
import { companyId, companyPolicy, createdAt, setting } from './columns';

/** What a person knows about a day or a range of days and pins to it: why a month was unusual, what changed then. */
export const notes = pgTable(
  'notes',
  {
    companyId: companyId(),
    id: uuid('id').notNull().defaultRandom(),
    /** First and last local date, both included. */
    fromDay: date('from_day', { mode: 'string' }).notNull(),
    toDay: date('to_day', { mode: 'string' }).notNull(),
    text: text('text').notNull(),
    writtenBy: text('written_by').notNull(),
    createdAt: createdAt(),
    updatedAt: timestamp('updated_at', { withTimezone: true, mode: 'string' }).notNull().defaultNow(),
    /** Counts edits; a change names the version it saw. */
    version: integer('version').notNull().default(1),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    index('notes_by_day').on(t.companyId, t.fromDay),
    check('notes_days', sql`from_day <= to_day`),
    check('notes_text', sql`char_length(text) between 1 and ${sql.raw(String(NOTE_LENGTH))}`),
    companyPolicy(),
    // Notes speak of everybody's figures.
    pgPolicy('not_for_a_technician', {
      as: 'restrictive',
      for: 'all',
      using: sql`${setting('technician_id')} is null`,
    }),
  ],
);
