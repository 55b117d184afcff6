import { describe, expect, test } from 'vitest';
import { csvOf, readFile, refusedCodes, takenRows } from '@/tests/support/read-recovery-file';

// 1 lb = 0.45359237 kg exactly: NIST Handbook 44, appendix C.
const KG = { '4.4 lb': '1.995806428', '1 lb 5.5 oz': '0.609514747', '1234.5 lb': '559.959780765' };

const recovered = async (cells: Record<string, string>[], without: string[] = []) =>
  takenRows(await readFile(csvOf(cells, without))).map(({ recoveredMassKg }) => recoveredMassKg);

describe('masses', () => {
  test('every unit gives exact kilograms', async () => {
    const masses = [
      { recovered_mass: '4.4', mass_unit: 'lbs' },
      { recovered_mass: '1-5.5', nameplate_charge: '9', mass_unit: 'lb-oz' },
      { recovered_mass: '1 lb 5.5 oz', nameplate_charge: '9-0', mass_unit: 'LB/OZ' },
      { recovered_mass: '21.5', mass_unit: 'ounces' },
      { recovered_mass: '3.719', mass_unit: 'Kg' },
      { recovered_mass: '3719', mass_unit: 'grams' },
    ];
    expect(await recovered(masses)).toEqual([
      KG['4.4 lb'],
      ...[KG['1 lb 5.5 oz'], KG['1 lb 5.5 oz'], KG['1 lb 5.5 oz']],
      ...['3.719000000', '3.719000000'],
    ]);
  });

  test('without a recovered mass it is end less start', async () => {
    const weights = { start_weight: '17.5', end_weight: '21.9' };
    expect(await recovered([weights], ['recovered_mass'])).toEqual([KG['4.4 lb']]);
    expect(await recovered([{ ...weights, recovered_mass: '' }, {}])).toEqual([KG['4.4 lb'], KG['4.4 lb']]);
  });

  test('weights and mass may differ by the rounding of three readings, not by more', async () => {
    const row = (recovered_mass: string) => ({ start_weight: '17.5', end_weight: '21.9', recovered_mass });
    // Read to 0.1 lb: half a step for each of three readings is 0.15 lb.
    const file = await readFile(csvOf([row('4.4'), row('4.5'), row('4.6')]));
    expect(refusedCodes(file)).toEqual([[4, ['weights_disagree']]]);
    // The same weights read to 0.01 lb: 0.015 lb at most.
    const fine = (recovered_mass: string) => ({ start_weight: '17.50', end_weight: '21.90', recovered_mass });
    expect(refusedCodes(await readFile(csvOf([fine('4.41'), fine('4.42')])))).toEqual([[3, ['weights_disagree']]]);
  });

  test('a unit may stand in the header or in the cell', async () => {
    const inHeader = csvOf(
      [{ 'Recovered (lb)': '4.4', 'Nameplate (oz)': '130' }],
      [...['recovered_mass', 'nameplate_charge', 'mass_unit']],
    );
    const [row] = takenRows(await readFile(inHeader));
    expect(row).toMatchObject({ recoveredMassKg: KG['4.4 lb'], massUnit: 'lb', nameplateChargeKg: '3.685438006' });
    expect(await recovered([{ recovered_mass: '4.4 lb', nameplate_charge: '8.2lbs' }], ['mass_unit'])).toEqual([
      KG['4.4 lb'],
    ]);
  });

  test('a unit that nothing names is asked, and told for all rows', async () => {
    const file = csvOf([{}], ['mass_unit']);
    const asked = (await readFile(file)).plan.reading.questions;
    expect(asked).toMatchObject([{ about: 'massUnit' }]);
    const [row] = takenRows(await readFile(file, { massUnit: 'kg' }));
    expect(row).toMatchObject({ recoveredMassKg: '4.400000000', massUnit: 'kg' });
  });

  test.each([
    [{ mass_unit: '' }, ['unit_missing', 'unit_missing']],
    [{ mass_unit: 'stone' }, ['unknown_unit']],
    [{ recovered_mass: '1-5.5' }, ['unit_conflict']],
    [{ recovered_mass: '2-16', nameplate_charge: '9-0', mass_unit: 'lb-oz' }, ['not_a_mass']],
    [{ recovered_mass: '7.5', nameplate_charge: '9-0', mass_unit: 'lb-oz' }, ['not_a_mass']],
    [{ recovered_mass: '5-Jan', nameplate_charge: '9-0', mass_unit: 'lb-oz' }, ['date_in_mass']],
    [{ recovered_mass: '1/5/2015' }, ['date_in_mass']],
    [{ recovered_mass: '-1' }, ['negative_mass']],
    [{ recovered_mass: '' }, ['missing']],
    [{ recovered_mass: 'some' }, ['not_a_mass']],
    [{ recovered_mass: '1e3' }, ['not_a_mass']],
    [{ nameplate_charge: '0' }, ['nameplate_not_positive']],
    [{ nameplate_charge: '' }, ['missing']],
    [{ nameplate_charge: '9999999' }, ['mass_too_large']],
    [{ start_weight: '21.9', end_weight: '17.5' }, ['end_below_start']],
  ])('%j is refused: %j', async (cells, codes) => {
    expect(refusedCodes(await readFile(csvOf([cells, {}])))).toEqual([[2, codes]]);
  });
});

describe('decimal marks', () => {
  test('are decided by the whole column', async () => {
    expect(await recovered([{ recovered_mass: '1.234,5' }, { recovered_mass: '4,4' }])).toEqual([
      ...[KG['1234.5 lb'], KG['4.4 lb']],
    ]);
    expect(await recovered([{ recovered_mass: '1,234.5' }, { recovered_mass: '4.4' }])).toEqual([
      ...[KG['1234.5 lb'], KG['4.4 lb']],
    ]);
  });

  test('a lone 1,234 is asked', async () => {
    const file = csvOf([{ recovered_mass: '1,234' }]);
    const { plan } = await readFile(file);
    expect(plan.reading.questions).toMatchObject([
      { about: 'decimalMark', header: 'recovered_mass', choices: [{ value: 'point' }, { value: 'comma' }] },
    ]);
    const told = await readFile(file, { decimalMarks: { recovered_mass: 'comma' } });
    expect(takenRows(told)[0]?.recoveredMassKg).toBe('0.559732985');
  });

  test('three decimals follow the point that the other columns have', async () => {
    const kilograms = [{ recovered_mass: '1.234', nameplate_charge: '2.5', mass_unit: 'kg' }];
    expect(await recovered(kilograms)).toEqual(['1.234000000']);
  });

  test('a column with both marks is asked', async () => {
    const { plan } = await readFile(csvOf([{ recovered_mass: '4,4' }, { recovered_mass: '4.4' }]));
    expect(plan.reading.questions).toMatchObject([{ about: 'decimalMark', header: 'recovered_mass' }]);
  });
});
