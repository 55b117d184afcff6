import 'server-only';
import { and, isNull, lt, type SQL, sql } from 'drizzle-orm';
import { toGram } from '@/analytics/figures';
import { cutMonths, partialMonth, summedByMonth } from '@/analytics/monthly-trends/range';
import { everyMonth } from '@/analytics/monthly-trends/series';
import { dayAfter, type Scope } from '@/analytics/scope';
import { inScope } from '@/analytics/scope-query';
import type { Tx } from '@/db/client';
import { monthlyRecoveredMass as v } from '@/db/views/monthly-recovered-mass';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { kgToGram } from '@/lib/units';
import type { MonthlyPattern, MonthlyPatternQuery } from './contract';
import { monthlyPattern, type WholeMonth } from './pattern';

const DIGITS = 1e4;
const rounded = (factor: number): number => Math.round(factor * DIGITS) / DIGITS;

const monthName = (column: SQL | typeof v.month) => sql<string>`to_char(${column}, 'YYYY-MM')`;

/** Mass and recoveries of every month that has any, in order. */
const recordedMonths = (tx: Tx, scope: Scope): Promise<WholeMonth[]> =>
  summedByMonth(scope)
    ? tx
        .select({ month: monthName(v.month), recoveredMass: toGram(v.recoveredMassKg), recoveries: v.recoveries })
        .from(v)
        .where(scope.to ? lt(v.month, dayAfter(scope.to)) : undefined)
        .orderBy(v.month)
    : tx
        .select({
          month: monthName(sql`${f.month}`),
          recoveredMass: toGram(sql`sum(${f.recoveredMassKg})`),
          recoveries: sql<number>`count(*)`.mapWith(Number),
        })
        .from(f)
        .where(and(inScope(scope), isNull(f.exclusion)))
        .groupBy(f.month)
        .orderBy(f.month);

/** Months from the first to the last one with records; one without is nothing recovered. */
const inARow = (months: readonly WholeMonth[]): WholeMonth[] => {
  const known = new Map(months.map((month) => [month.month, month]));
  const [first, last] = [months[0]?.month, months.at(-1)?.month];
  return first && last
    ? everyMonth(first, last).map((month) => known.get(month) ?? { month, recoveredMass: 0, recoveries: 0 })
    : [];
};

/** Season, trend and unusual months of a scope. `now` and the company's zone tell which month is still running. */
export const getMonthlyPattern = async (
  tx: Tx,
  query: MonthlyPatternQuery,
  { now, timeZone }: { now: Date; timeZone: string },
): Promise<MonthlyPattern> => {
  const scope: Scope = { ...query, from: undefined };
  const running = partialMonth(scope, now, timeZone);
  const cut = cutMonths(scope);
  const recorded = await recordedMonths(tx, scope);
  const whole = recorded.filter(({ month }) => !cut.includes(month) && (running === null || month < running));
  const found = monthlyPattern(inARow(whole));
  if (!found.enough) {
    const { needs, has, of } = found;
    return { pattern: null, missing: { needs, has, of } };
  }
  const { months, baseline, seasonStrength, steady } = found.value;
  return {
    pattern: {
      months: months.map((month) => ({
        ...month,
        trend: kgToGram(month.trend),
        expected: kgToGram(month.expected),
        low: kgToGram(month.low),
        high: kgToGram(month.high),
        seasonFactor: rounded(month.seasonFactor),
        remainderFactor: rounded(month.remainderFactor),
      })),
      seasonStrength: rounded(seasonStrength),
      steady,
      baseline: { ...baseline, lower: rounded(baseline.lower), upper: rounded(baseline.upper) },
    },
    missing: null,
  };
};
