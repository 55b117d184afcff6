import { randomUUID } from 'node:crypto';
import { beforeAll, expect, test } from 'vitest';
import { applianceRecoveries } from '@/analytics/appliances/contract';
import { piecesText } from '@/analytics/figures/pieces';
import { applianceHistorySchema, siteHistorySchema } from '@/analytics/visits/contract';
import { lowVisitsNote, nameplateChanges, nameplateNote, visitsAnswer } from '@/analytics/visits/sentence';
import { GET as applianceRoute } from '@/app/api/appliances/[id]/route';
import { GET as appliancesRoute } from '@/app/api/appliances/route';
import { GET as siteRoute } from '@/app/api/sites/[id]/route';
import { apiRequest, newCompany } from '../support/company';
import { writeRecords } from '../support/records';

const ours = await newCompany();
const theirs = await newCompany();
let office = '';

beforeAll(async () => {
  office = await ours.token('office');
  await writeRecords(ours.scope, [
    { on: '2025-03-02', site: 'Mill', appliance: 'RTU-1', kg: '4', chargeKg: '5', ref: 'first' },
    { on: '2024-03-02', site: 'Mill', appliance: 'RTU-1', kg: '2', chargeKg: '5', ref: 'before', jobType: 'repair' },
    { on: '2026-03-02', site: 'Mill', appliance: 'RTU-1', kg: '6', chargeKg: '8', ref: 'last' },
    { on: '2025-06-02', site: 'Mill', appliance: 'RTU-1', kg: '70', chargeKg: '5', ref: 'slip', excluded: true },
    { on: '2026-03-03', site: 'Mill', appliance: 'RTU-2', kg: '1', chargeKg: '2' },
  ]);
});

const idsOf = async (company: typeof ours) => {
  const response = await appliancesRoute(apiRequest('/api/appliances', await company.token('owner')), undefined);
  return applianceRecoveries.response.parse(await response.json()).items;
};
const context = (id: string) => ({ params: Promise.resolve({ id }) });
const plain = (text: string) => text.replaceAll('\u00a0', ' ').replaceAll('\u2011', '-');

test('an appliance has its own visits in time, entry errors among them and marked', async () => {
  const [unit] = await idsOf(ours);
  const id = unit?.applianceId ?? '';
  const response = await applianceRoute(apiRequest(`/api/appliances/${id}`, office), context(id));
  const history = applianceHistorySchema.parse(await response.json());
  expect(history).toMatchObject({ appliance: 'RTU-1', site: 'Mill', siteId: unit?.siteId });
  expect(history.visits.map(({ recordRef, counts }) => [recordRef, counts])).toEqual([
    ['before', true],
    ['first', true],
    ['slip', false],
    ['last', true],
  ]);
  expect(history.visits[0]).toMatchObject({
    recoveredMass: 2,
    nameplateCharge: 5,
    fullCharge: 5,
    yield: 0.4,
    jobType: 'repair',
    low: false,
  });
  // (2 + 4 + 6) of (5 + 5 + 8) kg.
  expect(plain(piecesText(visitsAnswer('RTU-1 at Mill', history.visits, 'kg')))).toBe(
    'RTU-1 at Mill gave 12.0 kg in 3 visits, 66.7% of the full charges.',
  );
  expect(nameplateChanges(history.visits).map(({ visit, before }) => [visit.recordRef, before])).toEqual([['last', 5]]);
  expect(plain(nameplateNote(history.visits, 'kg'))).toBe(
    'Its nameplate charge was written down differently once: 5.0 kg to 8.0 kg on Mar 2, 2026.',
  );
  // 8.2 lb is 3.7195 kg: written in kilograms it is the same nameplate.
  const [visit] = history.visits;
  const inTwoUnits = visit ? [3.719, 3.72, 3.7].map((nameplateCharge) => ({ ...visit, nameplateCharge })) : [];
  expect(nameplateChanges(inTwoUnits)).toEqual([]);
  expect(lowVisitsNote(history.visits)).toBe('None of the visits lies far below like jobs.');
  const low = history.visits.map((visit, index) => ({ ...visit, low: index < 2 }));
  expect(plain(lowVisitsNote(low))).toBe(
    '2 visits lie far below like jobs, the last on Mar 2, 2025: a reason to look, not a finding.',
  );
});

test('a site has the visits to all of its units', async () => {
  const [unit] = await idsOf(ours);
  const id = unit?.siteId ?? '';
  const response = await siteRoute(apiRequest(`/api/sites/${id}`, office), context(id));
  const history = siteHistorySchema.parse(await response.json());
  expect(history.site).toBe('Mill');
  expect(history.visits.map(({ appliance }) => appliance)).toEqual(['RTU-1', 'RTU-1', 'RTU-1', 'RTU-1', 'RTU-2']);
});

test('what another company has, nobody has and is no id is not here', async () => {
  const foreign = await theirs.token('owner');
  const [unit] = await idsOf(ours);
  for (const id of [unit?.applianceId ?? '', randomUUID(), 'RTU-1'])
    expect((await applianceRoute(apiRequest(`/api/appliances/${id}`, foreign), context(id))).status).toBe(404);
  for (const id of [unit?.siteId ?? '', randomUUID(), 'Mill'])
    expect((await siteRoute(apiRequest(`/api/sites/${id}`, foreign), context(id))).status).toBe(404);
});
