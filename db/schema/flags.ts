import { sql } from 'drizzle-orm';
import {
  doublePrecision,
  foreignKey,
  index,
  jsonb,
  pgPolicy,
  pgTable,
  primaryKey,
  text,
  timestamp,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';
import { FLAG_DECISIONS, FLAG_RULES } from '@/lib/vocabulary';
import { companyId, companyPolicy, createdAt, massKg } from './columns';
import { flagBaselines } from './flag-renewal';
import { recoveries } from './recoveries';

const instant = (name: string) => timestamp(name, { withTimezone: true, mode: 'string' });

/** A technician sees the rows that hang on a row he may see; `CASE` as in the policy of the records. */
const visibleWith = (row: string) =>
  sql.raw(
    `case when (select nullif(current_setting('app.technician_id', true), '')) is null then true else exists (select from ${row}) end`,
  );

/**
 * A reason to look at a record: by which rule, how sure, on what evidence, judged by which baseline. Rule, certainty,
 * evidence and baseline are renewed in the background while a flag is open; a decided one keeps what was decided on.
 * `decision` repeats the last of flag_decisions, so that figures need one join.
 */
export const flags = pgTable(
  'flags',
  {
    companyId: companyId(),
    id: uuid('id').notNull().defaultRandom(),
    recoveryId: uuid('recovery_id').notNull(),
    rule: text('rule', { enum: FLAG_RULES }).notNull(),
    /** Probability that the record is bad in this way, 0 to 1. */
    certainty: doublePrecision('certainty').notNull(),
    /** What like jobs, or the likely meaning of the ticket, would have given; NULL where nothing says so. */
    expectedMassKg: massKg('expected_mass_kg'),
    /** The numbers that speak for it, by the name the rule gives them. */
    evidence: jsonb('evidence').$type<Record<string, unknown>>().notNull(),
    baselineId: uuid('baseline_id').notNull(),
    state: text('state', { enum: ['open', 'decided'] })
      .notNull()
      .default('open'),
    decision: text('decision', { enum: FLAG_DECISIONS }),
    decidedAt: instant('decided_at'),
    /** The member who is asked to look. His leaving takes the assignment away (see the migration). */
    assignedTo: uuid('assigned_to'),
    /** What whoever looks ought to know; a decision has a note of its own. */
    note: text('note'),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    uniqueIndex('flags_of_record').on(t.companyId, t.recoveryId, t.rule),
    index('flags_by_certainty').on(t.companyId, t.state, t.certainty, t.id),
    index('flags_by_baseline').on(t.companyId, t.baselineId),
    index('flags_that_count')
      .on(t.companyId, t.recoveryId)
      .where(sql`state = 'open' and certainty >= 0.5 and rule <> 'short_on_arrival'`),
    index('flags_that_excuse')
      .on(t.companyId, t.recoveryId)
      .where(sql`decision in ('leaked_before', 'known_low_charge')`),
    foreignKey({
      columns: [t.companyId, t.recoveryId],
      foreignColumns: [recoveries.companyId, recoveries.id],
    }).onDelete('cascade'),
    foreignKey({ columns: [t.companyId, t.baselineId], foreignColumns: [flagBaselines.companyId, flagBaselines.id] }),
    companyPolicy(),
    pgPolicy('of_technician', {
      as: 'restrictive',
      for: 'all',
      using: visibleWith('recoveries r where r.company_id = flags.company_id and r.id = flags.recovery_id'),
    }),
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
    /** The decision on another flag of the record that closed this one with it; reopening that one reopens this one. */
    followsId: uuid('follows_id'),
    decidedBy: text('decided_by').notNull(),
    decidedAt: instant('decided_at').notNull().defaultNow(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    index('flag_decisions_by_flag').on(t.companyId, t.flagId, t.decidedAt),
    foreignKey({ columns: [t.companyId, t.flagId], foreignColumns: [flags.companyId, flags.id] }).onDelete('cascade'),
    companyPolicy(),
    pgPolicy('of_technician', {
      as: 'restrictive',
      for: 'all',
      using: visibleWith('flags f where f.company_id = flag_decisions.company_id and f.id = flag_decisions.flag_id'),
    }),
  ],
);
