import 'server-only';
import { and, desc, eq, gte, sql } from 'drizzle-orm';
import { importRows, imports } from '@/db/schema/imports';
import { recoveries as r } from '@/db/schema/recoveries';
import { may } from '@/lib/auth/permissions';
import { formatList } from '@/lib/format';
import { daysBefore } from '../period';
import type { WaitingKind } from './kind';

/** Older refusals were seen and left, or nobody will mend them any more. */
const REACH_DAYS = 90;

// A mended row comes in under its ticket number, by another file or by hand.
const stillMissing = sql`not exists (select from ${r} where ${r.companyId} = ${importRows.companyId} and ${r.recordRef} = ${importRows.recordRef})`;

/** Rows of taken-in files that were refused, and whose ticket is still not among the records. */
export const refusedRows: WaitingKind = {
  kind: 'refused-rows',
  concerns: (role) => may(role, 'imports:manage'),
  find: async (tx, { today }) => {
    const files = await tx
      .select({ id: imports.id, fileName: imports.fileName, rows: sql<number>`count(*)`.mapWith(Number) })
      .from(imports)
      .innerJoin(importRows, and(eq(importRows.companyId, imports.companyId), eq(importRows.importId, imports.id)))
      .where(
        and(
          eq(imports.status, 'done'),
          eq(imports.dryRun, false),
          gte(imports.createdAt, daysBefore(today, REACH_DAYS)),
          eq(importRows.outcome, 'rejected'),
          stillMissing,
        ),
      )
      .groupBy(imports.companyId, imports.id)
      .orderBy(desc(imports.createdAt));
    const [newest] = files;
    if (!newest) return null;
    const count = files.reduce((sum, { rows }) => sum + rows, 0);
    return {
      count,
      what:
        count === 1
          ? 'row was refused and is still not among the records.'
          : 'rows were refused and are still not among the records.',
      why: `Of ${formatList(files.map(({ fileName }) => fileName))}. Each comes back with its reason, to be mended and handed in again.`,
      verb: files.length === 1 ? 'See the reasons' : 'Open the newest file',
      href: `/imports/${newest.id}`,
    };
  },
};
