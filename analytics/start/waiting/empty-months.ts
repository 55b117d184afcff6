import 'server-only';
import { sql } from 'drizzle-orm';
import { monthsBefore } from '@/analytics/scope-address';
import { recoveries as r } from '@/db/schema/recoveries';
import { may } from '@/lib/auth/permissions';
import { formatList, formatMonth } from '@/lib/format';
import type { WaitingKind } from './kind';

const REACH_MONTHS = 24;
const MOST_NAMED = 4;

/** Whole months of the last two years, since the first record, in which not one recovery was written down. */
export const emptyMonths: WaitingKind = {
  kind: 'empty-months',
  concerns: (role) => role !== 'technician' && may(role, 'records:read'),
  find: async (tx, { role, today }) => {
    const running = `${today.slice(0, 7)}-01`;
    const earliest = `${monthsBefore(today.slice(0, 7), REACH_MONTHS)}-01`;
    const { rows } = await tx.execute<{ month: string }>(sql`
      select to_char(m, 'YYYY-MM') as month
      from generate_series(${earliest}::date, ${running}::date - 1, interval '1 month') m
      where m > (select min(${r.recoveredOn}) from ${r})
        and not exists (select from ${r} where ${r.recoveredOn} >= m and ${r.recoveredOn} < m + interval '1 month')
      order by m`);
    const [first] = rows;
    const last = rows.at(-1);
    if (!first || !last) return null;
    const names = formatList(
      rows.map(({ month }) => formatMonth(month)),
      MOST_NAMED,
    );
    const mayImport = may(role, 'imports:manage');
    return {
      count: rows.length,
      what: rows.length === 1 ? 'month has no record.' : 'months have no record.',
      why: `${names}. Either nothing was recovered, or the tickets are still elsewhere.`,
      verb: mayImport ? 'Bring in a file' : 'See the records around',
      href: mayImport ? '/imports' : `/records?from=${monthsBefore(first.month, 1)}&to=${monthsBefore(last.month, -1)}`,
    };
  },
};
