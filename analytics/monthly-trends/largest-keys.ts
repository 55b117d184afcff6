import 'server-only';
import { desc, type SQL, sql } from 'drizzle-orm';
import type { Dimension, Scope } from '@/analytics/scope';
import { FACT_COLUMNS } from '@/analytics/scope-query';
import type { Tx } from '@/db/client';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { kgToGram } from '@/lib/units';
import type { MonthlyTrends } from './contract';
import { answeredByMonth } from './range';
import { byKeyInC, keyOf, MONTHLY_VIEWS, monthsOfView, recordsThatCount } from './rows';

/** The keys that are told by name, and how many others there are. */
export type NamedKeys = { named: string[]; others: number };

const inOrder = (mass: SQL, key: SQL) => [desc(mass), byKeyInC(key)];
const allKeys = sql<number>`count(*) over ()`.mapWith(Number);

/**
 * The `most` keys of the largest mass over the whole scope. When just one would be left over it is named too: a rest of
 * one would hide a name for nothing.
 */
export const largestKeys = async (tx: Tx, scope: Scope, by: Dimension, most: number): Promise<NamedKeys> => {
  const view = MONTHLY_VIEWS[by];
  const ready = answeredByMonth(scope, by);
  const key = keyOf(ready ? view.key : FACT_COLUMNS[by]);
  const found = ready
    ? await tx
        .select({ key: key.as('named_key'), all: allKeys })
        .from(view)
        .where(monthsOfView(scope, by))
        .groupBy(view.key)
        .orderBy(...inOrder(sql`sum(${view.recoveredMassKg})`, key))
        .limit(most + 1)
    : await tx
        .select({ key: key.as('named_key'), all: allKeys })
        .from(f)
        .where(recordsThatCount(scope))
        .groupBy(FACT_COLUMNS[by])
        .orderBy(...inOrder(sql`sum(${f.recoveredMassKg})`, key))
        .limit(most + 1);
  const all = found[0]?.all ?? 0;
  const named = found.map((row) => row.key);
  return all > most + 1 ? { named: named.slice(0, most), others: all - most } : { named, others: 0 };
};

type Told = Pick<MonthlyTrends, 'rows' | 'months'>;

/** What the keys without a name come to by month: the whole month without the named ones, so that nothing is lost. */
export const otherKeysOf = ({ rows, months }: Told, others: number): MonthlyTrends['otherKeys'] => {
  if (others === 0) return null;
  return {
    keys: others,
    rows: months.flatMap((whole) => {
      const named = rows.filter(({ month }) => month === whole.month);
      const rest = (figure: 'recoveredMass' | 'recoveries' | 'flagged' | 'co2e') =>
        named.reduce((left, row) => left - row[figure], whole[figure]);
      const recoveries = rest('recoveries');
      return recoveries === 0
        ? []
        : [
            {
              month: whole.month,
              // Rounding may leave a gram less than nothing.
              recoveredMass: Math.max(0, kgToGram(rest('recoveredMass'))),
              recoveries,
              flagged: rest('flagged'),
              co2e: Math.max(0, kgToGram(rest('co2e'))),
            },
          ];
    }),
  };
};
