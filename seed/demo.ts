import { Temporal } from 'temporal-polyfill';
import { withConnection } from '@/db/cluster/roles';
import type { DatabaseUrls } from '@/db/cluster/urls';
import { companiesNamed, createCompany } from '@/lib/auth/provision';
import type { Viewer } from '@/lib/auth/viewer';
import { monthBefore } from './calendar';
import { type DemoCompany, makeCompany } from './company';
import { importAdditions } from './import-additions';
import { importTickets } from './import-tickets';
import { stateLeakSettings } from './leak-settings';
import { loadPlaces } from './load-places';
import { demoStateOf, markDemo } from './marker';
import { COMPANY_NAME, SMALL_COMPANY_NAME } from './names';
import { demoPlan, type Plan, smallPlan } from './plan';
import { removeCompany } from './remove';
import { addCrewSignIns, addSmallOwner } from './sign-ins';

export { DEMO_SIGN_INS } from './sign-ins';

/** Names of the two demo companies. */
export const DEMO_COMPANIES = [COMPANY_NAME, SMALL_COMPANY_NAME] as const;
const TIME_ZONE = 'America/New_York';

/** Makes one company; `addPeople` gives the id of the person who then hands the file of tickets in. */
const makeOne = async (
  plan: Plan,
  addPeople: (companyId: string, company: DemoCompany) => Promise<string>,
): Promise<string> => {
  const company = makeCompany(plan);
  const companyId = await createCompany(plan.company, { timeZone: TIME_ZONE });
  await markDemo(companyId, 'begun');
  await loadPlaces(companyId, company);
  const actor = await addPeople(companyId, company);
  const viewer: Viewer = {
    ...{ kind: 'program', actor, name: 'demo', companyId, companyName: plan.company },
    ...{ role: 'office', technicianId: null, timeZone: TIME_ZONE, massUnit: 'lb' },
  };
  await importTickets(viewer, company.tickets, `recovery tickets until ${plan.endMonth}.csv`);
  await importAdditions(viewer, company);
  await stateLeakSettings(viewer, company);
  return companyId;
};

/** Until the server has counted what came in it plans for next to nothing, and the first screens would wait for it. */
const countRows = (urls: DatabaseUrls) => withConnection(urls.owner, (owner) => owner.query('analyze'));

const makeDemo = async (urls: DatabaseUrls): Promise<void> => {
  const endMonth = monthBefore(Temporal.Now.instant(), TIME_ZONE);
  const made = [await makeOne(demoPlan(endMonth), addCrewSignIns), await makeOne(smallPlan(endMonth), addSmallOwner)];
  await countRows(urls);
  for (const companyId of made) await markDemo(companyId, 'whole');
};

const demoCompanies = async () => {
  const ids = (await Promise.all(DEMO_COMPANIES.map(companiesNamed))).flat();
  const all = await Promise.all(ids.map(async (id) => ({ id, state: await demoStateOf(id) })));
  return all.filter(({ state }) => state !== 'none');
};

/** Whether the database has never held a company: its table has no page yet. Needs no right to see anybody's rows. */
const isUntouched = (urls: DatabaseUrls): Promise<boolean> =>
  withConnection(urls.owner, async (owner) => {
    const { rows } = await owner.query<{ untouched: boolean }>(
      `select pg_relation_size('public.companies') = 0 as untouched`,
    );
    return rows[0]?.untouched === true;
  });

/**
 * Fills a database that has never held a company with the demo; makes a demo anew whose making was broken off. Does
 * nothing anywhere else. Throws the database's own error.
 */
export const seedDemoIfEmpty = async (urls: DatabaseUrls, say: (line: string) => void): Promise<void> => {
  const found = await demoCompanies();
  const broken = found.some(({ state }) => state === 'begun');
  if (!broken && !(await isUntouched(urls))) return;
  say('filling the demo company');
  for (const { id } of found) await removeCompany(urls.owner, id);
  await makeDemo(urls);
};

/** Removes the demo companies and makes them anew; other companies stay as they are. */
export const resetDemo = async (urls: DatabaseUrls): Promise<void> => {
  for (const { id } of await demoCompanies()) await removeCompany(urls.owner, id);
  await makeDemo(urls);
};
