import { beforeAll, expect, test } from 'vitest';
import { GET } from '@/app/api/recoveries/cylinder/route';
import { withCompany } from '@/db/client';
import { cylinders } from '@/db/schema/places';
import { recoveries } from '@/db/schema/recoveries';
import { apiRequest, newCompany } from '../support/company';
import { newPlaces, recoveryRow } from '../support/records';

const ours = await newCompany();
const theirs = await newCompany();

const holds = async (name: string, token: string) => {
  const response = await GET(apiRequest(`/api/recoveries/cylinder?name=${encodeURIComponent(name)}`, token), undefined);
  expect(response.status).toBe(200);
  return response.json();
};
const NOTHING = { meantFor: null, last: null };

let office = '';
let technician = '';
beforeAll(async () => {
  const { companyId } = ours;
  office = await ours.token('office');
  const colleague = await withCompany(ours.scope, async (tx) => {
    const places = await newPlaces(tx, companyId);
    const [one] = await tx
      .insert(cylinders)
      .values([
        { companyId, name: 'Y-12', refrigerant: 'R-410A' },
        { companyId, name: 'Empty one' },
      ])
      .returning({ id: cylinders.id });
    const filled = (recoveredOn: string, refrigerant: string) =>
      recoveryRow(companyId, places, { recoveredOn, refrigerant, cylinderId: one?.id ?? null });
    await tx.insert(recoveries).values([filled('2026-03-02', 'R-22'), filled('2026-03-01', 'R-410A')]);
    return places.technicianIds[1];
  });
  technician = await ours.token('technician', colleague);
});

test('tells what went in last and what the cylinder is meant for, however the name is spelled', async () => {
  const known = { meantFor: 'R-410A', last: { refrigerant: 'R-22', recoveredOn: '2026-03-02' } };
  expect(await holds('Y-12', office)).toEqual(known);
  expect(await holds(' y-12', office)).toEqual(known);
});

test('tells nothing of a cylinder that holds nothing, is unknown, or is another company’s', async () => {
  expect(await holds('Empty one', office)).toEqual(NOTHING);
  expect(await holds('Z-1', office)).toEqual(NOTHING);
  expect(await holds('Y-12', await theirs.token('office'))).toEqual(NOTHING);
});

test('a technician learns what the cylinder is meant for, not what his colleagues recovered', async () => {
  expect(await holds('Y-12', technician)).toEqual({ meantFor: 'R-410A', last: null });
});
