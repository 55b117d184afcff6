import 'server-only';
import { and, eq, sql } from 'drizzle-orm';
import { inScope } from '@/analytics/scope-query';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { lowRecoveries as low } from '@/db/views/yield-limits';
import { searchString } from '@/lib/api/client';
import { may } from '@/lib/auth/permissions';
import { latelyFrom } from '../period';
import type { WaitingKind } from './kind';

/** Recoveries of the last thirty days that lie far below their like jobs. */
export const lowRecoveries: WaitingKind = {
  kind: 'low-recoveries',
  concerns: (role) => may(role, 'flags:read'),
  find: async (tx, { today }) => {
    const period = { from: latelyFrom(today), to: today };
    const [row] = await tx
      .select({ count: sql<number>`count(*)`.mapWith(Number) })
      .from(low)
      .innerJoin(f, and(eq(f.companyId, low.companyId), eq(f.id, low.recoveryId)))
      .where(inScope(period));
    if (!row?.count) return null;
    return {
      count: row.count,
      what:
        row.count === 1
          ? 'recovery of the last 30 days lies far below like jobs.'
          : 'recoveries of the last 30 days lie far below like jobs.',
      why: 'A leak before anybody came, a short hold, a full cylinder or a slip of the pen: a reason to look, not a finding.',
      verb: 'Look at them',
      href: `/low-recoveries${searchString({ ...period, order: 'newest' })}`,
    };
  },
};
