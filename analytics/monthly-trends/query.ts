import 'server-only';
import { and, eq, sql } from 'drizzle-orm';
import type { Dimension, Scope } from '@/analytics/scope';
import { FACT_COLUMNS, inScope } from '@/analytics/scope-query';
import type { Tx } from '@/db/client';
import { flaggedRecoveries as flagged } from '@/db/views/flagged-recoveries';
import { recoveryFacts as f } from '@/db/views/recovery-facts';

import type { MonthlyTrends, MonthlyTrendsQuery } from './contract';
import { largestKeys, otherKeysOf } from './largest-keys';
import { sumsByMonth, sumsByRecord } from './months';
import { answeredByMonth, cutMonths, partialMonth, summedByMonth, yearBeforeScope } from './range';
import { keyOf, rowsByMonth, rowsByRecord } from './rows';
import { monthsAfter } from './series';

const toMonth = (firstDayOfMonth: string): string => firstDayOfMonth.slice(0, 7);

/** Flagged records in scope by month and key. */
const countFlagged = (tx: Tx, scope: Scope, by: Dimension) =>
  tx
    .select({ month: f.month, key: keyOf(FACT_COLUMNS[by]).as('key'), flagged: sql<number>`count(*)`.mapWith(Number) })
    .from(flagged)
    .innerJoin(f, and(eq(f.companyId, flagged.companyId), eq(f.id, flagged.recoveryId)))
    .where(inScope(scope))
    .groupBy(f.month, FACT_COLUMNS[by]);

/** What each month in scope comes to over all keys, and the whole of it. */
const getSums = async (tx: Tx, scope: Scope) => {
  const sums = await (summedByMonth(scope) ? sumsByMonth : sumsByRecord)(tx, scope);
  const months = sums.flatMap(({ month, medianYield, totalYield, excluded: _, ...figures }) =>
    month === null || medianYield === null || totalYield === null
      ? []
      : [{ ...figures, month: toMonth(month), medianYield, totalYield }],
  );
  return { months, total: sums.find((row) => row.month === null) };
};

/** The month of the company's first record; a month before it has no figures to compare with. */
const firstMonth = async (tx: Tx): Promise<string | null> => {
  // The first of the index of dates: behind a policy min() would read every record.
  const [first] = await tx.select({ on: f.recoveredOn }).from(f).orderBy(f.recoveredOn).limit(1);
  return first ? toMonth(first.on) : null;
};

/**
 * Recovered mass by month and one dimension, with its flags, totals and the masses of a year before. `now` and the
 * company's zone tell which month is still running.
 */
export const getMonthlyTrends = async (
  tx: Tx,
  { by, keys, ...scope }: MonthlyTrendsQuery,
  { now, timeZone }: { now: Date; timeZone: string },
): Promise<MonthlyTrends> => {
  const { named, others } = keys ? await largestKeys(tx, scope, by, keys) : { named: undefined, others: 0 };
  const grouped = await (answeredByMonth(scope, by) ? rowsByMonth : rowsByRecord)(tx, scope, by, named);
  const sums = await getSums(tx, scope);
  const flags = await countFlagged(tx, scope, by);
  const beforeScope = yearBeforeScope(scope);
  const earlier = beforeScope ? (await getSums(tx, beforeScope)).months : [];
  const begins = await firstMonth(tx);

  const flagged = new Map(flags.map((row) => [`${toMonth(row.month)} ${row.key}`, row.flagged]));
  const flaggedByMonth = new Map<string, number>();
  for (const row of flags)
    flaggedByMonth.set(toMonth(row.month), (flaggedByMonth.get(toMonth(row.month)) ?? 0) + row.flagged);

  // A month that the scope cuts stands in both: its year after is compared with the whole of it.
  const masses = new Map([...sums.months, ...earlier].map((row) => [row.month, row.recoveredMass]));
  const yearBefore = (month: string): number | null => {
    const then = monthsAfter(month, -12);
    return begins !== null && then >= begins ? (masses.get(then) ?? 0) : null;
  };

  const { total } = sums;
  const rows = grouped.flatMap(({ month, medianYield, ...row }) =>
    medianYield === null
      ? []
      : [{ ...row, month: toMonth(month), medianYield, flagged: flagged.get(`${toMonth(month)} ${row.key}`) ?? 0 }],
  );
  const months = sums.months.map((row) => ({
    ...row,
    flagged: flaggedByMonth.get(row.month) ?? 0,
    yearBefore: yearBefore(row.month),
  }));
  return {
    by,
    rows,
    otherKeys: otherKeysOf({ rows, months }, others),
    months,
    earlier,
    totals: {
      recoveredMass: total?.recoveredMass ?? 0,
      recoveries: total?.recoveries ?? 0,
      medianYield: total?.medianYield ?? null,
      totalYield: total?.totalYield ?? null,
      flagged: flags.reduce((sum, row) => sum + row.flagged, 0),
      co2e: total?.co2e ?? 0,
    },
    partialMonth: partialMonth(scope, now, timeZone),
    cutMonths: cutMonths(scope),
    excluded: total?.excluded ?? 0,
  };
};
