import { beforeAll, expect, test } from 'vitest';
import { PATCH } from '@/app/api/charge-additions/[id]/route';
import { POST as undo } from '@/app/api/charge-additions/imports/[id]/undo/route';
import { POST as upload } from '@/app/api/charge-additions/imports/route';
import { type AdditionImport, additionImportSchema, additionUndoSchema } from '@/lib/charge-additions/file/contract';
import { rowsAs } from '../../support/as-role';
import { apiRequest, newCompany } from '../../support/company';
import { sent } from '../../support/leaks';
import { newPlaces } from '../../support/ticket-records';

let company: Awaited<ReturnType<typeof newCompany>>;
let token = '';
beforeAll(async () => {
  company = await newCompany();
  token = await company.token('office');
  await newPlaces(company.scope);
});

const HEADER = 'addition_ref,added_on,site,appliance,added_charge,mass_unit,reason,leaks_verified_on,notes';
const row = (ref: string, rest = '2026-03-04,Mill Street School,RTU-1,5.0,lb,leak top-up,2026-03-20,') =>
  `${ref},${rest}`;
const file = (...rows: string[]) => `${[HEADER, ...rows].join('\n')}\n`;

const hand = (text: string | Uint8Array<ArrayBuffer>, fields: Record<string, string> = {}): Promise<Response> => {
  const form = new FormData();
  form.set('file', new Blob([text]), 'additions.csv');
  for (const [name, value] of Object.entries(fields)) form.set(name, value);
  return upload(apiRequest('/api/charge-additions/imports', token, { method: 'POST', body: form }), undefined);
};
const taken = async (text: string | Uint8Array<ArrayBuffer>, fields = {}): Promise<AdditionImport> =>
  additionImportSchema.parse(await (await hand(text, fields)).json());
const undone = async (id: string | null) => {
  const response = await undo(apiRequest(`/api/charge-additions/imports/${id}/undo`, token, { method: 'POST' }), {
    params: Promise.resolve({ id: id ?? '' }),
  });
  return additionUndoSchema.parse(await response.json());
};
const stored = (ref: string) =>
  rowsAs<{ id: string; added_charge_kg: string; reason: string; leaks_verified_on: Date | null; version: number }>(
    'server',
    { company_id: company.companyId },
    'select * from charge_additions where addition_ref = $1',
    [ref],
  );

test('takes rows in with exact masses, and the same file twice changes nothing', async () => {
  const text = file(row('A-1'), row('A-2', '2026-04-01,mill street  SCHOOL,rtu-1,1-8,lb-oz,install,,first charge'));
  expect(await taken(text)).toMatchObject({ rowsRead: 2, added: 2, rejected: 0 });
  // 1 lb 8 oz = 1.5 × 0.45359237 kg.
  expect((await stored('A-2'))[0]).toMatchObject({ added_charge_kg: '0.680388555', reason: 'initial_charge' });
  expect(await taken(text)).toMatchObject({ added: 0, updated: 0, unchanged: 2 });
});

test('a preview says what would come and writes nothing', async () => {
  expect(await taken(file(row('P-1')), { dryRun: 'true' })).toMatchObject({ id: null, added: 1 });
  expect(await stored('P-1')).toHaveLength(0);
});

test('reads semicolons, decimal commas, European dates and Windows-1252', async () => {
  const lines = [
    'Ref;Date;Site;Unit;Amount added (kg);Reason;Remarks',
    'E-1;25.02.2026;Mill Street School;RTU-1;2,25;Leak;Gerät undicht',
  ];
  const bytes = Uint8Array.from([...lines.join('\r\n')].map((letter) => letter.charCodeAt(0)));
  expect(await taken(bytes)).toMatchObject({ added: 1, rejected: 0 });
  expect((await stored('E-1'))[0]).toMatchObject({ added_charge_kg: '2.250000000' });
});

