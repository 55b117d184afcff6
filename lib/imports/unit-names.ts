import type { MassUnit, VacuumUnit } from '@/lib/vocabulary';

/** Units as the product writes them out. The browser reads this too. */
export const MASS_UNIT_NAMES: Record<MassUnit, string> = {
  lb: 'pounds (lb)',
  oz: 'ounces (oz)',
  'lb-oz': 'pounds and ounces (1-5.5)',
  kg: 'kilograms (kg)',
  g: 'grams (g)',
};

export const VACUUM_UNIT_NAMES: Record<VacuumUnit, string> = {
  inhg: 'inches of mercury of vacuum (inHg)',
  psig: 'pounds per square inch, gauge (psig)',
  mmhg_abs: 'millimeters of mercury, absolute',
  kpa_abs: 'kilopascals, absolute',
  micron: 'microns',
};
