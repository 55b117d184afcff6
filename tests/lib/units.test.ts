import fc from 'fast-check';
import { expect, test } from 'vitest';
import {
  KPA,
  kgText,
  kgToUnit,
  kpaAbsToVacuum,
  massToKg,
  massToMicrograms,
  riseToKpa,
  vacuumToKpaAbs,
} from '@/lib/units';
import { VACUUM_UNITS } from '@/lib/vocabulary';

// NIST Handbook 44 appendix C and SP 811 (2008) B.8: 1 lb = 0.45359237 kg exactly, 1 oz = 28.349523125 g exactly.
test.each([
  ['1', 'lb', '0.453592370'],
  ['1', 'oz', '0.028349523'],
  ['16', 'oz', '0.453592370'],
  ['1', 'kg', '1.000000000'],
  ['1', 'g', '0.001000000'],
  ['1-0', 'lb-oz', '0.453592370'],
  ['1000', 'lb', '453.592370000'],
  // 12 lb 6 oz = 12.375 lb = 5.613205579 kg: 12.375 x 0.45359237 = 5.61320557875.
  ['12-6', 'lb-oz', '5.613205579'],
  ['12.375', 'lb', '5.613205579'],
  ['8.2', 'lb', '3.719457434'],
] as const)('%s %s are %s kg', (text, unit, kg) => {
  expect(massToKg(text, unit)).toBe(kg);
});

test.each([
  ['7', 7],
  ['7-0', 7],
  ['7 - 8', 7.5],
  ['0-15.9', 15.9 / 16],
  ['1-5.5', 1 + 5.5 / 16],
  ['1-.5', 1 + 0.5 / 16],
] as const)('“%s” pounds and ounces are %s lb', (text, pounds) => {
  expect(massToMicrograms(text, 'lb-oz')).toBe(massToMicrograms(String(pounds), 'lb'));
});

test.each(['1-16', '1-99', '7.5-3', '1-', '-5', '1-5-2', '1--5', 'seven', '', ' ', '1-5 oz'])(
  '“%s” is no pounds and ounces',
  (text) => {
    expect(massToMicrograms(text, 'lb-oz')).toBeNull();
    expect(massToKg(text, 'lb-oz')).toBeNull();
  },
);

test.each(['', ' ', '.', '-', '1.2.3', '1,2', '1e3', '0x10', 'NaN', 'Infinity', '12 lb'])(
  '“%s” is no number',
  (text) => {
    expect(massToKg(text, 'lb')).toBeNull();
  },
);

test.each([
  ['.5', 500_000_000n],
  ['5.', 5_000_000_000n],
  ['+5', 5_000_000_000n],
  [' 5 ', 5_000_000_000n],
  ['-0.25', -250_000_000n],
  ['0.0000000004', 0n],
  ['0.0000000005', 1n],
  ['-0.0000000005', -1n],
] as const)('“%s” kg are %s micrograms', (text, micrograms) => {
  expect(massToMicrograms(text, 'kg')).toBe(micrograms);
});

const hundredths = fc.integer({ min: 0, max: 10_000_000 });
const decimal = (n: number) => `${Math.floor(n / 100)}.${String(n % 100).padStart(2, '0')}`;

test('sixteen ounces are a pound, whatever the number', () => {
  fc.assert(
    fc.property(fc.integer({ min: 0, max: 1_000_000 }), (pounds) => {
      expect(massToMicrograms(String(pounds * 16), 'oz')).toBe(massToMicrograms(String(pounds), 'lb'));
    }),
  );
});

test('pounds and ounces are the pounds plus the ounces, to within the rounding of one microgram', () => {
  fc.assert(
    fc.property(fc.integer({ min: 0, max: 5000 }), fc.integer({ min: 0, max: 159 }), (pounds, tenths) => {
      const ounces = `${Math.floor(tenths / 10)}.${tenths % 10}`;
      const together = massToMicrograms(`${pounds}-${ounces}`, 'lb-oz') ?? 0n;
      const inTenths = BigInt(pounds * 160 + tenths);
      // Exact value times 160, so that no fraction is left: 1 lb = 453 592 370 micrograms.
      const off = together * 160n - inTenths * 453_592_370n;
      expect(off <= 80n && off >= -80n).toBe(true);
    }),
  );
});

test('a mass in hundredths of a pound is exact: no digit comes from floating point', () => {
  fc.assert(
    fc.property(hundredths, (n) => {
      const exact = BigInt(n) * 453_592_370n;
      const micrograms = massToMicrograms(decimal(n), 'lb') ?? -1n;
      expect((micrograms * 100n - exact) ** 2n <= 50n ** 2n).toBe(true);
    }),
  );
});

test('micrograms to text and back lose nothing', () => {
  fc.assert(
    fc.property(fc.bigInt({ min: -(10n ** 17n), max: 10n ** 17n }), (micrograms) => {
      const text = kgText(micrograms);
      expect(text).toMatch(/^-?\d+\.\d{9}$/);
      expect(massToMicrograms(text, 'kg')).toBe(micrograms);
    }),
  );
});

