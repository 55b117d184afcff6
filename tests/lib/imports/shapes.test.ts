import { describe, expect, test } from 'vitest';
import { csvOf, readFile, refusedCodes, takenRows } from '@/tests/support/read-recovery-file';

const HEADER =
  'record_ref,recovered_at,technician,site,appliance,refrigerant,nameplate_charge,recovered_mass,mass_unit';
const row = (ref: string, rest = '') => `${ref},2015-01-13,Uma,S1,A1,R-22,8.2,4.4,lb${rest}`;
const lines = (...text: string[]) => `${text.join('\n')}\n`;

describe('rows and cells', () => {
  test('quotes, doubled quotes, separators and line breaks inside quotes; lines count as an editor counts', async () => {
    const note = 'He said "done",\nthen left; at 5';
    const file = await readFile(csvOf([{ notes: note }, {}, { notes: 'a\r\nb' }, { technician: '' }]));
    expect(file.rows.map(({ line }) => line)).toEqual([2, 4, 5, 7]);
    expect(file.rows[0]?.ok && file.rows[0].row.entered.notes).toBe(note);
    expect(refusedCodes(file)).toEqual([[7, ['missing']]]);
  });

  test('line ends of all three kinds, mixed', async () => {
    const file = await readFile(`${HEADER}\r${row('T-1')}\r\n${row('T-2')}\n\n\r\n${row('T-3')}`);
    expect(takenRows(file).map(({ recordRef }) => recordRef)).toEqual(['T-1', 'T-2', 'T-3']);
    expect(file.rows.map(({ line }) => line)).toEqual([2, 3, 6]);
  });

  test('too few or too many cells refuse the row, empty tails do not', async () => {
    const file = await readFile(lines(HEADER, row('T-1'), 'T-2,2015-01-13,Uma', row('T-3', ',9'), row('T-4', ',,')));
    expect(refusedCodes(file)).toEqual([
      [3, ['too_few_cells']],
      [4, ['too_many_cells']],
    ]);
    expect(file.rows[1]?.cells).toEqual(['T-2', '2015-01-13', 'Uma']);
  });

  test.each([
    ['that never closes', `T-2,2015-01-13,"Uma,S1,A1,R-22,8.2,4.4,lb`],
    [
      'that a later row closes',
      `T-2,2015-01-13,"Uma,S1,A1,R-22,8.2,4.4,lb`,
      `T-3,2015-01-13,"Uma",S1,A1,R-22,8.2,4.4,lb`,
    ],
  ])('a quotation mark %s spoils its own line only', async (_name, broken, ...after) => {
    const file = await readFile(lines(HEADER, row('T-1'), broken, ...after, row('T-4'), row('T-5')));
    expect(refusedCodes(file)).toEqual([[3, ['quote_not_closed']]]);
    expect(file.rows.filter(({ ok }) => ok)).toHaveLength(3 + after.length);
  });

  test('all reasons of a row come at once, each with its column and cell', async () => {
    const file = await readFile(
      csvOf([{ recovered_at: '2027-01-01', refrigerant: 'R-999', recovered_mass: 'x', job_type: 'party' }]),
    );
    const [refused] = file.rows;
    expect(refused?.ok === false && refused.reasons.map(({ column, code, value }) => [column, code, value])).toEqual([
      ['recovered_at', 'date_in_future', '2027-01-01'],
      ['refrigerant', 'unknown_refrigerant', 'R-999'],
      ['recovered_mass', 'not_a_mass', 'x'],
      ['job_type', 'unknown_word', 'party'],
    ]);
    expect(refused?.recordRef).toBe('T-1');
  });

  test('formulas are text', async () => {
    const [taken] = takenRows(
      await readFile(csvOf([{ technician: '=1+1', site: '@x', notes: '+HYPERLINK("a","b")' }])),
    );
    expect(taken).toMatchObject({ technician: '=1+1', site: '@x', notes: '+HYPERLINK("a","b")' });
  });

  test('200 columns; those that no field takes are kept with the row', async () => {
    const others = Object.fromEntries(Array.from({ length: 191 }, (_, i) => [`Other ${i + 1}`, `v${i + 1}`]));
    const file = await readFile(csvOf([others, { 'Other 7': 'seven' }]));
    expect(file.plan.headers).toHaveLength(200);
    const [first, second] = takenRows(file);
    expect(first?.extra).toEqual(others);
    expect(second?.extra).toEqual({ 'Other 7': 'seven' });
  });
});

