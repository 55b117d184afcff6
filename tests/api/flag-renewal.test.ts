import { and, eq, sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { requestDueFlags } from '@/analytics/flag-renewal/request-due';
import { ALL_TASKS } from '@/analytics/tasks';
import { PATCH as correct } from '@/app/api/recoveries/[id]/route';
import { POST as create } from '@/app/api/recoveries/route';
import { withCompany } from '@/db/client';
import { flagBaselines, flagRenewals, flagsDue } from '@/db/schema/flag-renewal';
import { flags } from '@/db/schema/flags';
import { history } from '@/db/schema/history';
import { recoveries } from '@/db/schema/recoveries';
import { type RunningWorker, startWorker } from '@/lib/jobs/worker';
import { apiRequest, newCompany } from '../support/company';
import { flagsOf, renewEverything } from '../support/flags';
import { at, takeBack, takeIn } from '../support/imports';
import { recoveryFile } from '../support/recovery-file';
import { settled } from '../support/settled';

const HEADER =
  'record_ref,recovered_at,technician,site,appliance,appliance_category,job_type,refrigerant,nameplate_charge,recovered_mass,mass_unit\n';
const low = (ref: string) =>
  `${ref},2023-05-0${ref.length},Technician 1,Site 1,Unit ${ref},comfort_cooling,service,R-410A,10,0.4,lb\n`;
/** Usual jobs of one kind, and two pulls of a twenty-fifth of the charge. */
const USUAL = [...recoveryFile(900)].join('');
const LOW = HEADER + low('L-1') + low('L-22');

let worker: RunningWorker;
let company: Awaited<ReturnType<typeof newCompany>>;
let token: string;

const settle = () => settled(token);
const inCompany = <T>(work: Parameters<typeof withCompany<T>>[1]) => withCompany(company.scope, work);
const recordOf = async (ref: string) => {
  const [row] = await inCompany((tx) =>
    tx.select({ id: recoveries.id, version: recoveries.version }).from(recoveries).where(eq(recoveries.recordRef, ref)),
  );
  if (!row) throw new Error(`No record ${ref}`);
  return row;
};
const isLow = ({ recordRef, rule }: { recordRef: string; rule: string }): boolean =>
  recordRef.startsWith('L-') && rule === 'low_unexplained';
const lowRefs = async () => (await flagsOf(company.companyId)).filter(isLow).map(({ recordRef }) => recordRef);
const patch = async (ref: string, changes: Record<string, unknown>) => {
  const { id, version } = await recordOf(ref);
  const body = JSON.stringify({ version, reason: 'a typing error', changes });
  const response = await correct(apiRequest(`/api/recoveries/${id}`, token, { method: 'PATCH', body }), at(id));
  expect(response.status, await response.clone().text()).toBe(200);
};

beforeAll(async () => {
  worker = startWorker(ALL_TASKS);
  company = await newCompany();
  token = await company.token('owner');
  await takeIn(token, USUAL);
  await takeIn(token, LOW);
  await settle();
});
afterAll(() => worker.stop());

describe('an import', () => {
  test('leaves the flags that judging everything anew would give', async () => {
    const found = await flagsOf(company.companyId);
    expect(await lowRefs()).toEqual(expect.arrayContaining(['L-1', 'L-22']));
    await renewEverything(company.companyId);
    expect(await flagsOf(company.companyId)).toEqual(found);
  });

  test('leaves nothing due, and baselines kept once', async () => {
    const [due, baselines, used] = await inCompany(async (tx) => [
      await tx.select().from(flagsDue),
      await tx.select({ id: flagBaselines.id }).from(flagBaselines),
      await tx.selectDistinct({ id: flags.baselineId }).from(flags),
    ]);
    expect(due).toEqual([]);
    expect(baselines).toHaveLength(1);
    expect(used).toEqual(baselines);
  });

  test('tells the history of the renewal, not of each flag it made', async () => {
    const entries = await inCompany((tx) =>
      tx
        .select({ table: history.tableName, actor: history.actor })
        .from(history)
        .where(eq(history.actor, 'renewal of flags')),
    );
    expect(entries.length).toBeGreaterThan(0);
    expect(new Set(entries.map(({ table }) => table))).toEqual(new Set(['flag_renewals']));
  });
});

describe('one record', () => {
  test('that is written is judged, by what was usual before', async () => {
    const [site, unit] = ['Site 1', 'Unit L-1'];
    const body = JSON.stringify({
      ...{ recordRef: 'L-new', recoveredAt: '2023-06-01', technician: 'Technician 1', site, appliance: unit },
      ...{ category: 'comfort_cooling', jobType: 'service', refrigerant: 'R-410A' },
      ...{ nameplateCharge: 10, recoveredMass: 0.3, massUnit: 'lb' },
    });
    const response = await create(apiRequest('/api/recoveries', token, { method: 'POST', body }), undefined);
    expect(response.status, await response.clone().text()).toBe(201);
    await settle();
    expect(await lowRefs()).toContain('L-new');
    const [baseline] = await inCompany((tx) => tx.select().from(flagBaselines));
    expect(baseline?.judgedSingly).toBeGreaterThan(0);
  });

  test('that is corrected loses the flag that no longer holds, and the others keep theirs', async () => {
    const others = (await flagsOf(company.companyId)).filter(({ recordRef }) => !recordRef.startsWith('L-'));
    await patch('L-new', { recoveredMass: 8.2 });
    await settle();
    expect(await lowRefs()).not.toContain('L-new');
    expect((await flagsOf(company.companyId)).filter(({ recordRef }) => !recordRef.startsWith('L-'))).toEqual(others);
    const rules = (found: Awaited<ReturnType<typeof flagsOf>>) =>
      found.map(({ recordRef, rule }) => `${recordRef} ${rule}`);
    const before = rules(await flagsOf(company.companyId));
    await renewEverything(company.companyId);
    expect(rules(await flagsOf(company.companyId))).toEqual(before);
  });

  test('that is corrected and still doubtful keeps the flag’s id, person and note', async () => {
    const before = (await flagsOf(company.companyId)).find((flag) => isLow(flag) && flag.recordRef === 'L-1');
    await inCompany((tx) =>
      tx
        .update(flags)
        .set({ note: 'ask about the hold' })
        .where(and(eq(flags.companyId, company.companyId), eq(flags.id, before?.id ?? ''))),
    );
    await patch('L-1', { recoveredMass: 0.5 });
    await settle();
    const after = (await flagsOf(company.companyId)).find(({ id }) => id === before?.id);
    expect(after).toMatchObject({ recordRef: 'L-1', rule: before?.rule, note: 'ask about the hold' });
    expect(after?.evidence).not.toEqual(before?.evidence);
  });
});

test('a decided flag stays as it was decided, whatever becomes of the record', async () => {
  const [decided] = (await flagsOf(company.companyId)).filter((flag) => isLow(flag) && flag.recordRef === 'L-22');
  await inCompany((tx) =>
    tx
      .update(flags)
      .set({ state: 'decided', decision: 'leaked_before' })
      .where(and(eq(flags.companyId, company.companyId), eq(flags.id, decided?.id ?? ''))),
  );
  await patch('L-22', { recoveredMass: 8 });
  await settle();
  await renewEverything(company.companyId);
  const after = (await flagsOf(company.companyId)).find(({ id }) => id === decided?.id);
  expect(after).toEqual({ ...decided, state: 'decided', decision: 'leaked_before' });
});

test('flags that were judged otherwise are asked for at a start', async () => {
  const judgedBy = () => inCompany((tx) => tx.select({ judging: flagRenewals.judging }).from(flagRenewals));
  const now = await judgedBy();
  await inCompany((tx) => tx.execute(sql`update flag_renewals set judging = 'an older version'`));
  await requestDueFlags();
  await settle();
  expect(await judgedBy()).toEqual(now);
});

test('an undone import takes its flags with it', async () => {
  await renewEverything(company.companyId);
  const before = await flagsOf(company.companyId);
  const { id } = await takeIn(token, [...recoveryFile(300, 7, 'U')].join(''));
  await settle();
  expect((await takeBack(token, id)).status).toBe(200);
  await settle();
  // A flag that was gone meanwhile has come back under another id.
  const withoutId = (found: typeof before) => found.map(({ id: _id, ...flag }) => flag);
  expect(withoutId(await flagsOf(company.companyId))).toEqual(withoutId(before));
});

test('a long renewal is done by a process of its own', async () => {
  const large = await newCompany();
  const owner = await large.token('owner');
  expect((await takeIn(owner, [...recoveryFile(2_100, 3, 'P')].join(''))).added).toBe(2_100);
  await settled(owner);
  const apart = await flagsOf(large.companyId);
  expect(apart.length).toBeGreaterThan(0);
  await renewEverything(large.companyId);
  expect(await flagsOf(large.companyId)).toEqual(apart);
});