test('a sum of masses is the mass of the sum', () => {
  fc.assert(
    fc.property(hundredths, hundredths, (a, b) => {
      const [x, y, both] = [a, b, a + b].map((n) => massToMicrograms(decimal(n), 'kg') ?? 0n);
      expect((x ?? 0n) + (y ?? 0n)).toBe(both);
    }),
  );
});

test('kilograms are shown in the unit of the reader', () => {
  expect(kgToUnit(0.45359237, 'lb')).toBe(1);
  expect(kgToUnit(11.33980925, 'lb')).toBeCloseTo(25, 12);
  expect(kgToUnit(3.5, 'kg')).toBe(3.5);
});

// NIST SP 811 (2008) B.8: conventional inch and millimetre of mercury, pound-force per square inch, standard atmosphere.
test('pressure factors are those of NIST SP 811', () => {
  expect(KPA).toEqual({ atmosphere: 101.325, inHg: 3.386389, mmHg: 0.1333224, psi: 6.894757 });
});

// Worked by hand with a reference of 29.921 inHg.
test.each([
  [0, 101.325, 14.696, 760.0],
  [4, 87.779, 12.731, 658.4],
  [10, 67.461, 9.784, 506.0],
  [15, 50.529, 7.329, 379.0],
  [20, 33.6, 4.873, 252.0],
  [25, 16.66, 2.417, 125.0],
] as const)('%s inHg vacuum are %s kPa, %s psia, %s mmHg absolute', (inHg, kpa, psia, mmHg) => {
  const kpaAbs = vacuumToKpaAbs(inHg, 'inhg');
  // The table rounds to the third decimal, its last rows to the second.
  expect(Math.abs(kpaAbs - kpa)).toBeLessThan(0.006);
  expect(Math.abs(kpaAbs / KPA.psi - psia)).toBeLessThan(0.001);
  expect(Math.abs(kpaAbsToVacuum(kpaAbs, 'mmhg_abs') - mmHg)).toBeLessThan(0.06);
});

test.each([
  [25, 'mmhg_abs', 3.33306],
  [500, 'micron', 0.0666612],
  [0, 'psig', 101.325],
  [-14.695949, 'psig', 0],
  [67.46, 'kpa_abs', 67.46],
] as const)('%s %s are %s kPa absolute', (value, unit, kpaAbs) => {
  expect(vacuumToKpaAbs(value, unit)).toBeCloseTo(kpaAbs, 4);
});

// 40 CFR 82.156(a) Table 1 asks 25 mm Hg absolute of low-pressure appliances: 28.94 inHg on the reference of 29.921 inHg.
test('25 mmHg absolute are 3.333 kPa, 0.4834 psia and 28.94 inHg vacuum', () => {
  const kpaAbs = vacuumToKpaAbs(25, 'mmhg_abs');
  expect(kpaAbs).toBeCloseTo(3.333, 3);
  expect(kpaAbs / KPA.psi).toBeCloseTo(0.4834, 4);
  expect(kpaAbsToVacuum(kpaAbs, 'inhg')).toBeCloseTo(28.94, 2);
});

test('an inch of mercury is 25.4 mm, a millimetre a thousand microns', () => {
  expect(vacuumToKpaAbs(25.4, 'mmhg_abs')).toBeCloseTo(KPA.inHg, 5);
  expect(vacuumToKpaAbs(1000, 'micron')).toBe(vacuumToKpaAbs(1, 'mmhg_abs'));
});

test('every vacuum unit comes back as it went', () => {
  const reading = fc.double({ min: -30, max: 800, noNaN: true });
  fc.assert(
    fc.property(reading, fc.constantFrom(...VACUUM_UNITS), (value, unit) => {
      expect(kpaAbsToVacuum(vacuumToKpaAbs(value, unit), unit)).toBeCloseTo(value, 6);
    }),
  );
});

test('a reading means the same pressure in every unit', () => {
  const kpaAbs = fc.double({ min: 0, max: 110, noNaN: true });
  fc.assert(
    fc.property(kpaAbs, fc.constantFrom(...VACUUM_UNITS), (pressure, unit) => {
      expect(vacuumToKpaAbs(kpaAbsToVacuum(pressure, unit), unit)).toBeCloseTo(pressure, 9);
    }),
  );
});

test('a rise is a difference: the standard atmosphere does not come in, and lost vacuum counts as a rise', () => {
  expect(riseToKpa(1, 'inhg')).toBeCloseTo(3.386389, 9);
  expect(riseToKpa(2, 'psig')).toBeCloseTo(13.789514, 9);
  expect(riseToKpa(500, 'micron')).toBeCloseTo(0.0666612, 9);
  expect(riseToKpa(3, 'kpa_abs')).toBe(3);
  expect(riseToKpa(0, 'mmhg_abs')).toBe(0);
});
