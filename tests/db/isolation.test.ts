import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, test } from 'vitest';
import { type DatabaseUser, rowsAs } from '../support/as-role';
import { type FilledCompany, filledCompany } from '../support/filled-company';

/** Tables that belong to no company: reference data, and the counter of tries, which holds no company's rows. */
const OPEN_TABLES = ['rate_limits', 'refrigerant_components', 'refrigerants'];

const relations = (
  await rowsAs<{ name: string; kind: string; columns: string[] }>(
    'admin',
    {},
    `select c.relname as name, c.relkind as kind,
            array(select a.attname::text from pg_attribute a where a.attrelid = c.oid and a.attnum > 0 and not a.attisdropped) as columns
     from pg_class c where c.relnamespace = 'public'::regnamespace and c.relkind in ('r', 'p', 'v') order by 1`,
  )
).filter(({ name }) => !OPEN_TABLES.includes(name));
const names = relations.map(({ name }) => name);
const ofCompany = relations.filter(({ columns }) => columns.includes('company_id'));

let ours: FilledCompany;
let theirs: FilledCompany;
beforeAll(async () => {
  ours = await filledCompany('Ours', '900');
  theirs = await filledCompany('Theirs', '800');
});

const count = async (user: DatabaseUser, settings: Record<string, string>, relation: string, where = 'true') => {
  const [row] = await rowsAs<{ n: number }>(
    user,
    settings,
    `select count(*)::int as n from ${relation} where ${where}`,
  );
  return row?.n;
};

/** How a row of a table tells whose it is. */
const theirRows = ({ name, columns }: { name: string; columns: string[] }) => {
  if (name === 'companies') return `id = '${theirs.companyId}'`;
  if (name === 'people') return `id = '${theirs.personId}'`;
  return columns.includes('company_id') ? `company_id = '${theirs.companyId}'` : `person_id = '${theirs.personId}'`;
};

test('the catalogue has the tables and views that are to be guarded', () => {
  expect(relations.filter(({ kind }) => kind === 'r').length).toBeGreaterThanOrEqual(22);
  expect(relations.filter(({ kind }) => kind === 'v').length).toBeGreaterThanOrEqual(9);
});

describe.each(relations)('$name', (relation) => {
  const inside = () => ({ company_id: ours.companyId, person_id: ours.personId });

  test('holds rows of the other company, and its own company reads them', async () => {
    const insideTheirs = { company_id: theirs.companyId, person_id: theirs.personId };
    expect(await count('server', insideTheirs, relation.name, theirRows(relation))).toBeGreaterThan(0);
  });

  test.each<DatabaseUser>(['server', 'job', 'owner'])('shows the %s role nothing of another company', async (user) => {
    expect(await count(user, inside(), relation.name, theirRows(relation))).toBe(0);
  });

  test.each<DatabaseUser>(['server', 'job', 'owner'])('shows the %s role nothing without a company', async (user) => {
    expect(await count(user, {}, relation.name)).toBe(0);
    expect(await count(user, { company_id: '' }, relation.name)).toBe(0);
    expect(await count(user, { company_id: randomUUID(), person_id: randomUUID() }, relation.name)).toBe(0);
  });
});

test.each(ofCompany.filter(({ kind }) => kind === 'r').map(({ name }) => name))(
  '%s takes no row for another company',
  async (name) => {
    const attempt = rowsAs(
      'owner',
      { company_id: ours.companyId },
      `insert into ${name} (company_id) values ('${theirs.companyId}')`,
    );
    await expect(attempt).rejects.toThrow(/row-level security policy|not written by hand/);
  },
);

test('no row moves from one company to another', async () => {
  const move = `update branches set company_id = '${theirs.companyId}'`;
  await expect(rowsAs('server', { company_id: ours.companyId }, move)).rejects.toThrow(/row-level security policy/);
});

test('changing and deleting do not reach another company', async () => {
  const settings = { company_id: ours.companyId };
  for (const text of ["update sites set name = 'x' where id = $1", 'delete from sites where id = $1'])
    expect(await rowsAs('server', settings, `${text} returning id`, [theirs.ids.siteId])).toEqual([]);
});

describe('a technician’s own records', () => {
  const narrowed = () => ({ company_id: ours.companyId, technician_id: ours.ids.technicianId });

  // What is computed from records, view by view, as their definitions tell.
  const computed = names.filter((name) => relations.some((r) => r.name === name && r.kind === 'v'));

  test('are all he sees of the records', async () => {
    for (const name of ['recoveries', 'recovery_facts']) {
      expect(await count('server', narrowed(), name)).toBe(3);
      expect(await count('server', narrowed(), name, `technician_id <> '${ours.ids.technicianId}'`)).toBe(0);
    }
  });

  test('are all that any view counts for him', async () => {
    const countingViews = computed.filter((name) =>
      relations.some((r) => r.name === name && (r.columns.includes('recoveries') || r.columns.includes('like_jobs'))),
    );
    expect(countingViews.length).toBeGreaterThanOrEqual(7);
    for (const name of countingViews) {
      const column = relations.find((r) => r.name === name)?.columns.includes('recoveries')
        ? 'recoveries'
        : 'like_jobs';
      const [row] = await rowsAs<{ n: number }>(
        'server',
        narrowed(),
        `select coalesce(sum(${column}), 0)::int as n from ${name}`,
      );
      expect(row?.n, name).toBeLessThanOrEqual(3);
    }
  });

  test('cannot become somebody else’s, nor he write for somebody else', async () => {
    const give = `update recoveries set technician_id = '${ours.ids.otherTechnicianId}'`;
    await expect(rowsAs('server', narrowed(), give)).rejects.toThrow(/row-level security policy/);
    const take = `update recoveries set notes = 'mine' where technician_id = '${ours.ids.otherTechnicianId}' returning id`;
    expect(await rowsAs('server', narrowed(), take)).toEqual([]);
  });
});
