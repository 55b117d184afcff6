import { sql } from 'drizzle-orm';
import { expect, test } from 'vitest';
import { withCompany } from '@/db/client';
import { withConnection } from '@/db/cluster/roles';
import { technicianCertifications } from '@/db/schema/places';
import { addMember, createAccessToken } from '@/lib/auth/provision';
import { makeCompany } from '@/seed/company';
import { importTickets } from '@/seed/import-tickets';
import { loadPlaces } from '@/seed/load-places';
import { demoStateOf, isDemo, markDemo } from '@/seed/marker';
import { smallPlan } from '@/seed/plan';
import { removeCompany } from '@/seed/remove';
import { refsWith } from '@/seed/truth';
import { newCompany } from '@/tests/support/company';
import { look } from '@/tests/support/imports';

const OWNER_URL = process.env.OWNER_DATABASE_URL ?? '';

/** A company filled the way the demo is, in small. */
const filledCompany = async () => {
  const company = makeCompany({ ...smallPlan('2026-10'), sites: 12, scale: 0.04 });
  const made = await newCompany();
  await loadPlaces(made.companyId, company);
  const token = await made.token('office');
  const importId = await importTickets(
    {
      ...{ kind: 'program', actor: 'office', name: 'office', companyId: made.companyId, companyName: made.name },
      ...{ role: 'office', technicianId: null, timeZone: 'America/New_York', massUnit: 'lb' },
    },
    company.tickets,
    'tickets.csv',
  );
  return { ...made, company, token, importId };
};

/** Rows of the company in every table that holds a company's rows. */
const rowsLeft = (companyId: string): Promise<Record<string, number>> =>
  withConnection(process.env.ADMIN_DATABASE_URL ?? '', async (admin) => {
    const { rows: tables } = await admin.query<{ name: string }>(`
      select c.relname as name from pg_class c join pg_attribute a on a.attrelid = c.oid and a.attname = 'company_id'
      where c.relnamespace = 'public'::regnamespace and c.relkind = 'r'`);
    const counts: Record<string, number> = {};
    for (const { name } of tables) {
      const { rows } = await admin.query(`select count(*)::int as n from ${name} where company_id = $1`, [companyId]);
      if (rows[0].n > 0) counts[name] = rows[0].n;
    }
    return counts;
  });

test('tickets come in through the import, and the import shows it', async () => {
  const { company, token, importId, scope } = await filledCompany();
  const refused = refsWith(company.truth, 'refused').size;
  const view = await look(token, importId);
  expect(view).toMatchObject({ status: 'done', rowsRead: company.tickets.length, rejected: refused, updated: 0 });
  expect(view.added).toBe(company.tickets.length - refused);
  // The crew, the sites and the cylinders were known before: the file brought units only.
  const { appliances, ...known } = view.summary?.newNames ?? {};
  expect(appliances?.count).toBeGreaterThan(10);
  expect(Object.values(known).map(({ count }) => count)).toEqual([0, 0, 0, 0]);
  const cards = await withCompany(scope, (tx) => tx.select().from(technicianCertifications));
  expect(cards).toHaveLength(company.technicians.length);
});

test('a removed company leaves no row, and another company keeps all of its own', async () => {
  const [going, staying] = [await filledCompany(), await filledCompany()];
  const shared = { email: `both-${going.companyId}@example.test`, name: 'In Both', role: 'owner' as const };
  const alone = { ...shared, email: `one-${going.companyId}@example.test` };
  await addMember(going.companyId, alone);
  await addMember(going.companyId, shared);
  await addMember(staying.companyId, shared);
  await createAccessToken(going.companyId, { role: 'owner', label: 'gone with it' });
  const before = await rowsLeft(staying.companyId);
  expect(before).toMatchObject({ recoveries: expect.any(Number), history: expect.any(Number) });

  await removeCompany(OWNER_URL, going.companyId);

  expect(await rowsLeft(going.companyId)).toEqual({});
  expect(await rowsLeft(staying.companyId)).toEqual(before);
  const people = await withConnection(process.env.ADMIN_DATABASE_URL ?? '', (admin) =>
    admin.query('select email from people where email = any($1)', [[alone.email, shared.email]]),
  );
  expect(people.rows).toEqual([{ email: shared.email }]);
});

test('history is append-only again after a removal', async () => {
  const staying = await filledCompany();
  await removeCompany(OWNER_URL, (await filledCompany()).companyId);
  const change = withConnection(OWNER_URL, async (owner) => {
    await owner.query(`select set_config('app.company_id', $1, false)`, [staying.companyId]);
    await owner.query('delete from history where company_id = $1', [staying.companyId]);
  });
  await expect(change).rejects.toThrow('append-only');
  const [row] = (await withCompany(staying.scope, (tx) => tx.execute(sql`select history_break() as broken`))).rows;
  expect(row).toEqual({ broken: null });
});

test('only a marked company is a demo', async () => {
  const { companyId } = await newCompany();
  expect(await demoStateOf(companyId)).toBe('none');
  await markDemo(companyId, 'begun');
  expect([await demoStateOf(companyId), await isDemo(companyId)]).toEqual(['begun', true]);
  await markDemo(companyId, 'whole');
  expect(await demoStateOf(companyId)).toBe('whole');
});
