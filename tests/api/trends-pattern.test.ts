import { beforeAll, expect, test } from 'vitest';
import { monthlyPattern } from '@/analytics/monthly-pattern/contract';
import { getMonthlyPattern } from '@/analytics/monthly-pattern/query';
import { everyMonth } from '@/analytics/monthly-trends/series';
import { GET } from '@/app/api/trends/pattern/route';
import { readCompany } from '@/db/client';
import { apiRequest, newCompany } from '../support/company';
import { type TestRecord, writeRecords } from '../support/records';

const ours = await newCompany();
const theirs = await newCompany();
const NOW = { now: new Date('2026-12-09T12:00:00Z'), timeZone: 'America/New_York' };
const MONTHS = everyMonth('2024-01', '2026-11');

/** Five routine jobs a month of 10 to 14 kg, a flood in October 2026, and a chiller now and then. */
const jobs = (month: string): TestRecord[] =>
  Array.from({ length: 5 }, (_, n) => ({
    on: `${month}-1${n}`,
    kg: String(month === '2026-10' ? 90 + n : 10 + ((n * 3 + Number(month.slice(5))) % 5)),
    chargeKg: '40',
    branch: 'East',
  }));

beforeAll(async () => {
  await writeRecords(ours.scope, [
    ...MONTHS.flatMap(jobs),
    // 100 lb is 45.359237 kg: large plant from there on.
    { on: '2024-05-20', kg: '40', chargeKg: '45.359237', branch: 'East' },
    { on: '2026-06-20', kg: '400', chargeKg: '450', branch: 'East' },
    { on: '2026-12-05', kg: '1' },
    { on: '2026-06-15', kg: '5000', excluded: true },
  ]);
  await writeRecords(theirs.scope, [{ on: '2026-03-10', kg: '999' }]);
});

const ask = async (query: Record<string, string> = {}, company = ours) => {
  const answer = await readCompany(company.scope, (tx) =>
    getMonthlyPattern(tx, monthlyPattern.query.parse(query), NOW),
  );
  return monthlyPattern.response.parse(answer);
};

test('judges whole months from the first record on, and leaves the running one out', async () => {
  const { pattern, missing } = await ask({ from: '2026-09' });
  expect(missing).toBeNull();
  expect(pattern?.months.map(({ month }) => month)).toEqual(MONTHS);
  const unusual = pattern?.months.filter(({ signals }) => signals.includes('beyondLimits'));
  expect(unusual?.map(({ month }) => month)).toContain('2026-10');
  // 90 + 91 + 92 + 93 + 94 kg.
  expect(unusual?.find(({ month }) => month === '2026-10')).toMatchObject({ recoveredMass: 460, recoveries: 5 });
});

test('a narrowed scope that holds all records gives the same', async () => {
  expect(await ask({ branch: 'East' })).toEqual(await ask());
});

test('leaves large plant out and says how much it was', async () => {
  const { pattern, large } = await ask();
  const june = pattern?.months.find(({ month }) => month === '2026-06');
  // Five jobs of 10 + (3 n + 6) mod 5 kg: 11, 14, 12, 10, 13.
  expect(june).toMatchObject({ recoveredMass: 60, recoveries: 5 });
  expect(large).toMatchObject({ fromFullCharge: 45.359237, recoveries: 2, recoveredMass: 440 });
});

test('ends where the scope ends, without a month that it cuts', async () => {
  expect((await ask({ to: '2026-08' })).pattern?.months.at(-1)?.month).toBe('2026-08');
  expect((await ask({ to: '2026-08-20' })).pattern?.months.at(-1)?.month).toBe('2026-07');
});

test('says what is missing', async () => {
  expect(await ask({ to: '2025-06' })).toMatchObject({
    pattern: null,
    missing: { needs: 24, has: 18, of: 'full months' },
  });
  expect(await ask({}, theirs)).toMatchObject({ pattern: null, missing: { needs: 24, has: 1, of: 'full months' } });
  expect((await ask({ branch: 'West' })).missing).toEqual({ needs: 24, has: 0, of: 'full months' });
});

test('over HTTP: bad input is refused, other roles too', async () => {
  const get = async (query: string, token: string) => {
    const response = await GET(apiRequest(`/api/trends/pattern${query}`, token), undefined);
    return { status: response.status, body: await response.json() };
  };
  const owner = await ours.token('owner');
  expect((await get('', owner)).status).toBe(200);
  const refused = await get('?to=2026-13', owner);
  expect([refused.status, refused.body.errors?.[0]?.path]).toEqual([400, 'to']);
  expect((await get('', await ours.token('auditor'))).status).toBe(403);
});
