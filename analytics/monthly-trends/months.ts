import 'server-only';
import { and, gte, isNotNull, lt, type SQLWrapper, sql } from 'drizzle-orm';
import { factFigures, habitFigures, toGram } from '@/analytics/fact-figures';
import { dayAfter, firstDay, isWhole, type Scope } from '@/analytics/scope';
import { inScope } from '@/analytics/scope-query';
import type { Tx } from '@/db/client';
import { middleYields as m } from '@/db/schema/summaries';
import { monthlyRecoveredMass as v } from '@/db/views/monthly-recovered-mass';
import { recoveryFacts as f } from '@/db/views/recovery-facts';

/** Figures over all keys: of one month (its first day), or of the whole scope where `month` is null. */
export type MonthSums = {
  month: string | null;
  recoveredMass: number;
  recoveries: number;
  medianYield: number | null;
  totalYield: number | null;
  co2e: number;
  holdStated: number;
  held: number;
  vacuumStated: number;
  downToLevel: number;
  /** Records left out as entry errors; told for the whole scope only. */
  excluded: number;
};

const counted = (column: SQLWrapper) => sql<number>`coalesce(sum(${column}), 0)`.mapWith(Number);

/** The middle of all yields in scope; that of every record stands ready. */
const medianYieldOf = async (tx: Tx, scope: Scope): Promise<number | null> => {
  if (!isWhole(scope)) {
    const [row] = await tx.select({ medianYield: factFigures.medianYield }).from(f).where(inScope(scope));
    return row?.medianYield ?? null;
  }
  const [middle] = await tx.select({ lower: m.lower, upper: m.upper }).from(m);
  return middle ? middle.lower + 0.5 * (middle.upper - middle.lower) : null;
};

const countExcluded = async (tx: Tx, scope: Scope): Promise<number> => {
  const [row] = await tx
    .select({ excluded: sql<number>`count(*)`.mapWith(Number) })
    .from(f)
    .where(and(inScope(scope), isNotNull(f.exclusion)));
  return row?.excluded ?? 0;
};

/** Sums out of the months that stand ready; only for whole months narrowed by nothing. */
export const sumsByMonth = async (tx: Tx, scope: Scope): Promise<MonthSums[]> => {
  const sums = await tx
    .select({
      month: sql<string | null>`${v.month}`,
      recoveredMass: toGram(sql`coalesce(sum(${v.recoveredMassKg}), 0)`),
      recoveries: counted(v.recoveries),
      // Of one month there is one median; that of the whole scope follows below.
      medianYield: sql<number | null>`min(${v.medianYield})`,
      totalYield: sql<number | null>`(sum(${v.recoveredMassKg}) / sum(${v.fullChargeKg}))::double precision`,
      co2e: toGram(sql`coalesce(sum(${v.co2eKg}), 0)`),
      holdStated: counted(v.holdStated),
      held: counted(v.held),
      vacuumStated: counted(v.vacuumStated),
      downToLevel: counted(v.downToLevel),
    })
    .from(v)
    .where(
      and(
        scope.from ? gte(v.month, firstDay(scope.from)) : undefined,
        scope.to ? lt(v.month, dayAfter(scope.to)) : undefined,
      ),
    )
    .groupBy(sql`rollup(${v.month})`)
    .orderBy(v.month);
  const medianYield = await medianYieldOf(tx, scope);
  const excluded = await countExcluded(tx, scope);
  return sums.map((row) => (row.month === null ? { ...row, medianYield, excluded } : { ...row, excluded: 0 }));
};

/** The same sums out of the records themselves, for any scope. */
export const sumsByRecord = async (tx: Tx, scope: Scope): Promise<MonthSums[]> => {
  const { fullCharge: _, ...figures } = factFigures;
  const rows = await tx
    .select({ month: sql<string | null>`${f.month}`, ...figures, ...habitFigures })
    .from(f)
    .where(inScope(scope))
    .groupBy(sql`rollup(${f.month})`)
    .orderBy(f.month);
  return rows
    .filter((row) => row.month === null || row.recoveries > 0)
    .map((row) => (row.month === null ? row : { ...row, excluded: 0 }));
};
