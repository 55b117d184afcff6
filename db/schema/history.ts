import { bigint, index, jsonb, pgTable, primaryKey, text, timestamp, uuid } from 'drizzle-orm/pg-core';
import { companyId, companyPolicy } from './columns';

/**
 * Who changed what, before and after. Written by trigger in the same transaction, append-only; each entry carries a
 * hash over its content and the hash before it (see the guards migration).
 */
export const history = pgTable(
  'history',
  {
    companyId: companyId(),
    entryNo: bigint('entry_no', { mode: 'number' }).notNull(),
    changedAt: timestamp('changed_at', { withTimezone: true, mode: 'string' }).notNull(),
    tableName: text('table_name').notNull(),
    rowId: uuid('row_id').notNull(),
    action: text('action', { enum: ['insert', 'update', 'delete'] }).notNull(),
    actor: text('actor').notNull(),
    reason: text('reason'),
    before: jsonb('before').$type<Record<string, unknown>>(),
    after: jsonb('after').$type<Record<string, unknown>>(),
    hash: text('hash').notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.entryNo] }),
    index('history_by_row').on(t.companyId, t.tableName, t.rowId, t.entryNo),
    companyPolicy(),
  ],
);

/** The end of each company's chain; locked while entries are added, so that the order is one. */
export const historyHeads = pgTable(
  'history_heads',
  {
    companyId: companyId().primaryKey(),
    entryNo: bigint('entry_no', { mode: 'number' }).notNull(),
    hash: text('hash').notNull(),
  },
  () => [companyPolicy()],
);
