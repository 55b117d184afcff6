import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, test } from 'vitest';
import { type Flag, type FlagsList, flagSchema, flagsList } from '@/analytics/flags/contract';
import { isConfirmed } from '@/analytics/flags/verdict';
import { POST as assign } from '@/app/api/flags/[id]/assign/route';
import { POST as decide } from '@/app/api/flags/[id]/decision/route';
import { POST as reopen } from '@/app/api/flags/[id]/reopen/route';
import { GET as getOne } from '@/app/api/flags/[id]/route';
import { GET as getPeople } from '@/app/api/flags/people/route';
import { GET as getList } from '@/app/api/flags/route';
import { withCompany } from '@/db/client';
import { flagDecisions } from '@/db/schema/flags';
import { flaggedRecoveries, recoveryExcuses } from '@/db/views/flagged-recoveries';
import type { FlagRule } from '@/lib/vocabulary';
import { apiRequest, newCompany } from '../support/company';
import { flagsOf, putFlags } from '../support/flags';
import { at } from '../support/imports';
import { type TestRecord, writeRecords } from '../support/records';
import { newPerson } from '../support/session';
import { tableContents } from '../support/tables';

const usual: TestRecord[] = Array.from({ length: 6 }, (_, n) => ({
  on: `2026-03-0${n + 1}`,
  kg: '9',
  ref: `usual-${n}`,
}));
const doubtful: TestRecord[] = [
  { on: '2026-03-10', kg: '0.4', ref: 'low', technician: 'Tess Ward', refrigerant: 'R-22', site: 'North Yard' },
  { on: '2026-04-10', kg: '0.9', ref: 'short', technician: 'Ben Oyelaran', site: 'South Yard' },
  { on: '2026-05-10', kg: '90', ref: 'slip', technician: 'Ben Oyelaran', site: 'South Yard' },
];

const company = await newCompany();
let trainer = '';
let ids = new Map<string, string>();

beforeAll(async () => {
  trainer = await company.token('trainer');
  ids = await writeRecords(company.scope, [...usual, ...doubtful]);
  const flag = (ref: string, rule: FlagRule, certainty: number) => ({
    recoveryId: ids.get(ref) ?? '',
    rule,
    certainty,
  });
  await putFlags(company.companyId, [
    flag('low', 'stopped_early', 0.8),
    flag('low', 'hold_missing', 0.6),
    flag('short', 'short_on_arrival', 0.7),
    flag('slip', 'over_full_charge', 0.95),
    flag('slip', 'unit_slip', 0.3),
  ]);
});

const list = async (search = '', token = trainer): Promise<FlagsList> => {
  const response = await getList(apiRequest(`/api/flags${search}`, token), undefined);
  expect(response.status, await response.clone().text()).toBe(200);
  return flagsList.response.parse(await response.json());
};
const named = ({ items }: FlagsList) => items.map(({ recordRef, rule }) => `${recordRef} ${rule}`);
const flagOf = async (ref: string, rule: FlagRule): Promise<Flag> => {
  const found = (await list('?state=all')).items.find((flag) => flag.recordRef === ref && flag.rule === rule);
  if (!found) throw new Error(`No flag ${rule} on ${ref}`);
  return found;
};
type Handler = (request: Request, context: ReturnType<typeof at>) => Promise<Response>;
const post = (route: Handler, id: string, body: unknown, token = trainer) =>
  route(apiRequest(`/api/flags/${id}`, token, { method: 'POST', body: JSON.stringify(body) }), at(id));
const decided = async (ref: string, rule: FlagRule, body: unknown): Promise<Flag> => {
  const response = await post(decide, (await flagOf(ref, rule)).id, body);
  expect(response.status, await response.clone().text()).toBe(200);
  return flagSchema.parse(await response.json());
};
const reopened = async (ref: string, rule: FlagRule): Promise<Flag> => {
  const response = await post(reopen, (await flagOf(ref, rule)).id, {});
  expect(response.status, await response.clone().text()).toBe(200);
  return flagSchema.parse(await response.json());
};
const states = async () =>
  (await flagsOf(company.companyId)).map(({ recordRef, rule, state }) => `${recordRef} ${rule} ${state}`);
const inView = (view: typeof flaggedRecoveries | typeof recoveryExcuses) =>
  withCompany(company.scope, async (tx) => {
    const rows = await tx.select({ id: view.recoveryId }).from(view);
    return rows.map(({ id }) => [...ids].find(([, known]) => known === id)?.[0]).sort();
  });

