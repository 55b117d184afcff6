import { describe, expect, test } from 'vitest';
import { csvOf, readFile, refusedCodes, takenRows } from '@/tests/support/read-recovery-file';

const OFFICE = [
  'Ticket #;Date;Tech;Job Site;Equipment ID;Gas;Nameplate (lbs);Weight before (lb);Weight after (lb);Customer',
  '881;13/01/2015;Uma;S1;A1;410a;8,2;17,5;21,9;Smith',
].join('\n');

describe('headers', () => {
  test('what offices call the columns is understood where it can mean one thing only', async () => {
    const file = await readFile(OFFICE);
    expect(file.plan.reading.questions).toEqual([]);
    expect(takenRows(file)[0]).toMatchObject({
      recordRef: '881',
      recoveredOn: '2015-01-13',
      refrigerant: 'R-410A',
      recoveredMassKg: '1.995806428',
      extra: { Customer: 'Smith' },
    });
  });

  test('a title above the header is passed over', async () => {
    const file = await readFile(`Recoveries 2015,,\n\n${csvOf([{}])}`);
    expect(file.plan.reading.headerLine).toBe(3);
    expect(file.rows.map(({ line }) => line)).toEqual([4]);
    expect(file.plan.rowsTotal).toBe(1);
  });

  test('a needed field that no column is called is asked, with the free columns to choose from', async () => {
    const text = csvOf([{ 'Work order': 'W-1', Crew: 'Uma' }], ['record_ref', 'technician']);
    const { plan } = await readFile(text);
    expect(
      plan.reading.questions.map(({ about, field, choices }) => [about, field, choices.map((c) => c.value)]),
    ).toEqual([
      ['columns', 'record_ref', ['Work order', 'Crew']],
      ['columns', 'technician', ['Work order', 'Crew']],
    ]);
    const told = await readFile(text, { columns: { record_ref: 'Work order', technician: 'Crew' } });
    expect(takenRows(told)[0]).toMatchObject({ recordRef: 'W-1', technician: 'Uma', extra: {} });
    const remembered = await readFile(text, {}, { columns: { record_ref: 'Work order', technician: 'Crew' } });
    expect(remembered.plan.reading.columns.find((c) => c.field === 'technician')?.fieldFrom).toBe('remembered');
  });

  test('two columns for one field are asked; the field’s own name beats other words', async () => {
    const both = await readFile(csvOf([{ Ticket: 'a', Reference: 'b' }], ['record_ref']));
    expect(both.plan.reading.questions).toMatchObject([
      { about: 'columns', field: 'record_ref', choices: [{ value: 'Ticket' }, { value: 'Reference' }] },
    ]);
    const own = await readFile(csvOf([{ Ticket: 'a' }]));
    expect(takenRows(own)[0]).toMatchObject({ recordRef: 'T-1', extra: { Ticket: 'a' } });
  });

  test('the same header twice is told apart by a number', async () => {
    const file = await readFile(`${csvOf([{}]).replace('record_ref', 'Ticket').replace('site', 'Ticket')}`, {
      columns: { record_ref: 'Ticket', site: 'Ticket (2)' },
    });
    expect(takenRows(file)[0]).toMatchObject({ recordRef: 'T-1', site: 'S1' });
  });

  test('a told header that is not there, or is told twice, is bad input', async () => {
    await expect(readFile(csvOf([{}]), { columns: { technician: 'Crew' } })).rejects.toMatchObject({
      status: 400,
      errors: [{ path: 'mapping.columns.technician', message: 'The file has no column “Crew”.' }],
    });
    await expect(readFile(csvOf([{}]), { columns: { technician: 'site', site: 'site' } })).rejects.toMatchObject({
      status: 400,
    });
  });

  test('null leaves a field out', async () => {
    const file = await readFile(csvOf([{ job_type: 'party' }]), { columns: { job_type: null } });
    expect(takenRows(file)[0]).toMatchObject({ jobType: null, extra: { job_type: 'party' } });
  });

  test('blank headers behind the last name are no columns', async () => {
    const text = csvOf([{}, {}]).replaceAll('\r\n', ',,\r\n');
    const file = await readFile(text);
    expect(refusedCodes(file)).toEqual([]);
    expect(file.plan.reading.columns).toHaveLength(9);
  });

  test('the key of a header row does not depend on order, case or spacing', async () => {
    const keyOf = async (header: string) => {
      const { plan } = await readFile(csvOf([{}]).replace(/^.*\r\n/, `${header}\r\n`), { columns: {} });
      return plan.headerKey;
    };
    const header = csvOf([{}]).split('\r\n')[0] ?? '';
    const key = await keyOf(header);
    expect(await keyOf(header.split(',').reverse().join(',').toUpperCase())).toBe(key);
    expect(await keyOf(header.replace('site', 'location'))).not.toBe(key);
  });
});
