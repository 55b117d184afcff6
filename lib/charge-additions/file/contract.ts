import { z } from 'zod';

const counts = {
  rowsRead: z.int().nonnegative(),
  added: z.int().nonnegative(),
  updated: z.int().nonnegative(),
  unchanged: z.int().nonnegative(),
  rejected: z.int().nonnegative(),
};

export const refusedRowSchema = z.object({
  line: z.int(),
  additionRef: z.string().nullable(),
  cells: z.array(z.string()),
  reasons: z.array(
    z.object({ column: z.string().nullable(), code: z.string(), message: z.string(), value: z.string() }),
  ),
});

/** What a file of charge additions did, or would do. */
export const additionImportSchema = z.object({
  /** Null for a preview: nothing was written. */
  id: z.uuid().nullable(),
  fileName: z.string(),
  dryRun: z.boolean(),
  ...counts,
  headers: z.array(z.string()),
  refused: z.array(refusedRowSchema),
  createdAt: z.string(),
  undoneAt: z.string().nullable(),
});
export type AdditionImport = z.output<typeof additionImportSchema>;

/** Files of additions that were taken in, the newest first. */
export const additionImportListSchema = z.object({
  items: z.array(
    z.object({
      id: z.uuid(),
      fileName: z.string(),
      ...counts,
      createdBy: z.string(),
      createdAt: z.string(),
      undoneAt: z.string().nullable(),
    }),
  ),
});
export type AdditionImportList = z.output<typeof additionImportListSchema>;

/** What an undo did; additions corrected since the import are kept. */
export const additionUndoSchema = z.object({
  id: z.uuid(),
  removed: z.int().nonnegative(),
  restored: z.int().nonnegative(),
  kept: z.array(z.object({ additionRef: z.string(), reason: z.string() })),
});
export type AdditionUndo = z.output<typeof additionUndoSchema>;
