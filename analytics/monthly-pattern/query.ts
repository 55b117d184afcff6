import 'server-only';
import { and, isNull, lt, not, type SQL, sql } from 'drizzle-orm';
import { toGram } from '@/analytics/fact-figures';
import { cutMonths, partialMonth } from '@/analytics/monthly-trends/range';
import { everyMonth } from '@/analytics/monthly-trends/series';
import type { Scope } from '@/analytics/scope';
import { inScope } from '@/analytics/scope-query';
import type { Tx } from '@/db/client';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { kgToGram } from '@/lib/units';
import type { MonthlyPattern, MonthlyPatternQuery } from './contract';
import { LARGE_PLANT_KG, monthlyPattern, type WholeMonth } from './pattern';

const DIGITS = 1e4;
const rounded = (factor: number): number => Math.round(factor * DIGITS) / DIGITS;

const routine = lt(f.fullChargeKg, LARGE_PLANT_KG);

type RecordedMonth = WholeMonth & { largeMass: number; largeRecoveries: number };

/** Routine jobs and large plant of every month that has any records, in order. */
const recordedMonths = (tx: Tx, scope: Scope): Promise<RecordedMonth[]> => {
  const mass = (which: SQL) => toGram(sql`coalesce(sum(${f.recoveredMassKg}) filter (where ${which}), 0)`);
  const count = (which: SQL) => sql<number>`count(*) filter (where ${which})`.mapWith(Number);
  return tx
    .select({
      month: sql<string>`to_char(${f.month}, 'YYYY-MM')`,
      recoveredMass: mass(routine),
      recoveries: count(routine),
      largeMass: mass(not(routine)),
      largeRecoveries: count(not(routine)),
    })
    .from(f)
    .where(and(inScope(scope), isNull(f.exclusion)))
    .groupBy(f.month)
    .orderBy(f.month);
};

/** Routine jobs of the months from the first to the last one with records; one without is nothing recovered. */
const inARow = (months: readonly RecordedMonth[]): WholeMonth[] => {
  const known = new Map(
    months.map(({ month, recoveredMass, recoveries }) => [month, { month, recoveredMass, recoveries }]),
  );
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
  const large = {
    fromFullCharge: LARGE_PLANT_KG,
    recoveries: whole.reduce((sum, { largeRecoveries }) => sum + largeRecoveries, 0),
    recoveredMass: kgToGram(whole.reduce((sum, { largeMass }) => sum + largeMass, 0)),
    allMass: kgToGram(whole.reduce((sum, { recoveredMass, largeMass }) => sum + recoveredMass + largeMass, 0)),
  };
  const found = monthlyPattern(inARow(whole));
  if (!found.enough) {
    const { needs, has, of } = found;
    return { large, pattern: null, missing: { needs, has, of } };
  }
  const { months, baseline, seasonStrength, steady } = found.value;
  return {
    large,
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
