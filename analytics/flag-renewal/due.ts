import 'server-only';
import type { PoolClient } from 'pg';

/** A recovery id of zeros stands for all records. */
const EVERYTHING = '00000000-0000-0000-0000-000000000000';

/** What is due, as it was when the renewal began. */
export type Due = { everything: boolean; ids: string[]; touches: number[] };

/** Reads what is due. */
export const readDue = async (client: PoolClient, companyId: string): Promise<Due> => {
  const { rows } = await client.query<{ id: string; touches: number }>(
    'select recovery_id as id, touches from flags_due where company_id = $1',
    [companyId],
  );
  return {
    everything: rows.some(({ id }) => id === EVERYTHING),
    ids: rows.map(({ id }) => id),
    touches: rows.map(({ touches }) => touches),
  };
};

/** Takes what was due off the list; what was touched again meanwhile stays. */
export const settleDue = async (client: PoolClient, companyId: string, { ids, touches }: Due): Promise<void> => {
  await client.query(
    `delete from flags_due d using unnest($2::uuid[], $3::int[]) done (id, touches)
     where d.company_id = $1 and d.recovery_id = done.id and d.touches = done.touches`,
    [companyId, ids, touches],
  );
};
