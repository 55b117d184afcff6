import { kpaAbsToVacuum, massToMicrograms, riseToKpa, vacuumToKpaAbs } from '@/lib/units';
import type { MassUnit, VacuumUnit } from '@/lib/vocabulary';

/** The database's masses and pressures back in the unit they were typed in, as the shortest text that means them. */

const MOST_DECIMALS = 9;

/** Whole units and the rest of `numerator / denominator`, rounded to `decimals`, without trailing zeros to care for. */
const quotientText = (numerator: bigint, denominator: bigint, decimals: number): string => {
  const scale = 10n ** BigInt(decimals);
  const scaled = (numerator * scale * 2n + denominator) / (denominator * 2n);
  const digits = scaled.toString().padStart(decimals + 1, '0');
  return decimals === 0 ? digits : `${digits.slice(0, -decimals)}.${digits.slice(-decimals)}`;
};

const shortest = (write: (decimals: number) => string, means: (text: string) => boolean): string => {
  for (let decimals = 0; decimals < MOST_DECIMALS; decimals++) {
    const text = write(decimals);
    if (means(text)) return text;
  }
  return write(MOST_DECIMALS);
};

const microgramsPer = (unit: Exclude<MassUnit, 'lb-oz'>): [micrograms: bigint, units: bigint] =>
  unit === 'oz' ? [massToMicrograms('1', 'lb') ?? 1n, 16n] : [massToMicrograms('1', unit) ?? 1n, 1n];

const decimalMass = (micrograms: bigint, unit: Exclude<MassUnit, 'lb-oz'>): string => {
  const [perUnit, units] = microgramsPer(unit);
  return shortest(
    (decimals) => quotientText(micrograms * units, perUnit, decimals),
    (text) => massToMicrograms(text, unit) === micrograms,
  );
};

/**
 * A mass of the database (decimal kilograms, not negative) in `unit`: `12.5`, or `1-5.5` for pounds and ounces. Typing
 * the text again gives the same microgram. '' for null.
 */
export const massText = (kg: string | null, unit: MassUnit): string => {
  const micrograms = kg === null ? null : massToMicrograms(kg, 'kg');
  if (micrograms === null) return '';
  if (unit !== 'lb-oz') return decimalMass(micrograms, unit);
  const [perPound] = microgramsPer('lb');
  const ounces = decimalMass(micrograms % perPound, 'oz');
  return Number(ounces) === 0 ? String(micrograms / perPound) : `${micrograms / perPound}-${ounces}`;
};

/** Decimals of pressures in the database, in kPa. */
const KPA_DECIMALS = 6;

const pressureText = (kpa: number, reading: number, toKpa: (value: number) => number): string =>
  shortest(
    (decimals) => String(Number(reading.toFixed(decimals))),
    (text) => toKpa(Number(text)).toFixed(KPA_DECIMALS) === kpa.toFixed(KPA_DECIMALS),
  );

/** An absolute pressure of the database as a reading in `unit`; '' for null. */
export const vacuumText = (kpaAbs: number | null, unit: VacuumUnit | null): string =>
  kpaAbs === null || unit === null
    ? ''
    : pressureText(kpaAbs, kpaAbsToVacuum(kpaAbs, unit), (value) => vacuumToKpaAbs(value, unit));

/** A pressure difference of the database in `unit`; '' for null. */
export const riseText = (kpa: number | null, unit: VacuumUnit | null): string =>
  kpa === null || unit === null ? '' : pressureText(kpa, kpa / riseToKpa(1, unit), (value) => riseToKpa(value, unit));
