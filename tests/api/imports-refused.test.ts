import { eq, sql } from 'drizzle-orm';
import Papa from 'papaparse';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { withCompany } from '@/db/client';
import { recoveries } from '@/db/schema/recoveries';
import { type RunningWorker, startWorker } from '@/lib/jobs/worker';
import { newCompany } from '../support/company';
import { refusedRows, takeBack, takeIn } from '../support/imports';
import { tableContents } from '../support/tables';

let worker: RunningWorker;
beforeAll(() => {
  worker = startWorker();
});
afterAll(() => worker.stop());

const HEADER =
  'record_ref,recovered_at,technician,site,appliance,refrigerant,nameplate_charge,recovered_mass,mass_unit,notes';
const row = (ref: string, mass: string, notes = '', technician = 'Ada Moss') =>
  `${ref},2024-03-0${(ref.length % 9) + 1},${technician},Mill Street,RTU-1,R-410A,5,${mass},kg,${notes}`;
const fileOf = (...rows: string[]) => [HEADER, ...rows, ''].join('\r\n');

const newOffice = async () => {
  const { companyId, token } = await newCompany();
  return { companyId, bearer: await token('office') };
};

const correct = (companyId: string, ref: string, mass: string) =>
  withCompany({ companyId, actor: 'a hand' }, (tx) =>
    tx.update(recoveries).set({ recoveredMassKg: mass }).where(eq(recoveries.recordRef, ref)),
  );

const massOf = async (companyId: string, ref: string) => {
  const [found] = await withCompany({ companyId, actor: 'test' }, (tx) =>
    tx.select({ mass: recoveries.recoveredMassKg }).from(recoveries).where(eq(recoveries.recordRef, ref)),
  );
  return found && Number(found.mass);
};

test('refused rows come back as they came, with reasons, and are taken once mended', async () => {
  const { bearer } = await newOffice();
  const dangerous = '"=HYPERLINK(""http://x"")"';
  const first = await takeIn(
    bearer,
    fileOf(row('A-1', '4'), row('A-2', 'four', dangerous), row('A-3', '-3.5', "'+quoted"), row('A-4', '3', '@sum')),
  );
  expect(first).toMatchObject({ rowsRead: 4, added: 2, rejected: 2 });
  const csv = await refusedRows(bearer, first.id);
  const lines = Papa.parse<Record<string, string>>(csv.replace('\uFEFF', ''), { header: true, skipEmptyLines: true });
  expect(lines.meta.fields).toEqual([...HEADER.split(','), 'reason']);
  expect(lines.data.map((line) => [line.record_ref, line.recovered_mass, line.notes])).toEqual([
    ['A-2', 'four', `'=HYPERLINK("http://x")`],
    ['A-3', '-3.5', "'+quoted"],
  ]);
  for (const line of lines.data) expect(line.reason).toContain('recovered_mass');
  const mended = await takeIn(bearer, csv.replace('four', '4').replace('-3.5', '3.5'));
  expect(mended).toMatchObject({ rowsRead: 2, added: 2, rejected: 0 });
  const again = await takeIn(
    bearer,
    fileOf(row('A-1', '4'), row('A-2', '4', dangerous), row('A-3', '3.5', "'+quoted"), row('A-4', '3', '@sum')),
  );
  expect(again).toMatchObject({ unchanged: 4 });
});

test('a ref twice in one file: the same again is unchanged, something else is refused with the first line named', async () => {
  const { bearer, companyId } = await newOffice();
  const view = await takeIn(bearer, fileOf(row('B-1', '4'), row('B-1', '4.0'), row('B-1', '3')));
  expect(view).toMatchObject({ rowsRead: 3, added: 1, unchanged: 1, rejected: 1 });
  expect(view.summary?.rejectedByReason).toMatchObject([
    { code: 'contradicts_earlier_row', column: 'record_ref', count: 1, examples: [{ line: 4, recordRef: 'B-1' }] },
  ]);
  expect(view.summary?.rejectedByReason[0]?.message).toContain('Line 2');
  expect(await massOf(companyId, 'B-1')).toBe(4);
});

test('a correction by hand stands: the same file says nothing new, another one is refused unless told otherwise', async () => {
  const { bearer, companyId } = await newOffice();
  await takeIn(bearer, fileOf(row('C-1', '4'), row('C-2', '4')));
  await correct(companyId, 'C-1', '3.25');
  expect(await takeIn(bearer, fileOf(row('C-1', '4'), row('C-2', '4')))).toMatchObject({ unchanged: 2 });
  expect(await massOf(companyId, 'C-1')).toBe(3.25);
  const other = await takeIn(bearer, fileOf(row('C-1', '2'), row('C-2', '2')));
  expect(other).toMatchObject({ updated: 1, rejected: 1 });
  expect(other.summary?.rejectedByReason).toMatchObject([
    { code: 'corrected_by_hand', examples: [{ recordRef: 'C-1' }] },
  ]);
  expect(other.summary?.changes).toMatchObject([
    { recordRef: 'C-2', fields: [{ field: 'recovered_mass', before: '4 kg', after: '2 kg' }] },
  ]);
  expect(await massOf(companyId, 'C-1')).toBe(3.25);
  const overwriting = await takeIn(bearer, fileOf(row('C-1', '2')), { mapping: { overwriteCorrections: true } });
  expect(overwriting).toMatchObject({ updated: 1, rejected: 0 });
  expect(await massOf(companyId, 'C-1')).toBe(2);
  await takeBack(bearer, overwriting.id);
  expect(await massOf(companyId, 'C-1')).toBe(3.25);
});

