import 'server-only';
import { and, desc, eq, gte } from 'drizzle-orm';
import { imports } from '@/db/schema/imports';
import { may } from '@/lib/auth/permissions';
import { formatList } from '@/lib/format';
import { latelyFrom } from '../period';
import type { WaitingKind } from './kind';

/** Files that could not be taken in at all. */
export const failedImports: WaitingKind = {
  kind: 'failed-imports',
  concerns: (role) => may(role, 'imports:manage'),
  find: async (tx, { today }) => {
    const files = await tx
      .select({ id: imports.id, fileName: imports.fileName, failure: imports.failure })
      .from(imports)
      .where(and(eq(imports.status, 'failed'), gte(imports.createdAt, latelyFrom(today))))
      .orderBy(desc(imports.createdAt));
    const [newest] = files;
    if (!newest) return null;
    const names = formatList(files.map(({ fileName }) => fileName));
    return {
      count: files.length,
      what: files.length === 1 ? 'file could not be taken in.' : 'files could not be taken in.',
      why: files.length === 1 && newest.failure ? `${names}: ${newest.failure}` : `${names}.`,
      verb: files.length === 1 ? 'Open it' : 'Open the newest',
      href: `/imports/${newest.id}`,
    };
  },
};
