import { beforeAll, expect, test } from 'vitest';
import { technicianPersonSchema } from '@/analytics/technician-person/contract';
import { technicianRecoveries } from '@/analytics/technicians/contract';
import { GET } from '@/app/api/technicians/[id]/route';
import { GET as GET_ALL } from '@/app/api/technicians/route';
import { withCompany } from '@/db/client';
import { coaching } from '@/db/schema/coaching';
import { crewOf, crewWith } from '../analytics/technician-comparison/crew';
import { apiRequest, newCompany } from '../support/company';
import { writeRecords } from '../support/records';

const company = await newCompany();
const foreign = await (await newCompany()).token('owner');
const token = await company.token('trainer');
/** Eleven people of whom Cleo leaves ten points more than the others. */
const crew = crewOf(crewWith({ id: 'Cleo', leaves: 0.1 }), 21);
const COACHED_ON = '2026-01-15';

const all = async () =>
  technicianRecoveries.response.parse(await (await GET_ALL(apiRequest('/api/technicians', token), undefined)).json())
    .items;
const ask = async (id: string, who = token) => {
  const response = await GET(apiRequest(`/api/technicians/${id}`, who), { params: Promise.resolve({ id }) });
  return { status: response.status, text: await response.text() };
};
const cleoRow = async () => {
  const row = (await all()).find(({ technician }) => technician === 'Cleo');
  if (!row) throw new Error('The crew has a Cleo');
  return row;
};

beforeAll(async () => {
  await writeRecords(
    company.scope,
    crew.map((job) => ({
      on: job.recoveredOn,
      technician: job.technicianId,
      kg: job.recoveredMassKg.toFixed(6),
      chargeKg: '5',
      category: 'comfort_cooling' as const,
      jobType: job.jobType === 'repair' ? ('repair' as const) : ('service' as const),
      vacuumKpaAbs: (job.finalVacuumKpaAbs ?? 0).toFixed(6),
    })),
  );
  const { technicianId } = await cleoRow();
  await withCompany(company.scope, (tx) =>
    tx
      .insert(coaching)
      .values({ companyId: company.companyId, technicianId, startedOn: COACHED_ON, plan: 'Hold', writtenBy: 'test' }),
  );
});

test('the page of a technician says what the screen of the crew says', async () => {
  const row = await cleoRow();
  const { status, text } = await ask(row.technicianId);
  expect(status).toBe(200);
  const person = technicianPersonSchema.parse(JSON.parse(text));
  expect(person.judgement).toMatchObject({
    verdict: 'below',
    effect: row.effect,
    low: row.low,
    high: row.high,
    why: row.why,
  });
  expect(person.recoveries).toBe(row.recoveries);
  expect(person.course?.months.reduce((sum, { jobs }) => sum + jobs, 0)).toBe(row.judgedJobs);
  expect(person.course?.coaching.map(({ startedOn }) => startedOn)).toEqual([COACHED_ON]);
});

test('it names no colleague', async () => {
  const { technicianId } = await cleoRow();
  const { text } = await ask(technicianId);
  for (const { technician } of await all()) if (technician !== 'Cleo') expect(text).not.toContain(`"${technician}"`);
});

test('another company’s technician is not there', async () => {
  const { technicianId } = await cleoRow();
  expect((await ask(technicianId, foreign)).status).toBe(404);
  expect((await ask('not-an-id')).status).toBe(404);
});
