import { z } from 'zod';
import { IMPORT_STATUSES, MASS_UNITS, VACUUM_UNITS } from '@/lib/vocabulary';
import { DATE_ORDERS, DECIMAL_MARKS, RECOVERY_FIELDS } from './fields';

/** What a person tells about a file; everything left out is decided from the evidence in the file, or asked. */
export const mappingSchema = z.strictObject({
  /** Which header holds which field; null leaves the field out. */
  columns: z.partialRecord(z.enum(RECOVERY_FIELDS), z.string().nullable()).optional(),
  encoding: z.enum(['utf-8', 'utf-16le', 'utf-16be', 'windows-1252']).optional(),
  delimiter: z.enum([',', ';', '\t']).optional(),
  /** By header. */
  dateOrders: z.record(z.string(), z.enum(DATE_ORDERS)).optional(),
  /** By header. */
  decimalMarks: z.record(z.string(), z.enum(DECIMAL_MARKS)).optional(),
  /** For files whose rows do not name their unit. */
  massUnit: z.enum(MASS_UNITS).optional(),
  vacuumUnit: z.enum(VACUUM_UNITS).optional(),
  /** Take the file's word also for records that were corrected by hand after their import. */
  overwriteCorrections: z.boolean().optional(),
});
export type Mapping = z.infer<typeof mappingSchema>;

const evidenced = <Value extends z.ZodType>(value: Value) => z.object({ value, evidence: z.string() });

/** How one column of the file is read, and why. */
export const columnReadingSchema = z.object({
  header: z.string(),
  field: z.enum(RECOVERY_FIELDS).nullable(),
  /** Who said so: the person now, the person last time, or the name of the column. */
  fieldFrom: z.enum(['told', 'remembered', 'name', 'none']),
  dateOrder: evidenced(z.enum(DATE_ORDERS)).nullable(),
  decimalMark: evidenced(z.enum(DECIMAL_MARKS)).nullable(),
  unit: evidenced(z.string()).nullable(),
  filled: z.number().int(),
  examples: z.array(z.string()),
});
export type ColumnReading = z.infer<typeof columnReadingSchema>;

/** What only the person can say; while one stands open, no row is taken. */
export const questionSchema = z.object({
  about: z.enum(['columns', 'dateOrder', 'decimalMark', 'massUnit', 'vacuumUnit']),
  /** The column that is asked about. */
  header: z.string().nullable(),
  /** The field that no column holds yet; the choices are headers. */
  field: z.enum(RECOVERY_FIELDS).nullable(),
  sentence: z.string(),
  choices: z.array(z.object({ value: z.string(), label: z.string() })),
});
export type Question = z.infer<typeof questionSchema>;

/** How the whole file is read. */
export const readingSchema = z.object({
  format: z.enum(['csv', 'xlsx']),
  encoding: evidenced(z.string()).nullable(),
  delimiter: evidenced(z.string()).nullable(),
  /** Line that names the columns; what stands above it is passed over as a title. */
  headerLine: z.number().int(),
  columns: z.array(columnReadingSchema),
  questions: z.array(questionSchema),
});
export type Reading = z.infer<typeof readingSchema>;

const names = z.object({ count: z.number().int(), examples: z.array(z.string()) });

/** What came, or would come, of the rows. */
export const importSummarySchema = z.object({
  rejectedByReason: z.array(
    z.object({
      code: z.string(),
      column: z.string().nullable(),
      message: z.string(),
      count: z.number().int(),
      examples: z.array(z.object({ line: z.number().int(), recordRef: z.string().nullable(), value: z.string() })),
    }),
  ),
  /** Names that the file brings and the company does not know yet. */
  newNames: z.object({ technicians: names, sites: names, appliances: names, branches: names, cylinders: names }),
  changes: z.array(
    z.object({
      line: z.number().int(),
      recordRef: z.string(),
      fields: z.array(z.object({ field: z.string(), before: z.string().nullable(), after: z.string().nullable() })),
    }),
  ),
  /** Records that an undo left as they are, because somebody changed them since. */
  keptByUndo: z.array(z.object({ recordRef: z.string(), reason: z.string() })),
});
export type ImportSummary = z.infer<typeof importSummarySchema>;

export const importSchema = z.object({
  id: z.uuid(),
  fileName: z.string(),
  fileSize: z.number(),
  status: z.enum(IMPORT_STATUSES),
  dryRun: z.boolean(),
  rowsRead: z.number().int(),
  rowsTotal: z.number().int().nullable(),
  added: z.number().int(),
  updated: z.number().int(),
  unchanged: z.number().int(),
  rejected: z.number().int(),
  failure: z.string().nullable(),
  createdAt: z.string(),
  finishedAt: z.string().nullable(),
  undoneAt: z.string().nullable(),
  mapping: mappingSchema,
  reading: readingSchema.nullable(),
  summary: importSummarySchema.nullable(),
});
export type ImportView = z.infer<typeof importSchema>;

/** GET /api/imports: newest first. */
export const importListSchema = z.object({
  items: z.array(importSchema.omit({ reading: true, summary: true, mapping: true })),
  nextCursor: z.string().nullable(),
});
export type ImportList = z.infer<typeof importListSchema>;

/** Body of preview and apply; without a mapping the one told before holds. */
export const readAgainSchema = z.strictObject({ mapping: mappingSchema.optional() });

/*
 * POST /api/imports                    multipart file, mapping (JSON), dryRun=true   → 202 { id }
 * GET  /api/imports                    ?cursor&limit                                 → importListSchema
 * GET  /api/imports/{id}                                                             → importSchema
 * POST /api/imports/{id}/preview       { mapping }  reads the file again, changes no record  → 202 { id }
 * POST /api/imports/{id}/apply         { mapping? } takes a previewed file in        → 202 { id }
 * POST /api/imports/{id}/undo                                                        → 200 importSchema (202 while it goes on)
 * GET  /api/imports/{id}/rejected.csv  refused rows as they came, with a reason column
 */
