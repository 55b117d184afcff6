import { integer, jsonb, pgTable, primaryKey, text, timestamp, uuid } from 'drizzle-orm/pg-core';
import { companyId, companyPolicy } from './columns';

const instant = (name: string) => timestamp(name, { withTimezone: true, mode: 'string' });

/** What is usual at a company, as one renewal of all flags found it: flags point here instead of repeating it. */
export const flagBaselines = pgTable(
  'flag_baselines',
  {
    companyId: companyId(),
    id: uuid('id').notNull().defaultRandom(),
    /** Version and settings of the judging; another one judges everything anew. */
    judging: text('judging').notNull(),
    content: jsonb('content').notNull(),
    /** Records judged one by one since: many of them move what is usual, and everything is judged anew. */
    judgedSingly: integer('judged_singly').notNull().default(0),
    madeAt: instant('made_at').notNull().defaultNow(),
  },
  (t) => [primaryKey({ columns: [t.companyId, t.id] }), companyPolicy()],
);

/**
 * How the company's flags were last renewed: one row a company. Its changes stand in the history in place of those of
 * the flags themselves, which follow from records and judging, and so every renewal that changed a flag is a change.
 */
export const flagRenewals = pgTable(
  'flag_renewals',
  {
    companyId: companyId(),
    id: uuid('id').notNull().defaultRandom(),
    judging: text('judging').notNull(),
    baselineId: uuid('baseline_id').notNull(),
    /** Records judged, and what became of their flags. */
    records: integer('records').notNull(),
    added: integer('added').notNull(),
    changed: integer('changed').notNull(),
    gone: integer('gone').notNull(),
    renewedAt: instant('renewed_at').notNull().defaultNow(),
  },
  (t) => [primaryKey({ columns: [t.companyId] }), companyPolicy()],
);

/**
 * Records whose flags may no longer hold, written by trigger in the transaction that changes them (see the migration). A
 * recovery id of zeros stands for all records. `touches` tells a change that came while the record was being judged.
 */
export const flagsDue = pgTable(
  'flags_due',
  {
    companyId: companyId(),
    recoveryId: uuid('recovery_id').notNull(),
    touches: integer('touches').notNull().default(1),
  },
  (t) => [primaryKey({ columns: [t.companyId, t.recoveryId] }), companyPolicy()],
);
