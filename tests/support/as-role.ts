import pg from 'pg';

export type DatabaseUser = 'server' | 'job' | 'owner' | 'admin';

const ADDRESSES: Record<DatabaseUser, string> = {
  server: 'SERVER_DATABASE_URL',
  job: 'JOB_DATABASE_URL',
  owner: 'OWNER_DATABASE_URL',
  admin: 'ADMIN_DATABASE_URL',
};

const pools = new Map<DatabaseUser, pg.Pool>();
const poolOf = (user: DatabaseUser): pg.Pool => {
  const pool =
    pools.get(user) ?? new pg.Pool({ connectionString: process.env[ADDRESSES[user]], max: 4, allowExitOnIdle: true });
  pools.set(user, pool);
  return pool;
};

/** Runs `work` in a transaction of a login role, with settings as the application sets them; commits when it returns. */
export const asRole = async <T>(
  user: DatabaseUser,
  settings: Record<string, string>,
  work: (client: pg.PoolClient) => Promise<T>,
): Promise<T> => {
  const client = await poolOf(user).connect();
  try {
    await client.query('begin');
    for (const [name, value] of Object.entries(settings))
      await client.query('select set_config($1, $2, true)', [`app.${name}`, value]);
    const result = await work(client);
    await client.query('commit');
    return result;
  } catch (error) {
    await client.query('rollback');
    throw error;
  } finally {
    client.release();
  }
};

/** Rows of one query by a role. */
export const rowsAs = <Row extends pg.QueryResultRow>(
  user: DatabaseUser,
  settings: Record<string, string>,
  text: string,
  values: unknown[] = [],
): Promise<Row[]> => asRole(user, settings, async (client) => (await client.query<Row>(text, values)).rows);
