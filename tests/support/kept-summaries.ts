import { sql } from 'drizzle-orm';
import type { Tx } from '@/db/client';

const GROUPS = {
  technician: { key: 'technician_id', appliances: 'null::int' },
  site: { key: 'site_id', appliances: 'count(distinct appliance_id)::int' },
} as const;

/** The same figures worked out from the records by plain aggregates; masses exactly, yields by PostgreSQL's percentile_cont. */
const groups = Object.entries(GROUPS)
  .map(
    ([dimension, { key, appliances }]) => `
      select '${dimension}', ${key}, count(*)::int, sum(recovered_mass_kg), sum(full_charge_kg),
             percentile_cont(0.5) within group (order by recovery_yield), ${appliances}, min(recovered_on), max(recovered_on)
      from recoveries where exclusion is null group by ${key}`,
  )
  .join(' union all ');

const PAIRS = {
  groups: [
    'select dimension, group_id, recoveries, recovered_mass_kg, full_charge_kg, median_yield, appliances, first_recovered_on, last_recovered_on from group_summary',
    groups,
  ],
  likeJobs: [
    'select refrigerant, kind, records, lower_quartile, median_yield, upper_quartile from like_jobs',
    `select refrigerant, coalesce(category, ''), count(*)::int, percentile_cont(0.25) within group (order by recovery_yield),
            percentile_cont(0.5) within group (order by recovery_yield), percentile_cont(0.75) within group (order by recovery_yield)
     from recoveries where exclusion is null group by 1, 2`,
  ],
  middle: [
    'select records, lower, upper, lower + 0.5 * (upper - lower) from middle_yields',
    `select count(*), percentile_disc(0.5) within group (order by recovery_yield),
            percentile_disc(0.5) within group (order by recovery_yield desc), percentile_cont(0.5) within group (order by recovery_yield)
     from recoveries where exclusion is null having count(*) > 0`,
  ],
} as const;

/** What is kept of groups, like jobs and the middle yield and does not follow from the records, or the other way round. */
export const summaryDifferences = async (tx: Tx): Promise<unknown[]> => {
  const found: unknown[] = [];
  for (const [name, [kept, expected]] of Object.entries(PAIRS)) {
    const { rows } = await tx.execute(
      sql.raw(`((${expected}) except all (${kept})) union all ((${kept}) except all (${expected}))`),
    );
    found.push(...rows.map((row) => ({ name, ...row })));
  }
  return found;
};
