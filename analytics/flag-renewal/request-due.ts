import 'server-only';
import { sql } from 'drizzle-orm';
import { companyIds, withCompanyJob } from '@/db/client';
import { requestFlags } from '@/lib/flags/request';
import { JUDGING } from './judging';

/** Whether the flags of the transaction's company are behind: records changed, or they were judged otherwise. */
const IS_BEHIND = sql`
  select exists (select from flags_due)
      or (exists (select from recoveries) and not exists (select from flag_renewals where judging = ${JUDGING})) as behind`;

/** Asks for the renewal of every company whose flags are behind, one company after the other. */
export const requestDueFlags = async (): Promise<void> => {
  for (const companyId of await companyIds())
    await withCompanyJob({ companyId, actor: 'upkeep' }, async (tx) => {
      const { rows } = await tx.execute<{ behind: boolean }>(IS_BEHIND);
      if (rows[0]?.behind) await requestFlags(tx, companyId);
    });
};
