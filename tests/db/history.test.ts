import { beforeAll, describe, expect, test } from 'vitest';
import { rowsAs } from '../support/as-role';
import { type FilledCompany, filledCompany } from '../support/filled-company';
import { entriesOf } from '../support/history';

/** Tables whose every change a contractor may have to account for, with a column to change and its new value. */
const TRACKED: Record<string, [column: string, value: string]> = {
  appliances: ['name', 'New name'],
  branches: ['name', 'New name'],
  charge_additions: ['notes', 'New note'],
  coaching: ['plan', 'New plan'],
  cylinders: ['name', 'New name'],
  flag_decisions: ['note', 'New note'],
  flag_renewals: ['judging', 'another'],
  flags: ['state', 'decided'],
  memberships: ['role', 'auditor'],
  notes: ['text', 'New note'],
  recoveries: ['notes', 'New note'],
  site_leak_methods: ['method', 'rolling_average'],
  sites: ['name', 'New name'],
  technicians: ['name', 'New name'],
};

/** Rows that others point to come after them. */
const DELETE_ORDER = [
  'flag_decisions',
  'flags',
  'flag_renewals',
  'recoveries',
  'charge_additions',
  'appliances',
  'site_leak_methods',
  'sites',
  'memberships',
  'coaching',
  'technicians',
  'cylinders',
  'branches',
  'notes',
];

test('the tracked tables are the ones named here, for all three commands', async () => {
  const found = await rowsAs<{ name: string; triggers: number }>(
    'admin',
    {},
    `select c.relname as name, bit_or(t.tgtype & (4 | 8 | 16))::int as triggers
     from pg_trigger t join pg_class c on c.oid = t.tgrelid join pg_proc p on p.oid = t.tgfoid
     where p.proname = 'write_history' group by 1 order by 1`,
  );
  // pg_trigger.h: TRIGGER_TYPE_INSERT is 4, _DELETE 8, _UPDATE 16.
  expect(found).toEqual(Object.keys(TRACKED).map((name) => ({ name, triggers: 4 + 8 + 16 })));
});

let company: FilledCompany;
beforeAll(async () => {
  company = await filledCompany('history', '900');
});

const asEditor = (text: string, values: unknown[] = []) =>
  rowsAs<Record<string, unknown>>(
    'server',
    { company_id: company.companyId, person_id: company.personId, actor: 'the editor', reason: 'a typing error' },
    text,
    values,
  );

describe.each(Object.entries(TRACKED))('%s', (table, [column, value]) => {
  test('has an entry for each row that came, with the row', async () => {
    const rows = await asEditor(`select to_jsonb(t) as row from ${table} t`);
    const entries = await entriesOf(company.companyId, table, 'insert');
    expect(rows.length).toBeGreaterThan(0);
    expect(entries).toHaveLength(rows.length);
    for (const entry of entries) {
      expect(entry).toMatchObject({ before: null, after: { company_id: company.companyId } });
      // NULL columns are left out of entries; everything else stands in them as it stood in the row.
      const row = rows.find((r) => (r.row as { id?: string }).id === entry.row_id)?.row ?? rows[0]?.row;
      expect(row).toMatchObject(entry.after ?? {});
    }
  });

  test('has an entry for a change, with before and after, who and why', async () => {
    const text = `update ${table} set ${column} = $1 where ctid = (select min(ctid) from ${table}) returning *`;
    expect(await asEditor(text, [value])).toHaveLength(1);
    const entries = await entriesOf(company.companyId, table, 'update');
    expect(entries).toHaveLength(1);
    expect(entries[0]).toMatchObject({ actor: 'the editor', reason: 'a typing error', after: { [column]: value } });
    expect(entries[0]?.before).not.toMatchObject({ [column]: value });
  });

  test('has no entry for a change of no row', async () => {
    await asEditor(`update ${table} set ${column} = $1 where false`, [value]);
    expect(await entriesOf(company.companyId, table, 'update')).toHaveLength(1);
  });
});

test('a deleted row stays in the history as it was, also when it went with another', async () => {
  for (const table of DELETE_ORDER.filter((name) => name !== 'flags' && name !== 'flag_decisions'))
    await asEditor(`delete from ${table}`);
  for (const table of DELETE_ORDER) {
    const deleted = await entriesOf(company.companyId, table, 'delete');
    const came = await entriesOf(company.companyId, table, 'insert');
    expect(deleted.map(({ row_id }) => row_id).sort(), table).toEqual(came.map(({ row_id }) => row_id).sort());
    for (const entry of deleted)
      expect(entry).toMatchObject({ actor: 'the editor', before: { company_id: company.companyId }, after: null });
  }
});
