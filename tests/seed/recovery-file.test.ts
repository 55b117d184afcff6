import { expect, test } from 'vitest';
import { CATALOGUE } from '@/db/catalogue/refrigerants';
import { profileFile, readRows } from '@/lib/imports/read-file';
import type { ParsedRow } from '@/lib/imports/rows';
import { recoveryFile, recoveryFileMapping } from '@/seed/recovery-file';
import { DEMO } from '@/tests/support/demo-company';

const bytes = new TextEncoder().encode(recoveryFile(DEMO.tickets));
const open = async function* () {
  yield bytes;
};
const context = {
  fileName: 'tickets.csv',
  timeZone: 'America/New_York',
  today: '2026-12-15',
  refrigerants: new Set(CATALOGUE.map(({ designation }) => designation)),
};

const plan = await profileFile(open, recoveryFileMapping, null, context);
const rows: ParsedRow[] = [];
for await (const batch of readRows(open, plan, context)) rows.push(...batch);

test('the file leaves nothing to ask', () => {
  expect(plan.reading.questions).toEqual([]);
  expect(plan.reading.columns.filter(({ field }) => field === null).map(({ header }) => header)).toEqual(['Van']);
});

test('every row is taken, or was planted to be refused, at the planted column', () => {
  expect(rows).toHaveLength(DEMO.tickets.length);
  const planted = DEMO.truth.faults.filter(({ fault }) => fault === 'refused');
  const expected = planted.map(({ recordRef, column = '' }) => ({
    recordRef,
    // The mapping's keys are the fields that tickets are written in.
    columns: [recoveryFileMapping.columns?.[column as keyof typeof recoveryFileMapping.columns]],
  }));
  const refused = rows.flatMap((row) =>
    row.ok ? [] : [{ recordRef: row.recordRef, columns: row.reasons.map(({ column }) => column) }],
  );
  expect(refused).toEqual(expected);
  expect(new Set(planted.map(({ column }) => column)).size).toBe(6);
});

test('what is read is what was written', () => {
  const first = rows.find((row) => row.ok && row.row.massUnit === 'lb');
  const ticket = DEMO.tickets.find(({ record_ref }) => record_ref === first?.recordRef);
  expect(first?.ok && first.row).toMatchObject({
    recordRef: ticket?.record_ref,
    technician: ticket?.technician,
    site: ticket?.site,
    refrigerant: ticket?.refrigerant,
    extra: { Van: expect.stringMatching(/^Van \d+$/) },
  });
});
