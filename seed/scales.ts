import type { MassUnit } from '@/lib/vocabulary';
import type { Appliance } from './appliances';
import type { Cylinder } from './cylinders';
import type { Technician } from './technicians';

/** A scale and how its reader writes: whole steps become text in the unit of the ticket. */
export type Scale = { unit: MassUnit; stepLb: number; write: (steps: number) => string };

const LB_PER_KG = 1 / 0.45359237;

const decimal = (unit: MassUnit, step: number, lbPerUnit: number, places: number): Scale => ({
  unit,
  stepLb: step * lbPerUnit,
  write: (steps) => (steps * step).toFixed(places),
});

const poundsOunces = (ounces: number): string => `${Math.floor(ounces / 16)}-${ounces % 16}`;

/** The scale a technician uses for this job: a small one at the bench, his own in the field, a floor scale for half-tons. */
export const scaleFor = (technician: Technician, unit: Appliance, cylinder: Cylinder): Scale => {
  if (technician.unit === 'kg') return decimal('kg', cylinder.waterCapacityLb > 100 ? 0.2 : 0.05, LB_PER_KG, 2);
  if (cylinder.waterCapacityLb > 100) return decimal('lb', 0.5, 1, 1);
  if (unit.equipment.category === 'small_appliance') return decimal('oz', 0.5, 1 / 16, 1);
  if (technician.unit === 'lb-oz')
    return { unit: 'lb-oz', stepLb: 1 / 32, write: (halfOunces) => poundsOunces(halfOunces / 2) };
  return decimal('lb', technician.scaleStep, 1, 1);
};

/** A charge as the plate says it, in the unit of the ticket. */
export const plateText = (ounces: number, unit: MassUnit): string => {
  switch (unit) {
    case 'oz':
      return String(ounces);
    case 'lb-oz':
      return poundsOunces(ounces);
    case 'kg':
      return (ounces / 16 / LB_PER_KG).toFixed(2);
    default:
      return String(Math.round((ounces / 16) * 100) / 100);
  }
};