describe('the list', () => {
  test('gives open flags, the surest first, with the other reasons of the record', async () => {
    const found = await list();
    expect(named(found)).toEqual([
      'slip over_full_charge',
      'low stopped_early',
      'short short_on_arrival',
      'low hold_missing',
      'slip unit_slip',
    ]);
    expect(found.items[1]).toMatchObject({
      ...{ recordRef: 'low', recoveryId: ids.get('low'), technician: 'Tess Ward', refrigerant: 'R-22' },
      ...{ recoveredMass: 0.4, fullCharge: 10, yield: 0.04, state: 'open', decision: null, decisions: [] },
      ...{ others: [{ rule: 'hold_missing', certainty: 0.6, state: 'open' }], assignedTo: null, note: null },
    });
    expect(found.items.every(({ explanation }) => explanation.length > 0)).toBe(true);
  });

  test('counts what is open: records, and those that count as flagged', async () => {
    expect((await list('?state=decided')).open).toEqual({
      ...{ flags: 5, records: 3, flagged: 2 },
      byRule: ['hold_missing', 'over_full_charge', 'short_on_arrival', 'stopped_early', 'unit_slip'].map((rule) => ({
        rule,
        flags: 1,
      })),
    });
    expect(await inView(flaggedRecoveries)).toEqual(['low', 'slip']);
  });

  test('is narrowed by scope, rule, record and state', async () => {
    expect(named(await list('?refrigerant=R-22'))).toEqual(['low stopped_early', 'low hold_missing']);
    expect(named(await list('?from=2026-04&to=2026-04'))).toEqual(['short short_on_arrival']);
    expect(named(await list('?rule=unit_slip&rule=hold_missing'))).toEqual(['low hold_missing', 'slip unit_slip']);
    expect(named(await list(`?recovery=${ids.get('slip')}`))).toEqual(['slip over_full_charge', 'slip unit_slip']);
    expect(named(await list('?state=decided'))).toEqual([]);
  });

  test('comes in pages that follow each other', async () => {
    const seen: string[] = [];
    let cursor: string | null = '';
    while (cursor !== null) {
      const page: FlagsList = await list(`?limit=2${cursor ? `&cursor=${cursor}` : ''}`);
      expect(page.items.length).toBeLessThanOrEqual(2);
      seen.push(...named(page));
      cursor = page.nextCursor;
    }
    expect(seen).toEqual(named(await list()));
  });

  test.each(['cursor=nonsense', 'limit=0', 'state=shut', 'rule=made_up', 'recovery=7', 'from=2026-05&to=2026-04'])(
    'refuses %s with 400',
    async (search) => {
      expect((await getList(apiRequest(`/api/flags?${search}`, trainer), undefined)).status).toBe(400);
    },
  );

  test('goes out as a file, formulas made text', async () => {
    const response = await getList(apiRequest('/api/flags?format=csv&limit=1', trainer), undefined);
    expect(response.headers.get('content-type')).toContain('text/csv');
    const [head = '', ...rows] = (await response.text()).trim().split('\r\n');
    expect(head).toContain('record_ref,recovered_on,technician');
    expect(rows).toHaveLength(5);
    expect(rows[0]).toMatch(
      /^slip,2026-05-10,Ben Oyelaran,South Yard,RTU-1,R-410A,over_full_charge,0.950,90.000,10.000,/,
    );
  });
});

