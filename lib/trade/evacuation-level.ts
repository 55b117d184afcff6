import { KPA } from '@/lib/units';
import type { ApplianceCategory } from '@/lib/vocabulary';
import type { PressureClass } from './pressure-class';

/** 200 lb exactly: from this full charge on Table 1 asks more of high and medium pressure appliances. */
const LARGE_CHARGE_KG = 90.718474;

/** Inches of mercury vacuum by pressure class: below and from 200 lb full charge. 40 CFR 82.156(a), Table 1. */
const VACUUM_INHG = {
  very_high: { small: 0, large: 0 },
  high: { small: 0, large: 10 },
  medium: { small: 10, large: 15 },
} as const satisfies Record<Exclude<PressureClass, 'low'>, unknown>;

/** Low pressure appliances: millimetres of mercury absolute, 40 CFR 82.156(a), Table 1. */
const LOW_PRESSURE_MMHG_ABS = 25;

/** Small appliances: inches of mercury vacuum, 40 CFR 82.156(b). */
const SMALL_APPLIANCE_INHG = 4;

/** A reading in inHg is good to about this much, in kPa. */
export const READING_TOLERANCE_KPA = 0.1;

/**
 * The absolute pressure in kPa to which an appliance must be evacuated before it is opened, with a recovery machine made
 * on or after 15 November 1993: 40 CFR 82.156(a), Table 1, and (b) for small appliances. `fullChargeKg` is the full
 * charge of 40 CFR 82.152; throws RangeError unless it is positive. The database judges by the same rule
 * (required_level_kpa_abs). Exceptions for leaks and non-major repairs, (a)(1) and (2), are not in it.
 */
export const requiredLevelKpaAbs = (
  pressureClass: PressureClass,
  fullChargeKg: number,
  category: ApplianceCategory | null,
): number => {
  if (!(fullChargeKg > 0)) throw new RangeError(`No full charge: ${fullChargeKg} kg`);
  if (category === 'small_appliance') return KPA.atmosphere - SMALL_APPLIANCE_INHG * KPA.inHg;
  if (pressureClass === 'low') return LOW_PRESSURE_MMHG_ABS * KPA.mmHg;
  const { small, large } = VACUUM_INHG[pressureClass];
  return KPA.atmosphere - (fullChargeKg < LARGE_CHARGE_KG ? small : large) * KPA.inHg;
};
