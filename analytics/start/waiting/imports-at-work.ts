import 'server-only';
import { inArray } from 'drizzle-orm';
import { imports } from '@/db/schema/imports';
import { may } from '@/lib/auth/permissions';
import { formatList } from '@/lib/format';
import type { WaitingKind } from './kind';

/** Files that are being read or taken in: figures may change when they are done. */
export const importsAtWork: WaitingKind = {
  kind: 'imports-at-work',
  concerns: (role) => may(role, 'imports:manage'),
  find: async (tx) => {
    const files = await tx
      .select({ fileName: imports.fileName })
      .from(imports)
      .where(inArray(imports.status, ['queued', 'running']));
    if (!files.length) return null;
    return {
      count: files.length,
      what: files.length === 1 ? 'file is being read.' : 'files are being read.',
      why: `${formatList(files.map(({ fileName }) => fileName))}. Figures change when that is done.`,
      verb: 'See how far',
      href: '/imports',
    };
  },
};