test('after an undo a record is what an earlier import wrote, and a later file may change it again', async () => {
  const { bearer, companyId } = await newOffice();
  await takeIn(bearer, fileOf(row('D-1', '4')));
  const { id } = await takeIn(bearer, fileOf(row('D-1', '3')));
  await takeBack(bearer, id);
  expect(await massOf(companyId, 'D-1')).toBe(4);
  expect(await takeIn(bearer, fileOf(row('D-1', '3')))).toMatchObject({ updated: 1, rejected: 0 });
});

test('an undo keeps and lists what was changed since', async () => {
  const { bearer, companyId } = await newOffice();
  const { id } = await takeIn(bearer, fileOf(row('E-1', '4'), row('E-2', '4', '', 'Ben Oyelaran'), row('E-3', '4')));
  await correct(companyId, 'E-1', '3.5');
  await takeIn(bearer, fileOf(row('E-2', '2', '', 'Ben Oyelaran')));
  const undone = (await (await takeBack(bearer, id)).json()) as { summary: { keptByUndo: unknown } };
  expect(undone.summary.keptByUndo).toEqual([
    { recordRef: 'E-1', reason: 'Somebody changed this record after the import.' },
    { recordRef: 'E-2', reason: 'A later import changed this record.' },
  ]);
  const left = await tableContents(companyId);
  expect(left.recoveries).toHaveLength(2);
  // Both are still needed by the records that were kept.
  expect(left.technicians).toHaveLength(2);
  expect(left.sites).toHaveLength(1);
});

test('a file changes only what it states', async () => {
  const { bearer, companyId } = await newOffice();
  await takeIn(bearer, fileOf(row('F-1', '4', 'kept')));
  const narrow =
    'record_ref,recovered_at,technician,site,appliance,refrigerant,nameplate_charge,recovered_mass,mass_unit';
  const view = await takeIn(bearer, `${narrow}\nF-1,2024-03-04,Ada Moss,Mill Street,RTU-1,R-410A,5,3,kg\n`);
  expect(view).toMatchObject({ updated: 1 });
  const { rows } = await withCompany({ companyId, actor: 'test' }, (tx) =>
    tx.execute<{ notes: string; entered: Record<string, string> }>(sql`select notes, entered from recoveries`),
  );
  expect(rows).toMatchObject([{ notes: 'kept', entered: { notes: 'kept', recovered_mass: '3' } }]);
});

test('names that differ in case and white space only are one', async () => {
  const { bearer, companyId } = await newOffice();
  const view = await takeIn(bearer, fileOf(row('G-1', '4', '', 'Ada Moss'), row('G-22', '4', '', 'ADA  moss ')));
  expect(view.summary?.newNames.technicians).toEqual({ count: 1, examples: ['Ada Moss'] });
  expect((await tableContents(companyId)).technicians).toHaveLength(1);
});

test('what was told about columns is remembered for the next file with these headers, in this company', async () => {
  const { bearer } = await newOffice();
  const strange = (ref: string) =>
    `Zettel,Wann,Wer,Wo,Was,Gas,Soll,Ist\n${ref},2024-03-04,Ada Moss,Mill Street,RTU-1,R-410A,5,4\n`;
  expect(await takeIn(bearer, strange('H-1'))).toMatchObject({ status: 'failed', rowsRead: 0 });
  const asked = await takeIn(bearer, strange('H-1'), { dryRun: true });
  expect(asked).toMatchObject({ status: 'done', rowsRead: 0 });
  expect(asked.reading?.questions.length).toBeGreaterThan(0);
  const mapping = {
    columns: {
      ...{ record_ref: 'Zettel', recovered_at: 'Wann', technician: 'Wer', site: 'Wo', appliance: 'Was' },
      ...{ refrigerant: 'Gas', nameplate_charge: 'Soll', recovered_mass: 'Ist' },
    },
    massUnit: 'kg' as const,
  };
  expect(await takeIn(bearer, strange('H-1'), { mapping })).toMatchObject({ status: 'done', added: 1 });
  expect(await takeIn(bearer, strange('H-2'))).toMatchObject({ status: 'done', added: 1 });
  expect(await takeIn((await newOffice()).bearer, strange('H-3'))).toMatchObject({ status: 'failed' });
});
