import 'server-only';
import { sql } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { DIMENSIONS, UNSTATED } from '../dimensions';
import { FACT_COLUMNS } from '../scope-query';
import type { ScopeOptions } from './contract';

const columns = DIMENSIONS.map((dimension) => sql`${FACT_COLUMNS[dimension]}`);

// `grouping` has one bit a column, set where the row is not grouped by it: one pass counts all six dimensions.
const groupingOf = (index: number) => (1 << DIMENSIONS.length) - 1 - (1 << (DIMENSIONS.length - 1 - index));

const byCount = (a: { value: string; recoveries: number }, b: { value: string; recoveries: number }) =>
  b.recoveries - a.recoveries || a.value.localeCompare(b.value, 'en', { numeric: true });

/** Every value of every dimension with its number of records, the most frequent first, and the months they span. */
export const getScopeOptions = async (tx: Tx): Promise<ScopeOptions> => {
  const rows = await tx
    .select({
      dimension: sql`grouping(${sql.join(columns, sql`, `)})`.mapWith(Number),
      value: sql<string | null>`coalesce(${sql.join(columns, sql`, `)})`,
      recoveries: sql`count(*)`.mapWith(Number),
      firstMonth: sql<string | null>`to_char(min(${f.month}), 'YYYY-MM')`,
      lastMonth: sql<string | null>`to_char(max(${f.month}), 'YYYY-MM')`,
    })
    .from(f)
    .groupBy(
      sql`grouping sets ((), ${sql.join(
        columns.map((column) => sql`(${column})`),
        sql`, `,
      )})`,
    );
  const all = rows.find((row) => row.dimension === (1 << DIMENSIONS.length) - 1);
  const choicesOf = (index: number) =>
    rows
      .filter((row) => row.dimension === groupingOf(index))
      .map((row) => ({ value: row.value ?? UNSTATED, recoveries: row.recoveries }))
      .sort(byCount);
  return {
    recoveries: all?.recoveries ?? 0,
    firstMonth: all?.firstMonth ?? null,
    lastMonth: all?.lastMonth ?? null,
    refrigerant: choicesOf(DIMENSIONS.indexOf('refrigerant')),
    technician: choicesOf(DIMENSIONS.indexOf('technician')),
    site: choicesOf(DIMENSIONS.indexOf('site')),
    branch: choicesOf(DIMENSIONS.indexOf('branch')),
    category: choicesOf(DIMENSIONS.indexOf('category')),
    jobType: choicesOf(DIMENSIONS.indexOf('jobType')),
  };
};
