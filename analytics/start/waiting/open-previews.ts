import 'server-only';
import { and, desc, eq, gte } from 'drizzle-orm';
import { imports } from '@/db/schema/imports';
import { may } from '@/lib/auth/permissions';
import { formatList } from '@/lib/format';
import { latelyFrom } from '../period';
import type { WaitingKind } from './kind';

/** Files that were read for a preview and neither taken in nor read again since. */
export const openPreviews: WaitingKind = {
  kind: 'open-previews',
  concerns: (role) => may(role, 'imports:manage'),
  find: async (tx, { today }) => {
    const files = await tx
      .select({ id: imports.id, fileName: imports.fileName })
      .from(imports)
      .where(and(eq(imports.status, 'done'), eq(imports.dryRun, true), gte(imports.createdAt, latelyFrom(today))))
      .orderBy(desc(imports.createdAt));
    const [newest] = files;
    if (!newest) return null;
    return {
      count: files.length,
      what: files.length === 1 ? 'file has been read but not taken in.' : 'files have been read but not taken in.',
      why: `${formatList(files.map(({ fileName }) => fileName))}: no record has changed yet.`,
      verb: files.length === 1 ? 'Look at the preview' : 'Look at the newest',
      href: `/imports/${newest.id}`,
    };
  },
};
