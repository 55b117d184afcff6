import pg from 'pg';
import { DATABASE_ROLES, type DatabaseRole, type DatabaseUrls, rolePassword } from './urls';

/**
 * Limits per role: a request must end soon, a job may read a long file, nobody may hold a lock for ever. A page read out
 * of order costs hardly more than the next one on today's disks; PostgreSQL's default of 4 makes it scan whole tables
 * where an index would answer.
 */
const SETTINGS: Record<DatabaseRole, Record<string, string>> = {
  owner: { lock_timeout: '30s' },
  server: {
    statement_timeout: '15s',
    lock_timeout: '10s',
    idle_in_transaction_session_timeout: '60s',
    random_page_cost: '1.1',
    work_mem: '16MB',
  },
  job: {
    statement_timeout: '20min',
    lock_timeout: '60s',
    idle_in_transaction_session_timeout: '20min',
    random_page_cost: '1.1',
    work_mem: '16MB',
  },
};

/** Runs `work` on one connection and closes it whatever happens. */
export const withConnection = async <T>(url: string, work: (client: pg.Client) => Promise<T>): Promise<T> => {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
};

/** Makes the three login roles or brings them up to date; may be run any number of times. Needs CREATEROLE. */
export const prepareRoles = (urls: DatabaseUrls, secret: string): Promise<void> =>
  withConnection(urls.admin, async (admin) => {
    const database = admin.escapeIdentifier(new URL(urls.admin).pathname.slice(1));
    for (const role of Object.keys(DATABASE_ROLES) as DatabaseRole[]) {
      const name = admin.escapeIdentifier(DATABASE_ROLES[role]);
      const exists = await admin.query('select from pg_roles where rolname = $1', [DATABASE_ROLES[role]]);
      const password = admin.escapeLiteral(rolePassword(secret, role));
      // A new role can nothing by default. Saying so again of an old one would take a superuser; the server refuses to
      // start under a role that can more (instrumentation.ts).
      await admin.query(`${exists.rowCount ? 'alter' : 'create'} role ${name} login password ${password}`);
      for (const [key, value] of Object.entries(SETTINGS[role])) {
        await admin.query(`alter role ${name} set ${key} = '${value}'`);
      }
      await admin.query(`grant connect, temporary on database ${database} to ${name}`);
    }
    // Migrations keep their ledger in a schema of the owner's, the queue lives in a schema of the job role's.
    await admin.query(`grant create on database ${database} to ${DATABASE_ROLES.owner}, ${DATABASE_ROLES.job}`);
    await admin.query('revoke create on schema public from public');
    await admin.query(`grant usage, create on schema public to ${DATABASE_ROLES.owner}`);
    await admin.query(`grant usage on schema public to ${DATABASE_ROLES.server}, ${DATABASE_ROLES.job}`);
  });

/** What server and jobs may do with the owner's tables: rows yes, tables no, history read only. */
export const grantTables = (urls: DatabaseUrls): Promise<void> =>
  withConnection(urls.owner, async (owner) => {
    const readers = `${DATABASE_ROLES.server}, ${DATABASE_ROLES.job}`;
    await owner.query(`grant select, insert, update, delete on all tables in schema public to ${readers}`);
    await owner.query(`grant usage, select on all sequences in schema public to ${readers}`);
    await owner.query(`revoke insert, update, delete on history, history_heads, monthly_summary from ${readers}`);
    await owner.query(`revoke insert, update, delete on refrigerants, refrigerant_components from ${readers}`);
    await owner.query(
      `alter default privileges in schema public grant select, insert, update, delete on tables to ${readers}`,
    );
  });
