import 'server-only';
import { and, sql } from 'drizzle-orm';
import { factFigures, habitFigures, toGram } from '@/analytics/fact-figures';
import { monthsBefore } from '@/analytics/scope-address';
import { inScope } from '@/analytics/scope-query';
import type { Tx } from '@/db/client';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { lowRecoveries as low } from '@/db/views/yield-limits';
import type { MonthFigures, Start } from './contract';

/** Records that count and those left out, and the days they lie between. */
export const getReach = async (
  tx: Tx,
  today: string,
): Promise<Pick<Start, 'recoveries' | 'excluded' | 'firstOn' | 'lastOn'> & { lastMonthBefore: string | null }> => {
  const [row] = await tx
    .select({
      recoveries: factFigures.recoveries,
      excluded: factFigures.excluded,
      firstOn: sql<string | null>`min(${f.recoveredOn})`,
      lastOn: sql<string | null>`max(${f.recoveredOn})`,
      lastMonthBefore: sql<
        string | null
      >`to_char(max(${f.recoveredOn}) filter (where ${f.recoveredOn} < date_trunc('month', ${today}::date)), 'YYYY-MM')`,
    })
    .from(f);
  if (!row) throw new Error('A sum without groups has one row');
  return row;
};

const figuresOf = async (tx: Tx, month: string): Promise<MonthFigures> => {
  const { recoveredMass, recoveries, totalYield, medianYield, co2e } = factFigures;
  const [row] = await tx
    .select({ recoveredMass, recoveries, totalYield, medianYield, co2e, ...habitFigures })
    .from(f)
    .where(inScope({ from: month, to: month }));
  if (!row) throw new Error('A sum without groups has one row');
  return row;
};

/** A month with the same one a year before, where that has records; `whole` is told by who knows which month runs. */
export const getLatest = async (tx: Tx, month: string, whole: boolean): Promise<NonNullable<Start['latest']>> => {
  const now = await figuresOf(tx, month);
  const before = whole ? await figuresOf(tx, monthsBefore(month, 12)) : null;
  return { month, whole, now, yearBefore: before?.recoveries ? before : null };
};

/**
 * What a month's recoveries far below like jobs fall short of the median of their like jobs: the sum of (median yield -
 * yield) x full charge. Says nothing of the reason: an appliance may have leaked before anybody came.
 */
export const getShortfall = async (tx: Tx, month: string): Promise<Start['shortfall']> => {
  const [row] = await tx
    .select({
      recoveries: sql<number>`count(*)`.mapWith(Number),
      mass: toGram(sql`coalesce(sum((${low.medianYield} - ${low.recoveryYield}) * ${f.fullChargeKg}), 0)`),
    })
    .from(low)
    .innerJoin(f, and(sql`${f.companyId} = ${low.companyId}`, sql`${f.id} = ${low.recoveryId}`))
    .where(inScope({ from: month, to: month }));
  return row ?? null;
};
