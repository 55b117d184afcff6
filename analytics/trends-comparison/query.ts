import 'server-only';
import { and, eq, or, sql } from 'drizzle-orm';
import { factFigures, toGram } from '@/analytics/fact-figures';
import type { Scope } from '@/analytics/scope';
import { Z_95 } from '@/analytics/statistics/distributions/z-95';
import { compareSums } from '@/analytics/statistics/season/year-on-year';
import type { Tx } from '@/db/client';
import { flaggedRecoveries as flagged } from '@/db/views/flagged-recoveries';
import { recoveryFacts as f } from '@/db/views/recovery-facts';

import { kgToGram } from '@/lib/units';
import type { Comparison, PeriodFigures, TrendsComparison, TrendsComparisonQuery } from './contract';
import { moversOf } from './movers';
import { comparedPeriods, dayBefore, type Side } from './periods';
import { onDays, sourcesOf, sumCo2e, sumFigures, sumKeys } from './sums';

/** Day of the company's first record; null when there is none. */
const firstRecord = async (tx: Tx): Promise<string | null> => {
  const [first] = await tx.select({ on: f.recoveredOn }).from(f).orderBy(f.recoveredOn).limit(1);
  return first?.on ?? null;
};

/** What only the records themselves can say: median yield, the spread of the jobs, and what was left out. */
const recordFigures = async (tx: Tx, scope: Scope, side: Side) => {
  const [row] = await tx
    .select({
      medianYield: factFigures.medianYield,
      excluded: factFigures.excluded,
      massStandardError: toGram(
        sql`coalesce(sqrt(sum(${f.recoveredMassKg} * ${f.recoveredMassKg}) filter (where ${f.exclusion} is null)), 0)`,
      ),
    })
    .from(f)
    .where(onDays(scope, side.spans));
  if (!row) throw new Error('A sum without groups has one row');
  return row;
};

const countFlagged = async (tx: Tx, scope: Scope, now: Side, before: Side) => {
  const among = (side: Side) => sql<number>`count(*) filter (where ${onDays(scope, side.spans)})`.mapWith(Number);
  const [row] = await tx
    .select({ now: among(now), before: among(before) })
    .from(flagged)
    .innerJoin(f, and(eq(f.companyId, flagged.companyId), eq(f.id, flagged.recoveryId)))
    .where(or(onDays(scope, now.spans), onDays(scope, before.spans)));
  return { now: row?.now ?? 0, before: row?.before ?? 0 };
};

const share = (part: number, of: number): number | null => (of > 0 ? part / of : null);

const figuresOf = async (
  tx: Tx,
  { gwp, ...scope }: Omit<TrendsComparisonQuery, 'by' | 'versus'>,
  side: Side,
  flagged: number,
): Promise<PeriodFigures> => {
  const sources = sourcesOf(scope, side);
  const sums = await sumFigures(tx, sources);
  return {
    from: side.spans[0]?.from ?? '',
    to: dayBefore(side.spans.at(-1)?.until ?? ''),
    ...sums,
    ...(await recordFigures(tx, scope, side)),
    ...(await sumCo2e(tx, sources, gwp)),
    heldShare: share(sums.held, sums.holdStated),
    downToLevelShare: share(sums.downToLevel, sums.vacuumStated),
    flagged,
    flaggedShare: share(flagged, sums.recoveries),
  };
};

/** Difference and ratio of two sums of jobs with the 95 % interval that chance gives them. */
const changeOf = (now: PeriodFigures, before: PeriodFigures): Pick<Comparison, 'difference' | 'ratio' | 'clear'> => {
  const jobs = ({ recoveredMass, massStandardError }: PeriodFigures) => ({
    total: recoveredMass,
    standardError: massStandardError,
  });
  const mass = now.recoveredMass - before.recoveredMass;
  const reach = Z_95 * Math.hypot(now.massStandardError, before.massStandardError);
  const { ratio } = compareSums(jobs(now), jobs(before));
  const limits = ratio.enough ? { value: ratio.value.ratio, low: ratio.value.lower, high: ratio.value.upper } : null;
  return {
    difference: { mass: kgToGram(mass), low: kgToGram(mass - reach), high: kgToGram(mass + reach) },
    ratio: limits,
    clear: limits ? limits.low > 1 || limits.high < 1 : Math.abs(mass) > reach,
  };
};

/**
 * A period against the same one a year before or against another chosen one, like for like. `today` is the company's
 * local date: the running month is compared with the same days only.
 */
export const getTrendsComparison = async (
  tx: Tx,
  { by, versus, gwp, ...scope }: TrendsComparisonQuery,
  today: string,
): Promise<TrendsComparison> => {
  const first = await firstRecord(tx);
  const periods =
    first === null
      ? null
      : comparedPeriods({
          from: scope.from ?? null,
          to: scope.to ?? null,
          versus: versus ?? null,
          today,
          begins: first.slice(0, 7),
        });
  if (!periods) return { by, gwp, comparison: null };
  const sides = [periods.now, periods.before] as const;
  const flagged = await countFlagged(tx, scope, ...sides);
  const now = await figuresOf(tx, { ...scope, gwp }, periods.now, flagged.now);
  const before = await figuresOf(tx, { ...scope, gwp }, periods.before, flagged.before);
  const keysNow = await sumKeys(tx, sourcesOf(scope, periods.now), by);
  const keysBefore = await sumKeys(tx, sourcesOf(scope, periods.before), by);
  return {
    by,
    gwp,
    comparison: {
      now,
      before,
      sameDays: periods.now.parts.length > 0,
      shortened: periods.shortened,
      ...changeOf(now, before),
      ...moversOf(keysNow, keysBefore),
    },
  };
};
