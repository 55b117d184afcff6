import { expect, test } from 'vitest';
import type { ScopeOptions } from '@/analytics/scope-options/contract';
import { GET } from '@/app/api/scope-options/route';
import { withCompany } from '@/db/client';
import { recoveries } from '@/db/schema/recoveries';
import { apiRequest, newCompany } from '../support/company';
import { newPlaces, recoveryRow } from '../support/records';

const companyWithRecords = async () => {
  const company = await newCompany();
  const { companyId } = company;
  const places = await withCompany(company.scope, async (tx) => {
    const made = await newPlaces(tx, companyId);
    const [ada, ben] = made.technicianIds;
    const [north] = made.branchIds;
    await tx
      .insert(recoveries)
      .values([
        recoveryRow(companyId, made, { technicianId: ada ?? '', branchId: north ?? null, category: 'comfort_cooling' }),
        recoveryRow(companyId, made, { technicianId: ada ?? '', recoveredOn: '2024-12-31', jobType: 'disposal' }),
        recoveryRow(companyId, made, { technicianId: ben ?? '', recoveredOn: '2026-01-01', refrigerant: 'R-22' }),
      ]);
    return made;
  });
  return { ...company, places };
};

const ask = async (token: string): Promise<ScopeOptions> => {
  const response = await GET(apiRequest('/api/scope-options', token), undefined);
  expect(response.status).toBe(200);
  return (await response.json()) as ScopeOptions;
};

test('every value comes with the number of its records, the most frequent first', async () => {
  const { token } = await companyWithRecords();
  const options = await ask(await token('owner'));
  expect(options.refrigerant).toEqual([
    { value: 'R-410A', recoveries: 2 },
    { value: 'R-22', recoveries: 1 },
  ]);
  expect(options.technician).toEqual([
    { value: 'Ada Moss', recoveries: 2 },
    { value: 'Ben Oyelaran', recoveries: 1 },
  ]);
  expect(options.site).toEqual([{ value: 'Mill Street', recoveries: 3 }]);
});

test('records that do not state a dimension are counted as unstated', async () => {
  const { token } = await companyWithRecords();
  const options = await ask(await token('owner'));
  expect(options.branch).toEqual([
    { value: 'unstated', recoveries: 2 },
    { value: 'North', recoveries: 1 },
  ]);
  expect(options.jobType).toEqual([
    { value: 'unstated', recoveries: 2 },
    { value: 'disposal', recoveries: 1 },
  ]);
});

test('the months span the first and the last record', async () => {
  const { token } = await companyWithRecords();
  expect(await ask(await token('owner'))).toMatchObject({ recoveries: 3, firstMonth: '2024-12', lastMonth: '2026-01' });
});

test('a technician learns of no colleague', async () => {
  const { token, places } = await companyWithRecords();
  const options = await ask(await token('technician', places.technicianIds[1]));
  expect(options.recoveries).toBe(1);
  expect(options.technician).toEqual([{ value: 'Ben Oyelaran', recoveries: 1 }]);
  expect(options.branch).toEqual([{ value: 'unstated', recoveries: 1 }]);
});

test('a company without records has nothing to choose from', async () => {
  const { token } = await newCompany();
  expect(await ask(await token('owner'))).toEqual({
    recoveries: 0,
    firstMonth: null,
    lastMonth: null,
    branch: [],
    refrigerant: [],
    technician: [],
    site: [],
    category: [],
    jobType: [],
  });
});
