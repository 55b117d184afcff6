import 'server-only';
import type { PoolClient } from 'pg';
import { type CompanyScope, jobPool } from './client';

/**
 * A raw connection inside a company's transaction, for COPY and cursors, which Drizzle does not speak. Commits when
 * `work` returns, rolls back when it throws.
 */
export const withCompanyConnection = async <T>(
  scope: CompanyScope,
  work: (client: PoolClient) => Promise<T>,
  pool = jobPool(),
): Promise<T> => {
  const client = await pool.connect();
  let broken: Error | undefined;
  try {
    await client.query('begin');
    await client.query(
      `select set_config('app.company_id', $1, true), set_config('app.actor', $2, true),
              set_config('app.reason', $3, true), set_config('app.technician_id', $4, true)`,
      [scope.companyId, scope.actor, scope.reason ?? '', scope.technicianId ?? ''],
    );
    const result = await work(client);
    await client.query('commit');
    return result;
  } catch (error) {
    broken = error instanceof Error ? error : new Error(String(error));
    await client.query('rollback').catch(() => undefined);
    throw error;
  } finally {
    client.release(broken);
  }
};