test('refuses rows with line, column and reason, and takes the others', async () => {
  const { added, refused } = await taken(
    file(
      row('R-1', '2026-03-04,Mill Street School,RTU-9,5.0,lb,leak,,'),
      row('R-2', '2026-03-04,Mill Street School,RTU-1,five,lb,leak,,'),
      row('R-3', '2026-03-04,Mill Street School,RTU-1,5.0,stone,leak,,'),
      row('R-4', '2999-03-04,Mill Street School,RTU-1,5.0,lb,leak,,'),
      row('R-5', '2026-03-04,Mill Street School,RTU-1,0.0,lb,leak,,'),
      row('R-6', '2026-03-04,Mill Street School,RTU-1,5.0,lb,a whim,,'),
      row('R-7', '2026-03-04,Mill Street School,RTU-1,5.0,lb,leak,2026-03-01,'),
      row('', '2026-03-04,Mill Street School,RTU-1,5.0,lb,leak,,'),
      row('R-8'),
      row('R-8', '2026-03-04,Mill Street School,RTU-1,6.0,lb,leak,,'),
    ),
  );
  expect(added).toBe(1);
  expect(refused.map(({ line, reasons }) => [line, reasons[0]?.column])).toEqual([
    [2, 'appliance'],
    [3, 'added_charge'],
    [4, 'mass_unit'],
    [5, 'added_on'],
    [6, 'added_charge'],
    [7, 'reason'],
    [8, 'leaks_verified_on'],
    [9, 'addition_ref'],
    [11, 'addition_ref'],
  ]);
  for (const { reasons } of refused) expect(reasons[0]?.message).toMatch(/\.$/);
});

test.each([
  ['', 'empty'],
  ['just some words', 'no columns'],
  ['site,appliance,added_charge\nMill Street School,RTU-1,5.0\n', 'addition_ref'],
  [`${HEADER}\n`, 'no rows'],
  [file(row('D-1', '03/04/2026,Mill Street School,RTU-1,5.0,lb,leak,,')), 'only you can say'],
  [file(row('D-2', '2026-03-04,Mill Street School,RTU-1,5.0,,leak,,')).replace('mass_unit', 'x'), 'unit'],
])('says what is wrong with the file %j', async (text, words) => {
  const response = await hand(text);
  expect(response.status).toBe(422);
  expect(((await response.json()) as { detail: string }).detail).toContain(words);
});

test('takes the person’s word for what the file leaves open', async () => {
  const text = file(row('W-1', '03/04/2026,Mill Street School,RTU-1,5.0,lb,leak,,'));
  const mapping = JSON.stringify({ dateOrders: { added_on: 'dmy' } });
  expect(await taken(text, { mapping })).toMatchObject({ added: 1 });
  expect((await hand(text, { mapping: '{' })).status).toBe(400);
  expect((await hand(text, { mapping: '{"columns":{}}' })).status).toBe(400);
});

test('a changed row changes its addition; undo puts back what was there before', async () => {
  const first = await taken(file(row('U-1'), row('U-2'), row('U-3')));
  const changed = '2026-03-05,Mill Street School,RTU-1,7.0,lb,leak,,';
  const second = await taken(file(row('U-1', changed), row('U-2', changed), row('U-4')));
  expect(second).toMatchObject({ added: 1, updated: 2 });
  const [edited] = await stored('U-2');
  const id = edited?.id ?? '';
  const correction = { version: edited?.version, why: 'read the ticket again', notes: 'by hand' };
  await PATCH(sent(`/api/charge-additions/${id}`, token, correction, 'PATCH'), { params: Promise.resolve({ id }) });

  const againByFile = await taken(file(row('U-2', '2026-03-06,Mill Street School,RTU-1,9.0,lb,leak,,')));
  expect(againByFile.refused[0]?.reasons[0]?.code).toBe('corrected_by_hand');

  expect(await undone(second.id)).toMatchObject({ removed: 1, restored: 1, kept: [{ additionRef: 'U-2' }] });
  // 5.0 lb again.
  expect((await stored('U-1'))[0]?.added_charge_kg).toBe('2.267961850');
  expect(await stored('U-4')).toHaveLength(0);
  expect(await undone(first.id)).toMatchObject({ removed: 2, restored: 0 });
});
