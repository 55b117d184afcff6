import {
  doublePrecision,
  foreignKey,
  index,
  jsonb,
  pgTable,
  primaryKey,
  text,
  timestamp,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';
import { FLAG_DECISIONS, FLAG_RULES } from '@/lib/vocabulary';
import { companyId, companyPolicy, createdAt } from './columns';
import { recoveries } from './recoveries';

/** A reason to look at a record: by which rule, how sure, on what evidence, judged by which baseline. */
export const flags = pgTable(
  'flags',
  {
    companyId: companyId(),
    id: uuid('id').notNull().defaultRandom(),
    recoveryId: uuid('recovery_id').notNull(),
    rule: text('rule', { enum: FLAG_RULES }).notNull(),
    /** Probability that the record is bad in this way, 0 to 1. */
    certainty: doublePrecision('certainty').notNull(),
    evidence: jsonb('evidence').notNull(),
    baseline: jsonb('baseline').notNull(),
    state: text('state', { enum: ['open', 'decided'] })
      .notNull()
      .default('open'),
    assignedTo: uuid('assigned_to'),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    uniqueIndex('flags_of_record').on(t.companyId, t.recoveryId, t.rule),
    index('flags_by_certainty').on(t.companyId, t.state, t.certainty),
    foreignKey({
      columns: [t.companyId, t.recoveryId],
      foreignColumns: [recoveries.companyId, recoveries.id],
    }).onDelete('cascade'),
    companyPolicy(),
  ],
);

/** Every decision ever taken on a flag; the last one holds, a reopening has no decision. */
export const flagDecisions = pgTable(
  'flag_decisions',
  {
    companyId: companyId(),
    id: uuid('id').notNull().defaultRandom(),
    flagId: uuid('flag_id').notNull(),
    decision: text('decision', { enum: FLAG_DECISIONS }),
    note: text('note'),
    decidedBy: text('decided_by').notNull(),
    decidedAt: timestamp('decided_at', { withTimezone: true, mode: 'string' }).notNull().defaultNow(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    index('flag_decisions_by_flag').on(t.companyId, t.flagId, t.decidedAt),
    foreignKey({ columns: [t.companyId, t.flagId], foreignColumns: [flags.companyId, flags.id] }).onDelete('cascade'),
    companyPolicy(),
  ],
);