describe('a decision', () => {
  test('closes the flag, with who and why, and reopening opens it', async () => {
    const flag = await decided('short', 'short_on_arrival', { decision: 'leaked_before', note: ' hole in the coil ' });
    expect(flag).toMatchObject({
      ...{ state: 'decided', decision: 'leaked_before' },
      decisions: [{ decision: 'leaked_before', note: 'hole in the coil', by: 'program “test trainer”' }],
    });
    expect(await inView(recoveryExcuses)).toEqual(['short']);
    expect((await post(decide, flag.id, { decision: 'confirmed_correct' })).status).toBe(409);
    expect(await reopened('short', 'short_on_arrival')).toMatchObject({
      ...{ state: 'open', decision: null },
      decisions: [{ decision: null }, { decision: 'leaked_before' }],
    });
    expect(await inView(recoveryExcuses)).toEqual([]);
    expect((await post(reopen, flag.id, {})).status).toBe(409);
  });

  test('entry error leaves every figure and closes the other reasons; reopening any of them restores all of it', async () => {
    const before = await tableContents(company.companyId);
    const openBefore = await states();
    const closed = await decided('slip', 'over_full_charge', { decision: 'entry_error' });
    expect(closed.others).toMatchObject([{ rule: 'unit_slip', state: 'decided', decision: 'entry_error' }]);
    const without = await tableContents(company.companyId);
    expect(without.monthly_summary).not.toEqual(before.monthly_summary);
    expect(without.recoveries?.filter((row) => row.includes('"exclusion": "entry_error"'))).toHaveLength(1);
    expect(await inView(flaggedRecoveries)).toEqual(['low']);
    await reopened('slip', 'unit_slip');
    expect(await tableContents(company.companyId)).toEqual(before);
    expect(await states()).toEqual(openBefore);
  });

  test('does not reopen what was decided before it for another reason', async () => {
    await decided('low', 'hold_missing', { decision: 'confirmed_correct' });
    await decided('low', 'stopped_early', { decision: 'entry_error' });
    await reopened('low', 'stopped_early');
    expect(await flagOf('low', 'hold_missing')).toMatchObject({ state: 'decided', decision: 'confirmed_correct' });
    await reopened('low', 'hold_missing');
  });

  test('about the whole record closes its other reasons too', async () => {
    const flag = await decided('low', 'stopped_early', { decision: 'known_low_charge', wholeRecord: true });
    expect(flag.others).toMatchObject([{ rule: 'hold_missing', decision: 'known_low_charge' }]);
    expect(await inView(recoveryExcuses)).toEqual(['low']);
    await reopened('low', 'hold_missing');
    expect(await states()).toContain('low stopped_early open');
  });

  test('is counted: how many of the last were borne out, each by the fault that its rule means', async () => {
    expect(isConfirmed('short_on_arrival', 'leaked_before')).toBe(true);
    expect(isConfirmed('stopped_early', 'leaked_before')).toBe(false);
    await decided('slip', 'over_full_charge', { decision: 'entry_error' });
    await decided('short', 'short_on_arrival', { decision: 'confirmed_correct' });
    const { borneOut } = await list();
    expect(borneOut).toMatchObject({ decided: 2, confirmed: 1 });
    // Wilson's interval of 1 in 2 at 95 %: 0.0945 to 0.9055 (prop.test without continuity correction in R).
    expect(borneOut.low).toBeCloseTo(0.0945, 4);
    expect(borneOut.high).toBeCloseTo(0.9055, 4);
    await reopened('slip', 'over_full_charge');
    await reopened('short', 'short_on_arrival');
    expect((await list()).borneOut).toEqual({ decided: 0, confirmed: 0, low: null, high: null });
  });

  test.each([{}, { decision: 'guilty' }, { decision: 'entry_error', note: 7 }, { decision: 'entry_error', more: 1 }])(
    'refuses %j with 400',
    async (body) => {
      const response = await post(decide, (await flagOf('low', 'stopped_early')).id, body);
      expect(response.status).toBe(400);
    },
  );

  test('is nothing for office, auditor and technician', async () => {
    const { id } = await flagOf('low', 'stopped_early');
    for (const role of ['office', 'auditor', 'technician'] as const)
      expect((await post(decide, id, { decision: 'entry_error' }, await company.token(role))).status).toBe(403);
  });

  test('on a flag that is not there is 404', async () => {
    expect((await post(decide, randomUUID(), { decision: 'entry_error' })).status).toBe(404);
    expect((await getOne(apiRequest('/api/flags/x', trainer), at('x'))).status).toBe(404);
  });

  test('stays in the log of decisions for good', async () => {
    const rows = await withCompany(company.scope, (tx) => tx.select().from(flagDecisions));
    expect(rows.filter(({ decision }) => decision === null).length).toBeGreaterThan(0);
    expect(rows.filter(({ decision }) => decision === 'entry_error').length).toBeGreaterThan(0);
  });
});

describe('an assignment', () => {
  test('names somebody who may look, with a note, and can be taken back', async () => {
    const { personId } = await newPerson(company.companyId, 'trainer');
    const { id } = await flagOf('low', 'stopped_early');
    const people = await (await getPeople(apiRequest('/api/flags/people', trainer), undefined)).json();
    expect(people.items.map((one: { id: string }) => one.id)).toContain(personId);
    const response = await post(assign, id, { assignedTo: personId, note: 'ask about the hold' });
    expect(flagSchema.parse(await response.json())).toMatchObject({
      assignedTo: { id: personId },
      note: 'ask about the hold',
    });
    await post(assign, id, { assignedTo: null, note: null });
    expect(await flagOf('low', 'stopped_early')).toMatchObject({ assignedTo: null, note: null });
  });

  test('to somebody who could not see the flag is refused', async () => {
    const { id } = await flagOf('low', 'stopped_early');
    const office = await newPerson(company.companyId, 'office');
    for (const assignedTo of [randomUUID(), office.personId]) {
      const response = await post(assign, id, { assignedTo });
      expect(response.status).toBe(400);
      expect((await response.json()).errors).toMatchObject([{ path: 'assignedTo' }]);
    }
    expect((await post(assign, id, {})).status).toBe(400);
  });
});
