import type { DisplayUnit, MassUnit, VacuumUnit } from './vocabulary';

/**
 * Conversions of the trade's units, exact where the unit is exact. Factors: NIST SP 811 (2008) appendix B.8 and NIST
 * Handbook 44 appendix C. Masses go through whole micrograms, never through floating point.
 */

const MICROGRAMS_PER_KG = 1_000_000_000n;

/** Micrograms in one unit, as a fraction: 1 lb = 0.45359237 kg exactly, 1 oz = 1/16 lb. */
const MICROGRAMS: Record<Exclude<MassUnit, 'lb-oz'>, readonly [numerator: bigint, denominator: bigint]> = {
  kg: [MICROGRAMS_PER_KG, 1n],
  g: [1_000_000n, 1n],
  lb: [453_592_370n, 1n],
  oz: [453_592_370n, 16n],
};

const DECIMAL = /^([-+]?)(\d+)(?:\.(\d*))?$|^([-+]?)\.(\d+)$/;

const decimalParts = (decimal: string): { digits: bigint; scale: bigint } | null => {
  const match = DECIMAL.exec(decimal.trim());
  if (!match) return null;
  const sign = (match[1] ?? match[4]) === '-' ? -1n : 1n;
  const fraction = match[3] ?? match[5] ?? '';
  return { digits: sign * BigInt(`${match[2] ?? '0'}${fraction}`), scale: 10n ** BigInt(fraction.length) };
};

const roundedQuotient = (numerator: bigint, denominator: bigint): bigint => {
  const half = numerator < 0n ? -denominator / 2n : denominator / 2n;
  return (numerator + half) / denominator;
};

/** Decimal text of whole micrograms in kilograms, nine decimals: `3.719457434`. */
export const kgText = (micrograms: bigint): string => {
  const sign = micrograms < 0n ? '-' : '';
  const digits = (micrograms < 0n ? -micrograms : micrograms).toString().padStart(10, '0');
  return `${sign}${digits.slice(0, -9)}.${digits.slice(-9)}`;
};

const unitToMicrograms = (decimal: string, unit: Exclude<MassUnit, 'lb-oz'>): bigint | null => {
  const parts = decimalParts(decimal);
  if (!parts) return null;
  const [numerator, denominator] = MICROGRAMS[unit];
  return roundedQuotient(parts.digits * numerator, parts.scale * denominator);
};

// "1-5.5" is one pound five and a half ounces; a lone "7" is seven pounds.
const POUNDS_OUNCES = /^(\d+)(?:\s*-\s*(\d+(?:\.\d*)?|\.\d+))?$/;

const poundsOuncesToMicrograms = (text: string): bigint | null => {
  const match = POUNDS_OUNCES.exec(text.trim());
  if (!match) return null;
  const ounces = match[2] ?? '0';
  if (Number(ounces) >= 16) return null;
  const pounds = unitToMicrograms(match[1] ?? '', 'lb');
  const rest = unitToMicrograms(ounces, 'oz');
  return pounds === null || rest === null ? null : pounds + rest;
};

/**
 * Whole micrograms of a mass written with a decimal point in `unit` (`lb-oz` as `1-5.5`); null for what is no such
 * number, ounces of 16 and more included.
 */
export const massToMicrograms = (text: string, unit: MassUnit): bigint | null =>
  unit === 'lb-oz' ? poundsOuncesToMicrograms(text) : unitToMicrograms(text, unit);

/** The same mass as decimal kilograms for the database; null for what is no number. */
export const massToKg = (text: string, unit: MassUnit): string | null => {
  const micrograms = massToMicrograms(text, unit);
  return micrograms === null ? null : kgText(micrograms);
};

/** Kilograms in one display unit. */
export const KG_PER_UNIT: Record<DisplayUnit, number> = { kg: 1, lb: 0.45359237 };

/** Kilograms as a number of display units. */
export const kgToUnit = (kg: number, unit: DisplayUnit): number => kg / KG_PER_UNIT[unit];

/** Below this a number is written with an exponent; it is no gram anyway. */
const LEAST_PLAIN_KG = 1e-6;

/** Kilograms rounded to the gram, halves up in their decimal form: the precision of the API's masses. */
export const kgToGram = (kg: number): number =>
  Math.abs(kg) < LEAST_PLAIN_KG ? 0 : Number(`${Math.round(Number(`${kg}e3`))}e-3`);

/** Standard atmosphere, the conventional inch and millimetre of mercury (0 °C), pounds per square inch; in kPa. */
export const KPA = { atmosphere: 101.325, inHg: 3.386389, mmHg: 0.1333224, psi: 6.894757 } as const;

/** Absolute pressure in kPa of a vacuum reading; gauge units count from the standard atmosphere. */
export const vacuumToKpaAbs = (value: number, unit: VacuumUnit): number => {
  switch (unit) {
    case 'inhg':
      return KPA.atmosphere - value * KPA.inHg;
    case 'psig':
      return KPA.atmosphere + value * KPA.psi;
    case 'mmhg_abs':
      return value * KPA.mmHg;
    case 'micron':
      return (value / 1000) * KPA.mmHg;
    case 'kpa_abs':
      return value;
  }
};

/** A vacuum reading in the given unit from an absolute pressure in kPa: the inverse of `vacuumToKpaAbs`. */
export const kpaAbsToVacuum = (kpaAbs: number, unit: VacuumUnit): number => {
  const zero = vacuumToKpaAbs(0, unit);
  return (kpaAbs - zero) / (vacuumToKpaAbs(1, unit) - zero);
};

/** A pressure difference (the rise during the hold) in kPa; an inch of gauge vacuum lost is a rise. */
export const riseToKpa = (value: number, unit: VacuumUnit): number =>
  Math.abs(vacuumToKpaAbs(1, unit) - vacuumToKpaAbs(0, unit)) * value;
