import { KG_PER_UNIT } from '@/lib/units';
import type { MassUnit } from '@/lib/vocabulary';

const OUNCE_KG = KG_PER_UNIT.lb / 16;

/** Kilograms in one unit of a ticket; pounds and ounces are read in ounces. */
export const KG_PER_TICKET_UNIT: Record<MassUnit, number> = {
  lb: KG_PER_UNIT.lb,
  kg: 1,
  g: 0.001,
  oz: OUNCE_KG,
  'lb-oz': OUNCE_KG,
};

/** Steps that scales have, in the unit of the ticket, coarsest first. */
export const SCALE_STEPS: Record<MassUnit, readonly number[]> = {
  lb: [1, 0.5, 0.25, 0.2, 0.1, 0.05, 0.02, 0.01],
  kg: [1, 0.5, 0.2, 0.1, 0.05, 0.02, 0.01, 0.005, 0.002, 0.001],
  g: [100, 50, 20, 10, 5, 2, 1],
  oz: [16, 8, 4, 2, 1, 0.5, 0.2, 0.1, 0.05, 0.01],
  'lb-oz': [16, 8, 4, 2, 1, 0.5, 0.2, 0.1, 0.05, 0.01],
};

/** Stored masses are exact to the microgram; converting one may be off by a hair of that. */
const HAIR = 2e-6;

/** Whether a reading in ticket units is a whole number of steps, to within `slack`. */
export const isOnStep = (reading: number, step: number, slack = HAIR): boolean =>
  Math.abs(reading - Math.round(reading / step) * step) <= slack;
