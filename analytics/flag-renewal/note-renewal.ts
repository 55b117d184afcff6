import 'server-only';
import type { PoolClient } from 'pg';
import { JUDGING } from './judging';
import type { FlagChanges } from './write-flags';

/** Notes that flags were renewed, and so in the history too; a renewal that changed nothing is none. */
export const noteRenewal = async (
  client: PoolClient,
  companyId: string,
  baselineId: string,
  records: number,
  { added, changed, gone }: FlagChanges,
): Promise<void> => {
  await client.query(
    `insert into flag_renewals as r (company_id, judging, baseline_id, records, added, changed, gone)
     values ($1, $2, $3, $4, $5, $6, $7)
     on conflict (company_id) do update set judging = $2, baseline_id = $3, records = $4, added = $5, changed = $6,
       gone = $7, renewed_at = now()
     where $5 + $6 + $7 > 0 or (r.judging, r.baseline_id, r.records) is distinct from ($2, $3::uuid, $4)`,
    [companyId, JUDGING, baselineId, records, added, changed, gone],
  );
};
