import pg from 'pg';
import { afterAll, beforeAll, expect, test } from 'vitest';

const admin = new pg.Client({ connectionString: process.env.ADMIN_DATABASE_URL });
beforeAll(() => admin.connect());
afterAll(() => admin.end());

const rows = async (text: string): Promise<Record<string, unknown>[]> => (await admin.query(text)).rows;

test('every table with a company has row-level security, forced, and a policy for all commands', async () => {
  const tables = await rows(`
    select c.relname, c.relrowsecurity, c.relforcerowsecurity,
           exists (select from pg_policy p where p.polrelid = c.oid and p.polcmd = '*' and p.polqual is not null and p.polwithcheck is not null) as guarded
    from pg_class c join pg_attribute a on a.attrelid = c.oid and a.attname = 'company_id' and not a.attisdropped
    where c.relnamespace = 'public'::regnamespace and c.relkind in ('r', 'p')`);
  expect(tables.length).toBeGreaterThanOrEqual(18);
  for (const table of tables)
    expect(table).toMatchObject({ relrowsecurity: true, relforcerowsecurity: true, guarded: true });
});

test('tables without row-level security are the two known reference tables and the counter of tries', async () => {
  const open = await rows(
    `select relname from pg_class where relnamespace = 'public'::regnamespace and relkind = 'r' and not relforcerowsecurity order by 1`,
  );
  expect(open.map((row) => row.relname)).toEqual(['rate_limits', 'refrigerant_components', 'refrigerants']);
});

test('every view reads with the rights of who asks, and none is materialized', async () => {
  const views = await rows(
    `select relname, relkind, coalesce(reloptions::text, '') as options from pg_class where relnamespace = 'public'::regnamespace and relkind in ('v', 'm')`,
  );
  expect(views.length).toBeGreaterThanOrEqual(9);
  for (const view of views)
    expect(view).toMatchObject({ relkind: 'v', options: expect.stringContaining('security_invoker=true') });
});

test('server and job roles cannot bypass policies, and the server owns nothing', async () => {
  const roles = await rows(
    `select rolname, rolsuper, rolbypassrls, rolcreaterole, rolcreatedb from pg_roles where rolname in ('tarebook_owner', 'tarebook_server', 'tarebook_job')`,
  );
  expect(roles).toHaveLength(3);
  for (const role of roles)
    expect(role).toMatchObject({ rolsuper: false, rolbypassrls: false, rolcreaterole: false, rolcreatedb: false });
  const owned = await rows(
    `select relname from pg_class where relowner = 'tarebook_server'::regrole union all select proname from pg_proc where proowner = 'tarebook_server'::regrole`,
  );
  expect(owned).toEqual([]);
  const jobOwned = await rows(
    `select relname from pg_class where relowner = 'tarebook_job'::regrole and relnamespace = 'public'::regnamespace`,
  );
  expect(jobOwned).toEqual([]);
});

test('every key of a tenant table begins with the company', async () => {
  const keys = await rows(`
    select c.relname, i.relname as index, a.attname as first
    from pg_index x join pg_class c on c.oid = x.indrelid join pg_class i on i.oid = x.indexrelid
    join pg_attribute a on a.attrelid = c.oid and a.attnum = x.indkey[0]
    where c.relnamespace = 'public'::regnamespace and x.indisunique
      and exists (select from pg_attribute t where t.attrelid = c.oid and t.attname = 'company_id')
      and c.relname not in ('sessions')`);
  const others = keys.filter((key) => key.first !== 'company_id').map((key) => key.index);
  // A token is looked up by its hash before anybody knows the company.
  expect(others).toEqual(['access_tokens_hash']);
});
