import 'server-only';
import { and, desc, eq, isNotNull } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { imports } from '@/db/schema/imports';
import type { Start } from './contract';

/** The file that was taken in last and still stands; null when there is none. */
export const getLastFile = async (tx: Tx): Promise<Start['lastFile']> => {
  const [last] = await tx
    .select({
      importId: imports.id,
      fileName: imports.fileName,
      finishedAt: imports.finishedAt,
      added: imports.added,
      updated: imports.updated,
      rejected: imports.rejected,
    })
    .from(imports)
    .where(and(eq(imports.status, 'done'), eq(imports.dryRun, false), isNotNull(imports.finishedAt)))
    .orderBy(desc(imports.finishedAt))
    .limit(1);
  if (!last?.finishedAt) return null;
  const { finishedAt, ...file } = last;
  return { ...file, takenInAt: new Date(finishedAt).toISOString() };
};
