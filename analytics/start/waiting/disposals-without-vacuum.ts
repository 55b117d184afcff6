import 'server-only';
import { and, isNull, sql } from 'drizzle-orm';
import { monthsBefore } from '@/analytics/scope-address';
import { inScope } from '@/analytics/scope-query';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { searchString } from '@/lib/api/client';
import { may } from '@/lib/auth/permissions';
import { formatMonth } from '@/lib/format';
import type { WaitingKind } from './kind';

const REACH_MONTHS = 12;

/** Disposals whose record does not say how far the appliance was evacuated. */
export const disposalsWithoutVacuum: WaitingKind = {
  kind: 'disposals-without-vacuum',
  concerns: (role) => may(role, 'records:read'),
  find: async (tx, { today }) => {
    const scope = { from: monthsBefore(today.slice(0, 7), REACH_MONTHS), to: today };
    const [row] = await tx
      .select({ count: sql<number>`count(*)`.mapWith(Number) })
      .from(f)
      .where(and(inScope({ ...scope, jobType: ['disposal'] }), isNull(f.exclusion), isNull(f.downToLevel)));
    if (!row?.count) return null;
    return {
      count: row.count,
      what: row.count === 1 ? 'disposal states no final vacuum.' : 'disposals state no final vacuum.',
      why: `Since ${formatMonth(scope.from)}. 40 CFR 82.156 has the level reached, and checked, before an appliance is opened or disposed of; only the record can show it afterwards.`,
      verb: 'Open the records',
      href: `/records${searchString({ ...scope, jobType: 'disposal', lacks: 'vacuum', exclusion: 'none' })}`,
    };
  },
};
