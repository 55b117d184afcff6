import fc from 'fast-check';
import { beforeAll, expect, test } from 'vitest';
import { SORTS, type Sort } from '@/analytics/records/constants';
import type { RecordList, RecordRow } from '@/analytics/records/contract';
import { GET } from '@/app/api/recoveries/route';
import { apiRequest, newCompany } from '../support/company';
import { addRecoveries, newPlaces, type Places } from '../support/ticket-records';

let company: Awaited<ReturnType<typeof newCompany>>;
let places: Places;
let token: string;
let ids: string[];

const page = async (sort: Sort, limit: number, cursor?: string | null): Promise<RecordList> => {
  const search = new URLSearchParams({ sort, limit: String(limit), ...(cursor ? { cursor } : {}) });
  const response = await GET(apiRequest(`/api/recoveries?${search}`, token), undefined);
  expect(response.status).toBe(200);
  return (await response.json()) as RecordList;
};

const walk = async (
  sort: Sort,
  limit: number,
  step: 'nextCursor' | 'previousCursor' = 'nextCursor',
  from?: string | null,
  between: () => Promise<unknown> = async () => undefined,
): Promise<RecordRow[]> => {
  const rows: RecordRow[] = [];
  for (let cursor = from; ; ) {
    const got = await page(sort, limit, cursor);
    rows.splice(step === 'nextCursor' ? rows.length : 0, 0, ...got.items);
    cursor = got[step];
    if (!cursor) return rows;
    await between();
  }
};

// Few values for many records: ties and blanks everywhere.
beforeAll(async () => {
  company = await newCompany();
  token = await company.token('owner');
  places = await newPlaces(company.scope);
  ids = await addRecoveries(
    company.scope,
    places,
    Array.from({ length: 60 }, (_, index) => ({
      recoveredOn: `2026-0${1 + (index % 3)}-01`,
      recoveredMassKg: String(1 + (index % 4)),
      nameplateChargeKg: String(3 + (index % 5)),
      refrigerant: index % 2 ? 'R-22' : 'R-410A',
      technicianId: index % 3 ? places.technicianId : places.otherTechnicianId,
      branchId: index % 4 ? places.branchId : null,
      cylinderId: index % 5 ? null : places.cylinderId,
      category: ([null, 'other', 'small_appliance'] as const)[index % 3] ?? null,
      jobType: ([null, 'repair'] as const)[index % 2] ?? null,
    })),
  );
});

test('pages of any size walk every record exactly once in every sort, forth and back', async () => {
  await fc.assert(
    fc.asyncProperty(fc.constantFrom(...SORTS), fc.integer({ min: 4, max: 70 }), async (sort, limit) => {
      const whole = (await page(sort, 500)).items.map(({ id }) => id);
      expect([...whole].sort()).toEqual([...ids].sort());
      const forth = (await walk(sort, limit)).map(({ id }) => id);
      expect(forth).toEqual(whole);
      const first = await page(sort, 59);
      const last = await page(sort, 5, first.nextCursor);
      const back = (await walk(sort, limit, 'previousCursor', last.previousCursor)).map(({ id }) => id);
      expect(back).toEqual(whole.slice(0, 59));
    }),
    { numRuns: 60, seed: 20261201 },
  );
}, 120_000);

test('a record that comes in while somebody pages repeats or hides no other', async () => {
  const other = await newCompany();
  const mine = token;
  token = await other.token('owner');
  const there = await newPlaces(other.scope);
  const first = await addRecoveries(
    other.scope,
    there,
    Array.from({ length: 20 }, (_, index) => ({ recoveredOn: `2026-03-${String(index + 1).padStart(2, '0')}` })),
  );
  let count = 0;
  const insert = () =>
    addRecoveries(other.scope, there, [
      { recordRef: `new ${++count}`, recoveredOn: count % 2 ? '2026-03-31' : '2026-03-01', branchId: there.branchId },
    ]);
  for (const sort of ['-recoveredOn', 'recoveredMass', '-branch', 'recordRef'] as const) {
    const seen = (await walk(sort, 3, 'nextCursor', undefined, insert)).map(({ id }) => id);
    expect(new Set(seen).size).toBe(seen.length);
    expect(seen).toEqual(expect.arrayContaining(first));
  }
  token = mine;
});

test('a cursor of another sort, or one made by hand, is refused with 400', async () => {
  const { nextCursor } = await page('-recoveredOn', 2);
  const forged = (content: unknown) => Buffer.from(JSON.stringify(content)).toString('base64url');
  const id = ids[0];
  const bad = [
    ['recordRef', nextCursor],
    ['recoveredOn', forged({ sort: 'recoveredOn', value: "1' or true --", id, back: false })],
    ['recoveredOn', forged({ sort: 'recoveredOn', value: '2026-02-31', id, back: false })],
    ['recoveredOn', forged({ sort: 'recoveredOn', value: null, id, back: false })],
    ['recoveredMass', forged({ sort: 'recoveredMass', value: 'NaN', id, back: false })],
    ['yield', forged({ sort: 'yield', value: '1e999', id, back: false })],
    ['site', forged({ sort: 'site', value: '\0', id, back: false })],
    ['site', forged({ sort: 'site', value: 'x', id: '7', back: false })],
    ['site', forged({ sort: 'site', value: 'x', id, back: false, more: 1 })],
    ['site', forged(null)],
  ] as const;
  for (const [sort, cursor] of bad) {
    const search = new URLSearchParams({ sort, cursor: cursor ?? '' });
    const response = await GET(apiRequest(`/api/recoveries?${search}`, token), undefined);
    expect([sort, response.status]).toEqual([sort, 400]);
  }
});
