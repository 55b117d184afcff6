import { afterAll, beforeAll, expect, test } from 'vitest';
import { requestDueDigests } from '@/analytics/record-digest/request-due';
import { ALL_TASKS } from '@/analytics/tasks';
import { technicianRecoveries } from '@/analytics/technicians/contract';
import { PATCH as correct } from '@/app/api/recoveries/[id]/route';
import { GET as getSites } from '@/app/api/sites/route';
import { GET as getTechnicians } from '@/app/api/technicians/route';
import { withCompany } from '@/db/client';
import { recordDigests } from '@/db/schema/record-digests';
import { recoveries } from '@/db/schema/recoveries';
import { type RunningWorker, startWorker } from '@/lib/jobs/worker';
import { apiRequest, newCompany } from '../support/company';
import { at, takeIn } from '../support/imports';
import { recoveryFile } from '../support/recovery-file';
import { settled } from '../support/settled';

/** Above what is compared while somebody waits. */
const MANY = 6_000;

let worker: RunningWorker;
let company: Awaited<ReturnType<typeof newCompany>>;
let token = '';

beforeAll(async () => {
  worker = startWorker(ALL_TASKS);
  company = await newCompany();
  token = await company.token('owner');
  await takeIn(token, [...recoveryFile(MANY)].join(''));
  await settled(token);
}, 120_000);
afterAll(() => worker.stop());

const technicians = async (query = '') => {
  const response = await getTechnicians(apiRequest(`/api/technicians${query}`, token), undefined);
  return technicianRecoveries.response.parse(await response.json());
};
const digest = async () => {
  const [row] = await withCompany(company.scope, (tx) => tx.select().from(recordDigests));
  if (!row) throw new Error('The company has no digest');
  return row;
};
const correctOne = async () => {
  const [record] = await withCompany(company.scope, (tx) => tx.select().from(recoveries).limit(1));
  if (!record) throw new Error('The company has no record');
  const { version } = record;
  const body = JSON.stringify({ version, reason: 'a typing error', changes: { category: 'industrial_process' } });
  const path = `/api/recoveries/${record.id}`;
  const response = await correct(apiRequest(path, token, { method: 'PATCH', body }), at(record.id));
  expect(response.status, await response.clone().text()).toBe(200);
};

test('the comparison over all records stands ready, and is the one that the records give', async () => {
  const { items, judgedOn } = await technicians();
  expect(judgedOn).toMatchObject({ current: true, revision: (await digest()).revision });
  // The same records asked for by their dates are compared while one waits.
  const fresh = await technicians('?from=1990-01-01&to=2199-12-31');
  expect(fresh.judgedOn.madeAt).not.toBe(judgedOn.madeAt);
  expect(items).toEqual(fresh.items);
});

test('after a change an answer says that it is not in it yet, until it is', async () => {
  const before = await technicians();
  await correctOne();
  const meanwhile = await technicians();
  expect(meanwhile.judgedOn).toMatchObject({ current: false, revision: before.judgedOn.revision });
  await settled(token);
  const after = await technicians();
  expect(after.judgedOn.current).toBe(true);
  expect(after.judgedOn.revision).toBeGreaterThan(before.judgedOn.revision);
  expect(after.items).toEqual((await technicians('?from=1990-01-01&to=2199-12-31')).items);
});

test('suspicion is worked out with it, and said to be', async () => {
  const { suspectedAt } = await (await getSites(apiRequest('/api/sites', token), undefined)).json();
  expect(suspectedAt).toBe(new Date((await digest()).madeAt).toISOString());
});

test('a digest that was made otherwise is asked for at a start', async () => {
  const { version, digests } = await digest();
  await withCompany(company.scope, (tx) => tx.update(recordDigests).set({ version: version - 1 }));
  await requestDueDigests();
  await settled(token);
  expect(await digest()).toMatchObject({ version, digests: digests + 1 });
});
