import { describe, expect, test } from 'vitest';
import writeXlsxFile from 'write-excel-file/node';
import { plainNumber } from '@/lib/imports/xlsx';
import { readFile, refusedCodes, takenRows } from '@/tests/support/read-recovery-file';

const HEADERS = [
  ...['record_ref', 'recovered_at', 'technician', 'site', 'appliance', 'refrigerant', 'nameplate_charge'],
  ...['recovered_mass', 'mass_unit'],
];
const header = HEADERS.map((value) => ({ value, type: String }));
const text = (value: string) => ({ value, type: String });
const number = (value: number) => ({ value, type: Number });
const date = (iso: string) => ({ value: new Date(iso), type: Date, format: 'yyyy-mm-dd hh:mm' });

const row = (mass: ReturnType<typeof number> | ReturnType<typeof text> | ReturnType<typeof date>, unit = 'kg') => [
  ...[number(881), date('2015-01-13T11:06:00Z'), text('Uma'), text('S1'), text('A1'), number(22), number(8.2)],
  ...[mass, text(unit)],
];

describe('Excel files', () => {
  test('typed cells become dates and exact numbers', async () => {
    const bytes = await writeXlsxFile([header, row(number(0.1 + 0.2)), row(number(1.234))]).toBuffer();
    const file = await readFile(bytes);
    expect(file.plan.reading).toMatchObject({ format: 'xlsx', encoding: null, delimiter: null, questions: [] });
    expect(takenRows(file)[0]).toMatchObject({
      recordRef: '881',
      recoveredAt: '2015-01-13T11:06:00-05:00',
      refrigerant: 'R-22',
      recoveredMassKg: '0.300000000',
    });
    expect(takenRows(file)[1]?.recoveredMassKg).toBe('1.234000000');
  });

  test('pounds and ounces that Excel made a date are refused with that reason', async () => {
    const bytes = await writeXlsxFile([header, row(date('2026-01-05T00:00:00Z'), 'lb')]).toBuffer();
    expect(refusedCodes(await readFile(bytes))).toEqual([[2, ['date_in_mass']]]);
  });

  test('the sheet with the recoveries is found, and rows keep Excel’s numbers', async () => {
    const cover = [[text('Recoveries of 2015')]];
    const bytes = await writeXlsxFile([
      { sheet: 'Cover', data: cover },
      { sheet: 'Data', data: [header, row(number(1)), [], row(number(2))] },
    ]).toBuffer();
    const file = await readFile(bytes);
    expect(file.rows.map(({ line }) => line)).toEqual([2, 4]);
  });

  test('numbers are written without noise or exponent', () => {
    expect([0.1 + 0.2, 8.199999999999999, 1e-7, 1e21, -4.5, 22].map(plainNumber)).toEqual([
      ...['0.3', '8.2', '0.0000001', '1000000000000000000000', '-4.5', '22'],
    ]);
  });
});
