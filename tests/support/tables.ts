import { sql } from 'drizzle-orm';
import { withCompany } from '@/db/client';

const TABLES = [
  'recoveries',
  'technicians',
  'sites',
  'appliances',
  'branches',
  'cylinders',
  'technician_certifications',
  'import_mappings',
  'monthly_summary',
  'group_summary',
  'like_jobs',
  'middle_yields',
] as const;

/**
 * A record's version only ever counts on, and the clock with it; a sum of binary fractions depends in its last digit on
 * the order of its terms. Everything else of a row is its content.
 */
const NO_CONTENT = sql.raw(`array['version', 'updated_at', 'co2e_kg']`);

/** Everything the company's records consist of, row by row, in a form that can be compared. */
export const tableContents = (companyId: string): Promise<Record<string, string[]>> =>
  withCompany({ companyId, actor: 'test' }, async (tx) => {
    const contents: Record<string, string[]> = {};
    for (const table of TABLES) {
      const { rows } = await tx.execute<{ row: string }>(
        sql`select (to_jsonb(t) - ${NO_CONTENT})::text as row from ${sql.identifier(table)} t order by 1`,
      );
      contents[table] = rows.map(({ row }) => row);
    }
    return contents;
  });

/** One figure of the company's rows. */
export const countOf = async (companyId: string, table: string): Promise<number> => {
  const { rows } = await withCompany({ companyId, actor: 'test' }, (tx) =>
    tx.execute<{ count: number }>(sql`select count(*)::int as count from ${sql.identifier(table)}`),
  );
  return rows[0]?.count ?? Number.NaN;
};
