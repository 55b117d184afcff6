import { beforeAll, expect, test } from 'vitest';
import { type LowRecoveries, lowRecoveriesList } from '@/analytics/low-recoveries/contract';
import { GET } from '@/app/api/low-recoveries/route';
import { apiRequest, newCompany } from '../support/company';
import { type TestRecord, writeRecords } from '../support/records';

/**
 * Miles per gallon of 32 cars: Henderson and Velleman, Biometrics 37 (1981) 391-411, R's `mtcars`. R's documentation
 * prints summary(mtcars$mpg) = 10.40 15.43 19.20 20.09 22.80 33.90 (quartiles of type 7: 15.425 and 22.80).
 */
const MPG = [
  21.0, 21.0, 22.8, 21.4, 18.7, 18.1, 14.3, 24.4, 22.8, 19.2, 17.8, 16.4, 17.3, 15.2, 10.4, 10.4, 14.7, 32.4, 30.4,
  33.9, 21.5, 15.5, 15.2, 13.3, 19.2, 27.3, 26.0, 30.4, 15.8, 19.7, 15.0, 21.4,
];
// Turned about: a pull of 40 - mpg out of 40 kg. Quartiles 17.2 and 24.575, median 20.8, lower fence 17.2 - 1.5 x 7.375
// = 6.1375 kg; only the car of 33.9 mpg (6.1 kg) lies below it.
const turned: TestRecord[] = MPG.map((mpg, i) => ({
  on: '2026-03-01',
  kg: (40 - mpg).toFixed(1),
  chargeKg: '40',
  ref: `car-${i}`,
}));
const alike = (count: number, rest: Partial<TestRecord>): TestRecord[] =>
  Array.from({ length: count }, () => ({ on: '2026-01-05', kg: '9', chargeKg: '10', ...rest }));

const ours = await newCompany();
const theirs = await newCompany();
let trainer = '';

const ask = async (query = '', token = trainer): Promise<LowRecoveries> => {
  const response = await GET(apiRequest(`/api/low-recoveries${query}`, token), undefined);
  expect(response.status).toBe(200);
  return lowRecoveriesList.response.parse(await response.json());
};

beforeAll(async () => {
  trainer = await ours.token('trainer');
  await writeRecords(ours.scope, [
    ...turned,
    // Nineteen like jobs and one far below: the twentieth makes the group large enough to judge.
    ...alike(19, { refrigerant: 'R-22', category: 'comfort_cooling' }),
    { on: '2026-05-01', kg: '1', refrigerant: 'R-22', category: 'comfort_cooling', ref: 'judged' },
    // Eighteen and one: about these nothing is said.
    ...alike(18, { refrigerant: 'R-32' }),
    { on: '2026-05-02', kg: '1', refrigerant: 'R-32', ref: 'not judged' },
    // An entry error is not judged and does not move the quartiles.
    { on: '2026-05-03', kg: '0', chargeKg: '40', excluded: true, ref: 'excluded' },
  ]);
  await writeRecords(theirs.scope, alike(40, {}));
});

test('lower fence and quartiles are those of the published example', async () => {
  const { items } = await ask('?refrigerant=R-410A');
  expect(items).toHaveLength(1);
  expect(items[0]).toMatchObject({
    recordRef: 'car-19',
    recoveredMass: 6.1,
    fullCharge: 40,
    category: 'unstated',
    likeJobs: 32,
    technician: 'Tess Ward',
  });
  expect(items[0]?.lowerQuartile).toBeCloseTo(17.2 / 40, 12);
  expect(items[0]?.medianYield).toBeCloseTo(20.8 / 40, 12);
  expect(items[0]?.upperQuartile).toBeCloseTo(24.575 / 40, 12);
  expect(items[0]?.lowerFence).toBeCloseTo(6.1375 / 40, 12);
});

test('says nothing about fewer than twenty like jobs, and how many those are', async () => {
  const { items, judged } = await ask();
  expect(items.map((item) => item.recordRef)).toEqual(['judged', 'car-19']);
  expect(judged).toEqual({ records: 52, groups: 2, tooFewLikeJobs: 19, low: 2 });
});

test('like jobs are the company’s whole record, whatever the scope', async () => {
  const { items, judged } = await ask('?from=2026-05&to=2026-05');
  expect(items.map((item) => [item.recordRef, item.likeJobs])).toEqual([['judged', 20]]);
  expect(judged).toEqual({ records: 1, groups: 1, tooFewLikeJobs: 1, low: 1 });
});

test('pages follow each other in both orders', async () => {
  for (const [order, refs] of [
    ['extreme', ['judged', 'car-19']],
    ['newest', ['judged', 'car-19']],
  ] as const) {
    const first = await ask(`?order=${order}&limit=1`);
    expect(first.items.map((item) => item.recordRef)).toEqual([refs[0]]);
    const second = await ask(`?order=${order}&limit=1&cursor=${first.nextCursor}`);
    expect(second.items.map((item) => item.recordRef)).toEqual([refs[1]]);
    expect(second.nextCursor).toBeNull();
  }
});

test('foreign cursors and limits are refused with their path', async () => {
  const newest = await ask('?order=newest&limit=1');
  const forged = Buffer.from('["newest","2026-99-99","x"]').toString('base64url');
  for (const [query, path] of [
    ['?cursor=nonsense', 'cursor'],
    [`?order=newest&cursor=${forged}`, 'cursor'],
    [`?order=extreme&cursor=${newest.nextCursor}`, 'cursor'],
    ['?limit=0', 'limit'],
    ['?limit=501', 'limit'],
    ['?from=2026-05&to=2026-04', 'to'],
  ] as const) {
    const response = await GET(apiRequest(`/api/low-recoveries${query}`, trainer), undefined);
    const body = await response.json();
    expect([query, response.status, body.errors?.[0]?.path]).toEqual([query, 400, path]);
  }
});

test('another company shows only its own, and office may not look', async () => {
  expect(await ask('', await theirs.token('owner'))).toMatchObject({ items: [], judged: { records: 40, low: 0 } });
  const response = await GET(apiRequest('/api/low-recoveries', await ours.token('office')), undefined);
  expect(response.status).toBe(403);
});
