import { describe, expect, test } from 'vitest';
import { requiredLevelKpaAbs } from '@/lib/trade/evacuation-level';
import type { PressureClass } from '@/lib/trade/pressure-class';
import { vacuumToKpaAbs } from '@/lib/units';
import type { ApplianceCategory } from '@/lib/vocabulary';
import { rowsAs } from '../../support/as-role';

const KG_PER_LB = 0.45359237;

/** Worked by hand from 40 CFR 82.156(a) Table 1 (machine made on or after 15 November 1993) and (b). */
const EXAMPLES: [what: string, designation: string, lb: number, category: ApplianceCategory | null, level: number][] = [
  ['R-134a chiller of 600 lb: 15 inHg', 'R-134a', 600, 'comfort_cooling', vacuumToKpaAbs(15, 'inhg')],
  ['R-134a case of 40 lb: 10 inHg', 'R-134a', 40, 'commercial_refrigeration', vacuumToKpaAbs(10, 'inhg')],
  ['R-22 rooftop unit of 22 lb: 0', 'R-22', 22, 'comfort_cooling', vacuumToKpaAbs(0, 'psig')],
  ['R-22 chiller of 250 lb: 10 inHg', 'R-22', 250, 'comfort_cooling', vacuumToKpaAbs(10, 'inhg')],
  ['R-22 of exactly 200 lb: 10 inHg', 'R-22', 200, null, vacuumToKpaAbs(10, 'inhg')],
  ['R-22 just below 200 lb: 0', 'R-22', 199.99, null, vacuumToKpaAbs(0, 'inhg')],
  ['R-123 chiller: 25 mm Hg absolute', 'R-123', 700, 'comfort_cooling', vacuumToKpaAbs(25, 'mmhg_abs')],
  ['R-744 of any size: 0', 'R-744', 300, 'commercial_refrigeration', vacuumToKpaAbs(0, 'inhg')],
  ['a small R-134a appliance: 4 inHg', 'R-134a', 1.2, 'small_appliance', vacuumToKpaAbs(4, 'inhg')],
  ['a small R-290 appliance: 4 inHg', 'R-290', 0.3, 'small_appliance', vacuumToKpaAbs(4, 'inhg')],
];

const classOf = async (designation: string): Promise<PressureClass> => {
  const [row] = await rowsAs<{ pressure_class: PressureClass }>(
    'server',
    {},
    'select pressure_class from refrigerants where designation = $1',
    [designation],
  );
  if (!row) throw new Error(`The catalogue has no ${designation}`);
  return row.pressure_class;
};

describe.each(EXAMPLES)('%s', (_what, designation, lb, category, level) => {
  test('by the function and by the database', async () => {
    const pressureClass = await classOf(designation);
    expect(requiredLevelKpaAbs(pressureClass, lb * KG_PER_LB, category)).toBeCloseTo(level, 9);
    const [row] = await rowsAs<{ level: number }>(
      'server',
      {},
      'select required_level_kpa_abs($1, $2::numeric, $3) as level',
      [pressureClass, (lb * KG_PER_LB).toFixed(9), category],
    );
    expect(row?.level).toBeCloseTo(level, 9);
  });
});

test('a charge that is none is refused', () => {
  expect(() => requiredLevelKpaAbs('high', 0, null)).toThrow(RangeError);
  expect(() => requiredLevelKpaAbs('high', Number.NaN, null)).toThrow(RangeError);
});
