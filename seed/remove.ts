import type pg from 'pg';
import { withConnection } from '@/db/cluster/roles';

/** Tables that hold a company's rows, those first whose rows point at others. */
const tenantTables = async (owner: pg.Client): Promise<{ name: string; hasTriggers: boolean }[]> => {
  const tables = await owner.query<{ name: string; hasTriggers: boolean }>(`
    select c.relname as name,
           exists (select from pg_trigger t where t.tgrelid = c.oid and not t.tgisinternal) as "hasTriggers"
    from pg_class c join pg_attribute a on a.attrelid = c.oid and a.attname = 'company_id'
    where c.relnamespace = 'public'::regnamespace and c.relkind = 'r' and c.relname <> 'sessions'`);
  const keys = await owner.query<{ child: string; parent: string }>(`
    select conrelid::regclass::text as child, confrelid::regclass::text as parent
    from pg_constraint where contype = 'f' and conrelid <> confrelid`);
  const left = new Set(tables.rows.map(({ name }) => name));
  const ordered: string[] = [];
  while (left.size) {
    const free = [...left].filter((name) => !keys.rows.some(({ child, parent }) => parent === name && left.has(child)));
    if (!free.length) throw new Error(`Tables point at each other in a circle: ${[...left].join(', ')}`);
    for (const name of free) {
      ordered.push(name);
      left.delete(name);
    }
  }
  const triggered = new Set(tables.rows.flatMap(({ name, hasTriggers }) => (hasTriggers ? [name] : [])));
  return ordered.map((name) => ({ name, hasTriggers: triggered.has(name) }));
};

/**
 * Removes a company with every row it has, history included: the owner of the tables may, because the append-only
 * trigger sleeps inside this one transaction. People who belong to no other company go too. All or nothing.
 */
export const removeCompany = (ownerUrl: string, companyId: string): Promise<void> =>
  withConnection(ownerUrl, async (owner) => {
    const tables = await tenantTables(owner);
    await owner.query('begin');
    await owner.query(`select set_config('app.company_id', $1, true)`, [companyId]);
    const members = await owner.query<{ id: string }>('select person_id as id from memberships where company_id = $1', [
      companyId,
    ]);
    // Background work of other companies goes on: only tables whose triggers must sleep are locked.
    for (const { name: table, hasTriggers } of tables) {
      const name = owner.escapeIdentifier(table);
      if (hasTriggers) await owner.query(`alter table ${name} disable trigger user`);
      await owner.query(`delete from ${name} where company_id = $1`, [companyId]);
    }
    await owner.query('delete from companies where id = $1', [companyId]);
    for (const { name, hasTriggers } of tables)
      if (hasTriggers) await owner.query(`alter table ${owner.escapeIdentifier(name)} enable trigger user`);
    for (const { id } of members.rows) {
      await owner.query(`select set_config('app.person_id', $1, true)`, [id]);
      await owner.query(
        'delete from people where id = $1 and not exists (select from memberships where person_id = $1)',
        [id],
      );
    }
    await owner.query('commit');
  });
