import { beforeAll, expect, test } from 'vitest';
import { siteLeaksSchema, siteMethodSchema } from '@/analytics/leak-rate/contract';
import { PUT as putSubsector } from '@/app/api/appliances/[id]/subsector/route';
import { PUT as putMethod } from '@/app/api/sites/[id]/leak-method/route';
import { GET as getSiteLeaks } from '@/app/api/sites/[id]/leaks/route';
import { apiRequest, newCompany } from '../../support/company';
import { add, leaksOf, sent } from '../../support/leaks';
import { addRecoveries, newPlaces, type Places } from '../../support/ticket-records';

const KG_PER_LB = 0.45359237;
const company = await newCompany();
let token = '';
let places: Places;
const at = (id: string) => ({ params: Promise.resolve({ id }) });

beforeAll(async () => {
  token = await company.token('operations');
  places = await newPlaces(company.scope);
  const rack = { refrigerant: 'R-404A', category: 'commercial_refrigeration' as const };
  // A 200 lb rack; once its plate was misread tenfold.
  const usual = { ...rack, nameplateChargeKg: String(200 * KG_PER_LB), recoveredMassKg: '80' };
  await addRecoveries(company.scope, places, [
    usual,
    { ...usual, recoveredOn: '2025-03-10' },
    { ...usual, recoveredOn: '2025-06-10', nameplateChargeKg: String(2000 * KG_PER_LB) },
  ]);
  for (const [addedOn, addedCharge] of [
    ['2025-07-01', '10'],
    ['2026-01-02', '15'],
    ['2026-05-28', '20.0'],
  ])
    await add(token, { applianceId: places.applianceId, addedOn, addedCharge, massUnit: 'lb', reason: 'leak_top_up' });
});

const choose = (body: object) =>
  putMethod(sent(`/api/sites/${places.siteId}/leak-method`, token, body, 'PUT'), at(places.siteId));

test('takes the full charge most records state, and annualizes while nobody has chosen', async () => {
  const leaks = await leaksOf(token, places.applianceId);
  expect(leaks.fullCharge).toBe(90.718);
  expect(leaks).toMatchObject({ methodUsed: 'annualizing', method: { method: null, version: 0 }, trigger: 20 });
  const last = leaks.events.at(-1)?.rate;
  // 40 CFR 82.152, worked by hand: 20 ÷ 200 × 365 ÷ 146 = 25.0 %, above the 20 % of commercial refrigeration.
  expect(last).toMatchObject({ percent: 25, above: true, close: false, trigger: 20, paragraphs: ['40 CFR 84.106'] });
  expect(last?.low).toBeLessThan(25);
  expect(last?.high).toBeGreaterThan(25);
});

test('before a rule was in force nothing is held against it', async () => {
  const [first] = (await leaksOf(token, places.applianceId)).events;
  expect(first?.rate).toMatchObject({ after: null, paragraphs: [], trigger: null, above: null });
});

test('the site’s method is chosen once for all its appliances and kept with its history', async () => {
  const first = siteMethodSchema.parse(await (await choose({ method: 'annualizing', version: 0 })).json());
  expect(first).toMatchObject({ method: 'annualizing', version: 1 });
  expect((await choose({ method: 'rolling_average', version: 0, why: 'late' })).status).toBe(409);
  expect((await choose({ method: 'rolling_average', version: 1 })).status).toBe(400);
  expect((await choose({ method: 'by eye', version: 1 })).status).toBe(400);
  const why = 'the owner keeps this one';
  const second = siteMethodSchema.parse(await (await choose({ method: 'rolling_average', version: 1, why })).json());
  expect(second.history.map(({ method }) => method)).toEqual(['rolling_average', 'annualizing']);
  expect(second.history[0]?.why).toBe(why);
  const leaks = await leaksOf(token, places.applianceId);
  // (10 + 15 + 20) ÷ 200: all three lie within the 365 days up to 28 May 2026.
  expect(leaks).toMatchObject({ methodUsed: 'rolling_average' });
  expect(leaks.events.at(-1)?.rate).toMatchObject({ percent: 22.5, after: '2025-05-28' });
});

test('the site lists its appliances with their last rate', async () => {
  const response = await getSiteLeaks(apiRequest(`/api/sites/${places.siteId}/leaks`, token), at(places.siteId));
  const site = siteLeaksSchema.parse(await response.json());
  expect(site).toMatchObject({ site: 'Mill Street School', excess: null });
  expect(site.appliances[0]).toMatchObject({ appliance: 'RTU-1', additions: 3, lastRate: { addedOn: '2026-05-28' } });
});

test('nothing is said of a leak from a company with few appliances', async () => {
  const { suspicion } = await leaksOf(token, places.applianceId);
  expect(suspicion.leakSuspicion).toBeNull();
});

test('somebody says whether a unit is light commercial', async () => {
  const path = `/api/appliances/${places.applianceId}/subsector`;
  const state = (lightCommercial: unknown) =>
    putSubsector(sent(path, token, { lightCommercial }, 'PUT'), at(places.applianceId));
  expect((await state(true)).status).toBe(200);
  expect((await leaksOf(token, places.applianceId)).lightCommercial).toBe(true);
  expect((await state('yes')).status).toBe(400);
  expect((await state(null)).status).toBe(200);
});