describe('words', () => {
  test.each(['R-410A', 'R410A', '410a', 'r 410 a', 'HFC-410A', 'r_410.a'])('%s is R-410A', async (refrigerant) => {
    expect(takenRows(await readFile(csvOf([{ refrigerant }])))[0]?.refrigerant).toBe('R-410A');
  });

  test('an unknown refrigerant says what may have been meant', async () => {
    const [refused] = (await readFile(csvOf([{ refrigerant: 'R-410' }]))).rows;
    expect(refused?.ok === false && refused.reasons[0]?.message).toBe(
      '“R-410” is no refrigerant of the catalogue. Was R-410A meant?',
    );
  });

  test('closed lists take the words of offices', async () => {
    const [taken] = takenRows(
      await readFile(
        csvOf([
          {
            job_type: 'Leak repair',
            appliance_category: 'Comfort Cooling',
            disposition: 'to reclaimer',
            technician_certification: 'Type 2',
            manufactured_on: '1998-05-01',
          },
        ]),
      ),
    );
    expect(taken).toMatchObject({
      jobType: 'repair',
      category: 'comfort_cooling',
      disposition: 'to_reclaimer',
      technicianCertification: 'II',
      manufacturedOn: '1998-05-01',
    });
  });
});

describe('vacuum', () => {
  const read = async (cells: Record<string, string>, told = {}) => readFile(csvOf([cells]), told);

  test('readings become absolute pressures', async () => {
    // A vacuum of 10 inHg is 101.325 - 10 × 3.386389 kPa (NIST SP 811, appendix B.8).
    const [inches] = takenRows(
      await read({ final_vacuum: '10', vacuum_unit: 'in. Hg', hold_rise: '0.4', hold_minutes: '5' }),
    );
    expect(inches).toMatchObject({ finalVacuumKpaAbs: '67.461110', holdRiseKpa: '1.354556', holdMinutes: '5' });
    const [microns] = takenRows(await read({ 'Final vacuum (microns)': '500' }));
    expect(microns).toMatchObject({ finalVacuumKpaAbs: '0.066661', vacuumUnit: 'micron' });
  });

  test('a reading without unit is refused, or asked when no column could name it', async () => {
    expect(refusedCodes(await read({ final_vacuum: '10', vacuum_unit: '' }))).toEqual([[2, ['unit_missing']]]);
    const { plan } = await read({ final_vacuum: '10' });
    expect(plan.reading.questions).toMatchObject([{ about: 'vacuumUnit' }]);
    expect(takenRows(await read({ final_vacuum: '10' }, { vacuumUnit: 'inhg' }))[0]?.vacuumUnit).toBe('inhg');
  });

  test.each([
    [{ final_vacuum: '30', vacuum_unit: 'inhg' }, 'impossible_vacuum'],
    [{ final_vacuum: '-1', vacuum_unit: 'inhg' }, 'impossible_vacuum'],
    [{ final_vacuum: '-15', vacuum_unit: 'psig' }, 'impossible_vacuum'],
    [{ final_vacuum: '10', vacuum_unit: 'psi' }, 'unknown_unit'],
    [{ final_vacuum: 'deep', vacuum_unit: 'inhg' }, 'not_a_pressure'],
    [{ hold_minutes: '-5' }, 'impossible_hold'],
  ])('%j is refused: %s', async (cells, code) => {
    expect(refusedCodes(await read(cells))).toEqual([[2, [code]]]);
  });
});
