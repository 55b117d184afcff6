import { createCompany } from '@/lib/auth/provision';
import type { Bench } from '@/lib/launch/bench';
import { asRole } from '../support/as-role';
import { fillCompany } from './many-records';

const RECORDS = 100_000;

const timed = async (work: () => Promise<void>): Promise<string> => {
  const began = performance.now();
  await work();
  return `${((performance.now() - began) / 1000).toFixed(2)} s`;
};

/** How long flags take to be renewed: all of a large company from nothing, all of them again, and after one edit. */
export const run = async ({ database }: Pick<Bench, 'database'>): Promise<void> => {
  Object.assign(process.env, { SERVER_DATABASE_URL: database.urls.server });
  // Loaded only now: these modules read the environment when they load.
  const { renewFlags } = await import('@/analytics/flag-renewal/renew');
  const companyId = await createCompany('bench flags');
  await fillCompany(database.urls.admin, companyId, RECORDS);
  const inCompany = <Row extends object>(text: string) =>
    asRole('server', { company_id: companyId }, async (client) => (await client.query<Row>(text)).rows);
  const first = await timed(() => renewFlags({ companyId }));
  const [found] = await inCompany<{ flags: number }>('select count(*)::int as flags from flags');
  await inCompany(
    `insert into flags_due (company_id, recovery_id) values ('${companyId}', '00000000-0000-0000-0000-000000000000')`,
  );
  const again = await timed(() => renewFlags({ companyId }));
  await inCompany(`update recoveries set recovered_mass_kg = 0.01 where record_ref = 'B-77'`);
  const [due] = await inCompany<{ due: number }>('select count(*)::int as due from flags_due');
  const edit = await timed(() => renewFlags({ companyId }));
  console.log(
    [
      `flags of ${RECORDS} records from nothing: ${first}, ${found?.flags} flags`,
      `  all of them again: ${again}`,
      `  after one edit, which touches ${due?.due} records: ${edit}`,
    ].join('\n'),
  );
};
