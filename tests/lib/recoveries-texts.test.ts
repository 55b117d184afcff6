import fc from 'fast-check';
import { expect, test } from 'vitest';
import { emptyTexts, type RecordTexts } from '@/lib/recoveries/fields';
import { liveYield } from '@/lib/recoveries/live-yield';
import { whenText } from '@/lib/recoveries/local-time';
import { readTexts } from '@/lib/recoveries/read-texts';
import { type StoredRecord, storedTexts } from '@/lib/recoveries/stored-texts';
import { massText, riseText, vacuumText } from '@/lib/recoveries/unit-text';
import { kgToGram, massToKg, riseToKpa, vacuumToKpaAbs } from '@/lib/units';
import { MASS_UNITS, VACUUM_UNITS } from '@/lib/vocabulary';

const context = { timeZone: 'America/New_York', refrigerants: new Set(['R-22', 'R-410A']), today: '2026-12-01' };

const typed: RecordTexts = emptyTexts({
  recordRef: 'T-1',
  recoveredAt: '2026-07-01T22:30:00',
  technician: 'Robin Vale',
  site: 'Mill Street School',
  appliance: 'RTU-1',
  refrigerant: 'R-410A',
  nameplateCharge: '12.50',
  startWeight: '17.5',
  endWeight: '28.2',
  massUnit: 'lb',
  finalVacuum: '29.1',
  vacuumUnit: 'inhg',
  holdMinutes: '5',
  holdRise: '0.3',
  notes: 'dry',
});

const stored = (texts: RecordTexts): StoredRecord => {
  const read = readTexts(texts, context);
  if (!read.ok) throw new Error(JSON.stringify(read.errors));
  const { row } = read;
  const holdMinutes = row.holdMinutes === null ? null : Number(row.holdMinutes);
  return { ...row, recoveredWhen: whenText(row, context.timeZone), holdMinutes };
};

test('what was typed comes back to the letter', () => {
  expect(storedTexts(stored(typed))).toEqual(typed);
});

test('a text that no longer means what is stored gives way to the stored value', () => {
  const record = { ...stored(typed), nameplateChargeKg: '4.535923700' };
  // 4.5359237 kg = 10 lb (NIST SP 811, appendix B.8)
  expect(storedTexts(record).nameplateCharge).toBe('10');
});

test('a recovered mass that nobody typed stays empty only while it follows from the weights', () => {
  expect(storedTexts(stored(typed)).recoveredMass).toBe('');
  expect(storedTexts({ ...stored(typed), recoveredMassKg: '4.535923700' }).recoveredMass).toBe('10');
});

test('a decimal comma of an imported file is written with a point', () => {
  const record = { ...stored(typed), entered: { nameplate_charge: '12,50' } };
  expect(storedTexts(record).nameplateCharge).toBe('12.5');
});

test('every mass comes back from its text to the microgram, in every unit', () => {
  fc.assert(
    fc.property(fc.constantFrom(...MASS_UNITS), fc.bigInt({ min: 0n, max: 10n ** 14n }), (unit, micrograms) => {
      const digits = micrograms.toString().padStart(10, '0');
      const kg = `${digits.slice(0, -9)}.${digits.slice(-9)}`;
      expect(massToKg(massText(kg, unit), unit)).toBe(kg);
    }),
    { seed: 20261201 },
  );
});

test('a mass typed with few decimals is written with as few', () => {
  fc.assert(
    fc.property(fc.constantFrom('lb', 'kg', 'g', 'oz'), fc.nat(99_999), (unit, hundredths) => {
      const text = String(hundredths / 100);
      expect(massText(massToKg(text, unit), unit)).toBe(text);
    }),
    { seed: 20261201 },
  );
  expect(massText(massToKg('1-5.5', 'lb-oz'), 'lb-oz')).toBe('1-5.5');
  expect(massText(massToKg('3', 'lb-oz'), 'lb-oz')).toBe('3');
  expect(massText(null, 'lb')).toBe('');
});

test('pressures come back from their text as the database keeps them', () => {
  fc.assert(
    fc.property(fc.constantFrom(...VACUUM_UNITS), fc.nat(299), (unit, tenths) => {
      const reading = tenths / 10;
      const kpa = Number(vacuumToKpaAbs(reading, unit).toFixed(6));
      expect(vacuumToKpaAbs(Number(vacuumText(kpa, unit)), unit)).toBeCloseTo(kpa, 6);
      const rise = Number(riseToKpa(reading, unit).toFixed(6));
      expect(riseToKpa(Number(riseText(rise, unit)), unit)).toBeCloseTo(rise, 6);
    }),
    { seed: 20261201 },
  );
  expect(vacuumText(Number(vacuumToKpaAbs(29.1, 'inhg').toFixed(6)), 'inhg')).toBe('29.1');
  expect(vacuumText(null, 'inhg')).toBe('');
});

test('a local time is written as it was, and in UTC on the night the clocks go back', () => {
  // United States, 2026: clocks go back on 1 November at 2:00 (15 U.S.C. 260a).
  const zone = 'America/New_York';
  expect(whenText({ recoveredOn: '2026-11-01', recoveredAt: null }, zone)).toBe('2026-11-01');
  const at = (recoveredAt: string) => whenText({ recoveredOn: '2026-11-01', recoveredAt }, zone);
  expect(at('2026-11-01T04:59:00Z')).toBe('2026-11-01T00:59:00');
  expect(at('2026-11-01T05:30:00Z')).toBe('2026-11-01T05:30:00Z');
  expect(at('2026-11-01T06:30:00Z')).toBe('2026-11-01T06:30:00Z');
  expect(at('2026-11-01T07:30:00Z')).toBe('2026-11-01T02:30:00');
});

test('the running yield is recovered mass over full charge, as far as the texts tell it', () => {
  expect(liveYield({ ...typed, addedCharge: '1.5' }).yield).toBeCloseTo(10.7 / 14, 12);
  expect(liveYield({ ...typed, recoveredMass: '7' }).yield).toBeCloseTo(7 / 12.5, 12);
  expect(
    liveYield({ ...typed, massUnit: 'lb-oz', nameplateCharge: '1-8', startWeight: '2', endWeight: '3' }).yield,
  ).toBeCloseTo(1 / 1.5, 12);
  for (const gap of [
    { nameplateCharge: '' },
    { endWeight: '' },
    { endWeight: '1' },
    { nameplateCharge: '0' },
    { massUnit: '' },
  ])
    expect(liveYield({ ...typed, ...gap }).yield).toBeNull();
});

test('kilograms are rounded to the gram by their decimal figures', () => {
  expect([1.0005, 4.853438359, 2e-7, 0, 12].map(kgToGram)).toEqual([1.001, 4.853, 0, 0, 12]);
});
