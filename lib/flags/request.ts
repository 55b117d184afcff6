import 'server-only';
import { sql } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { flagsDue } from '@/db/schema/flag-renewal';

/**
 * Asks for a renewal of all flags, as part of the transaction that took a file in or back: many records at once may move
 * what is usual. $1 company.
 */
export const REQUEST_ALL_FLAGS = `
  with everything as (
    insert into flags_due as due (company_id, recovery_id) values ($1::uuid, '00000000-0000-0000-0000-000000000000')
    on conflict (company_id, recovery_id) do update set touches = due.touches + 1
  )
  select work.enqueue('renew-flags', json_build_object('companyId', $1::text), 'renew-flags:' || $1::text)`;

/** Asks for a renewal of the flags that are due, as part of the transaction; many asking meanwhile are one. */
export const requestFlags = async (tx: Tx, companyId: string): Promise<void> => {
  await tx.execute(
    sql`select work.enqueue('renew-flags', ${JSON.stringify({ companyId })}::json, ${`renew-flags:${companyId}`})`,
  );
};

/** Asks for a record to be judged again: what was decided about it, or taken back, may change what is said of it. */
export const judgeAgain = async (tx: Tx, companyId: string, recoveryId: string): Promise<void> => {
  await tx
    .insert(flagsDue)
    .values({ companyId, recoveryId })
    .onConflictDoUpdate({
      target: [flagsDue.companyId, flagsDue.recoveryId],
      set: { touches: sql`${flagsDue.touches} + 1` },
    });
  await requestFlags(tx, companyId);
};
