import { randomUUID } from 'node:crypto';
import { beforeAll, expect, test } from 'vitest';
import { start } from '@/analytics/start/contract';
import { latelyFrom } from '@/analytics/start/period';
import { getStart } from '@/analytics/start/query';
import { GET } from '@/app/api/start/route';
import { readCompany, withCompany } from '@/db/client';
import { importRows, imports } from '@/db/schema/imports';
import { notes } from '@/db/schema/notes';
import { type FlagRule, ROLES, type Role } from '@/lib/vocabulary';
import { apiRequest, newCompany } from '../support/company';
import { putFlags } from '../support/flags';
import { type TestRecord, writeRecords } from '../support/records';

const ours = await newCompany();
const theirs = await newCompany();
const none = await newCompany();
/** The day of these tests: December is running, November is the last whole month. */
const TODAY = '2026-12-09';

const startOf = async (role: Role, company = ours) =>
  start.response.parse(await readCompany(company.scope, (tx) => getStart(tx, role, TODAY)));
const kinds = async (role: Role) => (await startOf(role)).waiting.map(({ kind, count }) => [kind, count]);

const alike: TestRecord[] = Array.from({ length: 20 }, (_, n) => ({
  on: `2025-11-0${1 + (n % 9)}`,
  kg: n % 2 ? '9' : '8',
  chargeKg: '10',
}));

const writeImport = async (status: 'done' | 'failed', dryRun: boolean, refusedRefs: (string | null)[] = []) =>
  withCompany(ours.scope, async (tx) => {
    const { companyId } = ours;
    const id = randomUUID();
    const fileName = `${status}${dryRun ? ' preview' : ''}.csv`;
    const at = '2026-12-01T10:00:00Z';
    await tx.insert(imports).values({
      ...{ companyId, id, fileName, status, dryRun, createdBy: 'test', createdAt: at, finishedAt: at },
      ...{ fileSize: 1, fileSha256: 'x', added: 5, rejected: refusedRefs.length, failure: 'It is a picture.' },
    });
    for (const [index, recordRef] of refusedRefs.entries())
      await tx
        .insert(importRows)
        .values({ companyId, importId: id, line: index + 2, outcome: 'rejected', recordRef, reasons: [] });
    return id;
  });

beforeAll(async () => {
  const ids = await writeRecords(ours.scope, [
    ...alike,
    { on: '2026-10-01', kg: '8', chargeKg: '10', jobType: 'disposal' },
    { on: '2026-11-20', kg: '1', chargeKg: '10', ref: 'low' },
    { on: '2026-11-21', kg: '9', chargeKg: '10', vacuumKpaAbs: '50', jobType: 'disposal', ref: 'mended' },
    { on: '2026-11-22', kg: '0', chargeKg: '10', excluded: true, jobType: 'disposal' },
    { on: '2026-12-01', kg: '5', chargeKg: '10', ref: 'half' },
  ]);
  const flag = (ref: string, rule: FlagRule) => ({ recoveryId: ids.get(ref) ?? '', rule, certainty: 0.9 });
  await putFlags(ours.companyId, [
    flag('low', 'stopped_early'),
    flag('half', 'hold_missing'),
    // No fault: it does not wait.
    flag('mended', 'short_on_arrival'),
  ]);
  await writeRecords(theirs.scope, [{ on: '2026-11-30', kg: '700', chargeKg: '900', jobType: 'disposal' }]);
  await withCompany(ours.scope, (tx) =>
    tx.insert(notes).values({
      ...{ companyId: ours.companyId, fromDay: '2026-11-02', toDay: '2026-11-03', text: 'Two machines away.' },
      ...{ writtenBy: 'test', createdAt: '2026-12-02T00:00:00Z' },
    }),
  );
});

test('lately is thirty days, today the last of them', () => {
  // By hand: 30 days of which the last is 9 December begin on 10 November.
  expect(latelyFrom('2026-12-09')).toBe('2026-11-10');
});

test('the last whole month stands beside the same one a year before', async () => {
  const { latest, comparison, recoveries, excluded, firstOn, lastOn } = await startOf('owner');
  expect({ recoveries, excluded, firstOn, lastOn }).toEqual({
    ...{ recoveries: 24, excluded: 1, firstOn: '2025-11-01', lastOn: '2026-12-01' },
  });
  // By hand: 1 + 9 kg of 20; a year before ten of 9 kg and ten of 8.
  expect(latest).toMatchObject({ month: '2026-11', whole: true });
  expect(latest?.now).toMatchObject({ recoveredMass: 10, recoveries: 2, totalYield: 0.5, vacuumStated: 1 });
  expect(latest?.yearBefore).toMatchObject({ recoveredMass: 170, recoveries: 20, totalYield: 0.85 });
  expect(comparison?.now).toMatchObject({ from: '2026-11-01', to: '2026-11-30', recoveredMass: 10 });
});

test('the shortfall is what the low ones miss to the median of like jobs', async () => {
  // By hand: the median of 10 x 0.9, 10 x 0.8 and 0.8, 0.1, 0.9, 0.5 is 0.8; of 10 kg 0.8 - 0.1 are missing.
  const { shortfall } = await startOf('trainer');
  expect(shortfall).toEqual({ recoveries: 1, mass: 7 });
});

test('what waits is told to those whose business it is', async () => {
  // Of the last thirty days 2026-11-20 and 2026-12-01 are flagged; one disposal of October states no vacuum.
  // From December 2025 to September 2026 are ten months without a record.
  const [low, disposals, gaps] = [
    ['open-flags', 2],
    ['disposals-without-vacuum', 1],
    ['empty-months', 10],
  ];
  expect(await kinds('owner')).toEqual([low, disposals, gaps]);
  expect(await kinds('trainer')).toEqual([low, disposals, gaps]);
  expect(await kinds('office')).toEqual([disposals, gaps]);
  expect(await kinds('auditor')).toEqual([disposals, gaps]);
  // The company's door is opened here without his narrower scope: what he sees of the flags, the policies decide.
  expect(await kinds('technician')).toEqual([low, disposals]);
});

test('refused rows wait until their ticket is among the records; failed and unfinished files wait too', async () => {
  const taken = await writeImport('done', false, ['refused', 'mended', null]);
  await writeImport('done', true, ['of a preview']);
  await writeImport('failed', false);
  const { waiting, lastFile } = await startOf('office');
  expect(waiting.slice(0, 3).map(({ kind, count }) => [kind, count])).toEqual([
    ['failed-imports', 1],
    ['refused-rows', 2],
    ['open-previews', 1],
  ]);
  expect(waiting[1]?.href).toBe(`/imports/${taken}`);
  expect(lastFile).toMatchObject({ importId: taken, added: 5, rejected: 3 });
  expect((await startOf('auditor')).lastFile).toBeNull();
  expect(await kinds('auditor')).not.toContainEqual(['refused-rows', 2]);
});

test('notes of the last days are told to who may read notes', async () => {
  expect((await startOf('operations')).notes.map(({ text }) => text)).toEqual(['Two machines away.']);
  expect((await startOf('auditor')).notes).toEqual([]);
});

test.each(ROLES)('a company without records has an answer for the role %s', async (role) => {
  expect(await startOf(role, none)).toMatchObject({ recoveries: 0, latest: null, comparison: null, waiting: [] });
});

test('a technician is told of his own records only', async () => {
  const token = await ours.token('technician');
  const response = await GET(apiRequest('/api/start', token), undefined);
  // This account is linked to no technician: nothing is his.
  expect(await response.json()).toMatchObject({ recoveries: 0, latest: null, waiting: [] });
});
