import 'server-only';
import { and, gte, isNull, lt, type SQL, sql } from 'drizzle-orm';
import { factFigures, toGram } from '@/analytics/fact-figures';
import { type Dimension, dayAfter, firstDay, type Scope, UNSTATED } from '@/analytics/scope';
import { FACT_COLUMNS, inScope, isOneOf } from '@/analytics/scope-query';
import type { Tx } from '@/db/client';
import {
  monthlyRecoveredMassByBranch,
  monthlyRecoveredMassByCategory,
  monthlyRecoveredMassByJobType,
  monthlyRecoveredMassByRefrigerant,
  monthlyRecoveredMassBySite,
  monthlyRecoveredMassByTechnician,
} from '@/db/views/monthly-recovered-mass';
import { recoveryFacts as f } from '@/db/views/recovery-facts';

/** The view that is summed by month for each dimension. */
export const MONTHLY_VIEWS = {
  refrigerant: monthlyRecoveredMassByRefrigerant,
  technician: monthlyRecoveredMassByTechnician,
  site: monthlyRecoveredMassBySite,
  branch: monthlyRecoveredMassByBranch,
  category: monthlyRecoveredMassByCategory,
  jobType: monthlyRecoveredMassByJobType,
} as const satisfies Record<Dimension, unknown>;

/** Figures of one month and one key, before the flags are counted; `month` is its first day. */
export type GroupedRow = {
  month: string;
  key: string;
  recoveredMass: number;
  recoveries: number;
  medianYield: number | null;
  co2e: number;
};

/** A dimension's value as a key: what is not stated has a name too. */
export const keyOf = (column: SQL.Aliased | (typeof FACT_COLUMNS)[Dimension]): SQL<string> =>
  sql<string>`coalesce(${column}, ${UNSTATED})`;

/** Keys in an order that no locale changes. */
export const byKeyInC = (key: SQL): SQL => sql`${key} collate "C"`;

/** The rows of a view that is summed by month which a scope means; only for scopes that `answeredByMonth` admits. */
export const monthsOfView = (scope: Scope, by: Dimension): SQL | undefined => {
  const { month, key } = MONTHLY_VIEWS[by];
  return and(
    scope.from ? gte(month, firstDay(scope.from)) : undefined,
    scope.to ? lt(month, dayAfter(scope.to)) : undefined,
    isOneOf(key, scope[by]),
  );
};

/** The records in scope that count. */
export const recordsThatCount = (scope: Scope): SQL | undefined => and(inScope(scope), isNull(f.exclusion));

/** Rows out of the views that are summed by month, `named` keys only if given; for scopes that `answeredByMonth` admits. */
export const rowsByMonth = (tx: Tx, scope: Scope, by: Dimension, named?: readonly string[]): Promise<GroupedRow[]> => {
  const v = MONTHLY_VIEWS[by];
  const key = keyOf(v.key);
  return tx
    .select({
      month: v.month,
      key: key.as('key_or_unstated'),
      recoveredMass: toGram(v.recoveredMassKg),
      recoveries: v.recoveries,
      medianYield: v.medianYield,
      co2e: toGram(v.co2eKg),
    })
    .from(v)
    .where(and(monthsOfView(scope, by), isOneOf(v.key, named)))
    .orderBy(v.month, byKeyInC(key));
};

/** The same rows out of the records themselves, for any scope. */
export const rowsByRecord = (tx: Tx, scope: Scope, by: Dimension, named?: readonly string[]): Promise<GroupedRow[]> => {
  const { recoveredMass, recoveries, medianYield, co2e } = factFigures;
  const key = keyOf(FACT_COLUMNS[by]);
  return tx
    .select({ month: f.month, key: key.as('key'), recoveredMass, recoveries, medianYield, co2e })
    .from(f)
    .where(and(recordsThatCount(scope), isOneOf(FACT_COLUMNS[by], named)))
    .groupBy(f.month, FACT_COLUMNS[by])
    .orderBy(f.month, byKeyInC(key));
};
