import 'server-only';
import { and, desc, eq, type InferSelectModel, lt, or } from 'drizzle-orm';
import { z } from 'zod';
import type { Tx } from '@/db/client';
import { imports } from '@/db/schema/imports';
import { badInput, notFound } from '@/lib/errors';
import {
  type ImportList,
  type ImportView,
  importSchema,
  importSummarySchema,
  mappingSchema,
  readingSchema,
} from './contract';

export type ImportRecord = InferSelectModel<typeof imports>;

const iso = (instant: string | null) => (instant === null ? null : new Date(instant).toISOString());

/** One import of the company of the transaction; throws 404 when it is not there or the id is none. */
export const requireImport = async (tx: Tx, id: string, lock?: 'update'): Promise<ImportRecord> => {
  if (!z.uuid().safeParse(id).success) throw notFound('This import');
  const query = tx.select().from(imports).where(eq(imports.id, id));
  const [found] = await (lock ? query.for(lock) : query);
  if (!found) throw notFound('This import');
  return found;
};

const toListItem = (record: ImportRecord) => ({
  ...record,
  createdAt: new Date(record.createdAt).toISOString(),
  finishedAt: iso(record.finishedAt),
  undoneAt: iso(record.undoneAt),
});

/** An import as the API shows it. */
export const toImportView = (record: ImportRecord): ImportView =>
  importSchema.parse({
    ...toListItem(record),
    mapping: mappingSchema.parse(record.mapping),
    reading: readingSchema.nullable().parse(record.reading),
    summary: importSummarySchema.nullable().parse(record.summary),
  });

/** What a page of the list is asked by. */
export const importListQuery = z.object({
  cursor: z.string().optional(),
  limit: z.coerce.number().int().min(1).max(500).default(50),
});

const cursorSchema = z.tuple([z.iso.datetime({ offset: true }), z.uuid()]);

const toCursor = ({ createdAt, id }: ImportRecord) =>
  Buffer.from(JSON.stringify([createdAt.replace(' ', 'T').replace(/([+-]\d\d)$/, '$1:00'), id])).toString('base64url');

const fromCursor = (text: string): [string, string] => {
  try {
    return cursorSchema.parse(JSON.parse(Buffer.from(text, 'base64url').toString()));
  } catch {
    throw badInput([{ path: 'cursor', message: 'This is no cursor of this list.' }]);
  }
};

/** One page of the company's imports, newest first. */
export const listImports = async (tx: Tx, query: z.output<typeof importListQuery>): Promise<ImportList> => {
  const after = query.cursor === undefined ? undefined : fromCursor(query.cursor);
  const found = await tx
    .select()
    .from(imports)
    .where(after && or(lt(imports.createdAt, after[0]), and(eq(imports.createdAt, after[0]), lt(imports.id, after[1]))))
    .orderBy(desc(imports.createdAt), desc(imports.id))
    .limit(query.limit + 1);
  const items = found.slice(0, query.limit);
  const last = items.at(-1);
  return { items: items.map(toListItem), nextCursor: found.length > query.limit && last ? toCursor(last) : null };
};
