import { beforeAll, expect, test } from 'vitest';
import { applianceRecoveries } from '@/analytics/appliances/contract';
import { digestRecords } from '@/analytics/record-digest/digest';
import { siteRecoveries } from '@/analytics/sites/contract';
import { GET as getAppliances } from '@/app/api/appliances/route';
import { GET as getSites } from '@/app/api/sites/route';
import { apiRequest, newCompany } from '../../support/company';
import { writeRecords } from '../../support/records';

const company = await newCompany();
let token = '';

// 40 units at 20 sites, five visits each about 9 of 10 kg; RTU-0 of Site 0 came with a third of its charge at four of them.
beforeAll(async () => {
  token = await company.token('operations');
  const units = Array.from({ length: 40 }, (_, unit) => ({ site: `Site ${unit % 20}`, appliance: `RTU-${unit}` }));
  await writeRecords(
    company.scope,
    units.flatMap((unit, index) =>
      Array.from({ length: 5 }, (_, visit) => ({
        ...unit,
        on: `2026-0${visit + 1}-1${index % 9}`,
        chargeKg: '10',
        kg: index === 0 && visit > 0 ? '3.2' : (8.8 + ((index * 7 + visit * 3) % 10) * 0.05).toFixed(2),
      })),
    ),
  );
});

test('before the first digest nothing is said of any unit or site', async () => {
  const units = await (await getAppliances(apiRequest('/api/appliances', token), undefined)).json();
  const sites = await (await getSites(apiRequest('/api/sites', token), undefined)).json();
  for (const { suspectedAt, items } of [
    applianceRecoveries.response.parse(units),
    siteRecoveries.response.parse(sites),
  ]) {
    expect(suspectedAt).toBeNull();
    for (const item of items) expect(item).toMatchObject({ leakSuspicion: null, lowAgain: null });
  }
});

test('a unit that came short again and again is suspected, and no other is', async () => {
  await digestRecords({ companyId: company.companyId });
  const response = await getAppliances(apiRequest('/api/appliances', token), undefined);
  const { items } = applianceRecoveries.response.parse(await response.json());
  const suspected = items.filter(({ leakSuspicion }) => (leakSuspicion ?? 0) >= 0.8);
  expect(suspected.map(({ appliance, lowAgain }) => [appliance, lowAgain])).toEqual([['RTU-0', 3]]);
});

test('its site says so whatever the scope', async () => {
  const response = await getSites(apiRequest('/api/sites?from=2026-01&to=2026-01', token), undefined);
  const { items } = siteRecoveries.response.parse(await response.json());
  const site = items.find((one) => one.site === 'Site 0');
  expect(site).toMatchObject({ lowAgain: 1, suspected: 1 });
  expect(site?.leakSuspicion).toBeGreaterThan(0.8);
  expect(items.filter(({ suspected }) => suspected !== 0)).toHaveLength(1);
});
