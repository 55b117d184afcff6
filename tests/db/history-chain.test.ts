import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, test } from 'vitest';
import { withCompany } from '@/db/client';
import { branches } from '@/db/schema/places';
import { recoveries } from '@/db/schema/recoveries';
import { asRole, type DatabaseUser, rowsAs } from '../support/as-role';
import { newCompany } from '../support/company';
import { firstBroken } from '../support/history';
import { newPlaces, recoveryRow } from '../support/records';

/** Six entries: six branches, each in a transaction of its own. */
const withSixEntries = async () => {
  const company = await newCompany();
  for (let n = 0; n < 6; n++)
    await withCompany(company.scope, (tx) =>
      tx.insert(branches).values({ companyId: company.companyId, name: `Branch ${n}` }),
    );
  return company.companyId;
};

let companyId: string;
beforeEach(async () => {
  companyId = await withSixEntries();
});

describe('append-only', () => {
  const EDITS = [
    "update history set actor = 'nobody'",
    'delete from history',
    'truncate history',
    'update history_heads set entry_no = 0',
    'delete from history_heads',
    "insert into history (company_id, entry_no, changed_at, table_name, row_id, action, actor, hash) values ($1, 7, now(), 'sites', $1, 'insert', 'nobody', '')",
  ];
  const attempts = (['server', 'job', 'owner'] as DatabaseUser[]).flatMap((user) =>
    EDITS.map((text) => ({ user, text })),
  );

  test.each(attempts)('the $user role cannot: $text', async ({ user, text }) => {
    const values = text.includes('$1') ? [companyId] : [];
    await expect(rowsAs(user, { company_id: companyId }, text, values)).rejects.toThrow(
      /append-only|permission denied|not written by hand/,
    );
    expect(await firstBroken(companyId)).toBeNull();
  });
});

describe('a change by somebody who may do anything to the database', () => {
  /** Switches the guards off for the transaction, as only a superuser can. */
  const tamper = (text: string) =>
    asRole('admin', {}, async (client) => {
      await client.query('set local session_replication_role = replica');
      const done = await client.query(text, [companyId]);
      expect(done.rowCount).toBeGreaterThan(0);
    });

  test('is not there at first: the chain is whole', async () => {
    expect(await firstBroken(companyId)).toBeNull();
  });

  test.each([
    ['of who', "update history set actor = 'nobody' where company_id = $1 and entry_no = 3", 3],
    ['of why', "update history set reason = 'another' where company_id = $1 and entry_no = 3", 3],
    [
      'of when',
      "update history set changed_at = changed_at - interval '1 day' where company_id = $1 and entry_no = 3",
      3,
    ],
    ['of what', `update history set after = after || '{"name": "x"}' where company_id = $1 and entry_no = 3`, 3],
    ['of the hash', "update history set hash = repeat('0', 64) where company_id = $1 and entry_no = 3", 3],
    ['of an entry taken out', 'delete from history where company_id = $1 and entry_no = 3', 4],
    ['of the first taken out', 'delete from history where company_id = $1 and entry_no = 1', 2],
    ['of the last taken out', 'delete from history where company_id = $1 and entry_no = 6', 6],
    [
      'of the last rewritten with its hash',
      `update history h set actor = 'nobody', hash = encode(history_link(
         (select decode(p.hash, 'hex') from history p where p.company_id = $1 and p.entry_no = 5),
         history_item(6, changed_at, table_name, row_id, action, 'nobody', reason, before, after), ''), 'hex')
       where company_id = $1 and entry_no = 6`,
      6,
    ],
    ['of the head taken out', 'delete from history_heads where company_id = $1', 1],
    ['of all taken out', 'delete from history where company_id = $1', 1],
  ])('%s shows where the chain breaks', async (_what, text, entryNo) => {
    await tamper(text);
    expect(await firstBroken(companyId)).toBe(entryNo);
  });

  test('leaves the chains of other companies whole', async () => {
    const other = await withSixEntries();
    await tamper("update history set actor = 'nobody' where company_id = $1 and entry_no = 3");
    expect(await firstBroken(other)).toBeNull();
  });
});

test('twenty edits at the same time keep one unbroken chain without a gap', async () => {
  const { companyId: busy, scope } = await newCompany();
  const id = randomUUID();
  await withCompany(scope, async (tx) => {
    const places = await newPlaces(tx, busy);
    await tx.insert(recoveries).values(recoveryRow(busy, places, { id }));
  });
  const edit = (n: number) =>
    withCompany({ ...scope, actor: `editor ${n}`, reason: `edit ${n}` }, (tx) =>
      tx
        .update(recoveries)
        .set({ notes: `note ${n}` })
        .where(eq(recoveries.id, id)),
    );
  await Promise.all(Array.from({ length: 20 }, (_, n) => edit(n)));
  const entries = await rowsAs<{
    entry_no: number;
    actor: string;
    before: { version: number };
    after: { version: number };
  }>(
    'server',
    { company_id: busy },
    "select entry_no::int, actor, before, after from history where action = 'update' order by entry_no",
  );
  expect(new Set(entries.map(({ actor }) => actor)).size).toBe(20);
  // Each edit saw the one before it: versions go up by one, entries too.
  expect(entries.map(({ after }) => after.version)).toEqual(Array.from({ length: 20 }, (_, n) => n + 2));
  expect(entries.map(({ before }) => before.version)).toEqual(Array.from({ length: 20 }, (_, n) => n + 1));
  const first = entries[0]?.entry_no ?? 0;
  expect(entries.map(({ entry_no }) => entry_no)).toEqual(Array.from({ length: 20 }, (_, n) => first + n));
  expect(await firstBroken(busy)).toBeNull();
});
