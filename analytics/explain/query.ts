import 'server-only';
import { desc, eq, sql } from 'drizzle-orm';
import { factFigures, toGram } from '@/analytics/fact-figures';
import { MEASURE_UNITS, RECORDS_OF } from '@/analytics/figures/measures';
import { recordsInList } from '@/analytics/records/filters';
import type { Scope } from '@/analytics/scope';
import { inScope } from '@/analytics/scope-query';
import type { Tx } from '@/db/client';
import { history } from '@/db/schema/history';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { searchString } from '@/lib/api/client';
import type { Explained, ExplainQuery } from './contract';
import { formulaFilled, formulaSource, formulaWords } from './formula';
import { computeMeasure } from './parts';

const NOTHING = {
  recoveredMass: 0,
  fullCharge: 0,
  recoveries: 0,
  totalYield: null,
  medianYield: null,
  co2e: 0,
  excluded: 0,
};

/** How fresh the records are: the last day that has one, and when one was last written. */
const getFresh = async (tx: Tx): Promise<Explained['fresh']> => {
  const [last] = await tx.select({ on: f.recoveredOn }).from(f).orderBy(desc(f.recoveredOn)).limit(1);
  const [change] = await tx
    .select({ at: history.changedAt })
    .from(history)
    .where(eq(history.tableName, 'recoveries'))
    .orderBy(desc(history.entryNo))
    .limit(1);
  return { recordsUntil: last?.on ?? null, lastChangeAt: change ? new Date(change.at).toISOString() : null };
};

/** Count and recovered mass of the records that make a figure, found as /api/recoveries finds them. */
const getRecordSums = async (tx: Tx, scope: Scope, measure: ExplainQuery['measure']) => {
  const [sums] = await tx
    .select({
      count: sql<number>`count(*)`.mapWith(Number),
      sum: toGram(sql`coalesce(sum(${f.recoveredMassKg}), 0)`),
    })
    .from(f)
    .where(recordsInList({ ...scope, exclusion: 'none', ...RECORDS_OF[measure] }));
  return sums ?? { count: 0, sum: 0 };
};

/** How one figure is computed, and the query of the records behind it. */
export const getExplained = async (tx: Tx, { measure, ...scope }: ExplainQuery): Promise<Explained> => {
  const [found] = await tx.select(factFigures).from(f).where(inScope(scope));
  const { excluded, ...sums } = found ?? NOTHING;
  const { value, parts } = await computeMeasure(tx, measure, scope, sums);
  const { count, sum } = await getRecordSums(tx, scope, measure);
  const unjudged = parts.kind === 'standing' ? sums.recoveries - parts.judged : 0;
  const outside = (reading: string) => (RECORDS_OF[measure]?.states === reading ? sums.recoveries - count : 0);
  const leftOut: Explained['leftOut'] = [
    { reason: 'entry_error' as const, count: excluded },
    { reason: 'too_few_like_jobs' as const, count: unjudged },
    { reason: 'no_hold_stated' as const, count: outside('hold') },
    { reason: 'no_vacuum_stated' as const, count: outside('vacuum') },
    { reason: 'large_plant' as const, count: measure === 'routineMass' ? sums.recoveries - count : 0 },
  ].filter((reason) => reason.count > 0);
  return {
    measure,
    value,
    unit: MEASURE_UNITS[measure],
    count,
    sum,
    parts,
    formula: { words: formulaWords(measure), filled: formulaFilled({ measure, value, count, parts }, 'kg') },
    source: formulaSource(measure),
    leftOut,
    fresh: await getFresh(tx),
    records: `/api/recoveries${searchString({ ...scope, exclusion: 'none', ...RECORDS_OF[measure] })}`,
  };
};
