import {
  bigint,
  boolean,
  customType,
  foreignKey,
  index,
  integer,
  jsonb,
  pgTable,
  primaryKey,
  text,
  timestamp,
  uuid,
} from 'drizzle-orm/pg-core';
import { IMPORT_OUTCOMES, IMPORT_STATUSES } from '@/lib/vocabulary';
import { companyId, companyPolicy, createdAt } from './columns';
import { companies } from './companies';

const instant = (name: string) => timestamp(name, { withTimezone: true, mode: 'string' });
const bytea = customType<{ data: Buffer }>({ dataType: () => 'bytea' });

/** A file that was handed in, what was decided about its columns, and what became of it. */
export const imports = pgTable(
  'imports',
  {
    companyId: companyId().references(() => companies.id, { onDelete: 'cascade' }),
    id: uuid('id').notNull().defaultRandom(),
    fileName: text('file_name').notNull(),
    fileSize: bigint('file_size', { mode: 'number' }).notNull(),
    fileSha256: text('file_sha256').notNull(),
    status: text('status', { enum: IMPORT_STATUSES }).notNull().default('queued'),
    /** A preview reads the whole file and changes no record. */
    dryRun: boolean('dry_run').notNull().default(false),
    /** What the person told about the columns; the rest is decided from evidence. */
    mapping: jsonb('mapping').notNull().default({}),
    /** What was found in the file and how each column is read, with the evidence. */
    reading: jsonb('reading'),
    /** Identifies the header row, so that a mapping is remembered for the next file like it. */
    headerKey: text('header_key'),
    rowsRead: integer('rows_read').notNull().default(0),
    rowsTotal: integer('rows_total'),
    added: integer('added').notNull().default(0),
    updated: integer('updated').notNull().default(0),
    unchanged: integer('unchanged').notNull().default(0),
    rejected: integer('rejected').notNull().default(0),
    /** Counts by reason with examples, and rows that an undo had to keep. */
    summary: jsonb('summary'),
    /** Why the whole import failed, in a sentence for the person. */
    failure: text('failure'),
    createdBy: text('created_by').notNull(),
    createdAt: createdAt(),
    startedAt: instant('started_at'),
    finishedAt: instant('finished_at'),
    undoneAt: instant('undone_at'),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    index('imports_by_time').on(t.companyId, t.createdAt),
    companyPolicy(),
  ],
);

/** The file as it came, in pieces: the queue can go on with it after any crash, on any server. */
export const importFileChunks = pgTable(
  'import_file_chunks',
  {
    companyId: companyId(),
    importId: uuid('import_id').notNull(),
    chunkNo: integer('chunk_no').notNull(),
    bytes: bytea('bytes').notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.importId, t.chunkNo] }),
    foreignKey({ columns: [t.companyId, t.importId], foreignColumns: [imports.companyId, imports.id] }).onDelete(
      'cascade',
    ),
    companyPolicy(),
  ],
);

/** What became of each row that was taken or refused. */
export const importRows = pgTable(
  'import_rows',
  {
    companyId: companyId(),
    importId: uuid('import_id').notNull(),
    /** Line of the file on which the row begins; the header is line 1. */
    line: integer('line').notNull(),
    outcome: text('outcome', { enum: IMPORT_OUTCOMES }).notNull(),
    recordRef: text('record_ref'),
    recoveryId: uuid('recovery_id'),
    /** Refused rows: the cells as they came. */
    cells: text('cells').array(),
    /** Refused rows: [{column, code, message}]. */
    reasons: jsonb('reasons'),
    /** Changed rows: the record as it was before, for the undo. */
    before: jsonb('before'),
    /** Version the record had after this import; a later edit makes the undo keep it. */
    versionAfter: integer('version_after'),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.importId, t.line] }),
    foreignKey({ columns: [t.companyId, t.importId], foreignColumns: [imports.companyId, imports.id] }).onDelete(
      'cascade',
    ),
    index('import_rows_by_recovery').on(t.companyId, t.recoveryId),
    companyPolicy(),
  ],
);

/** How a header row was mapped the last time. */
export const importMappings = pgTable(
  'import_mappings',
  {
    companyId: companyId().references(() => companies.id, { onDelete: 'cascade' }),
    headerKey: text('header_key').notNull(),
    mapping: jsonb('mapping').notNull(),
    updatedAt: instant('updated_at').notNull().defaultNow(),
  },
  (t) => [primaryKey({ columns: [t.companyId, t.headerKey] }), companyPolicy()],
);
