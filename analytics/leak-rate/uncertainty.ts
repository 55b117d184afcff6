import { requireNotNegative, requirePositive } from '@/analytics/statistics/checked';

/** Repeatability of one reading as a share of the scale's step: 0.05 lb on a scale that shows tenths. Common practice. */
const REPEATABILITY_STEPS = 0.5;

/**
 * Standard uncertainty of a mass that two readings of one scale give, in the unit of `step`: u² = 2 (step ÷ √12)² +
 * 2 u_rep². JCGM 100:2008, 4.3.7 (a rectangular reading) and 5.1.2 (adding up).
 */
export const weighingUncertainty = (step: number): number => {
  requirePositive(step, 'The step of a scale');
  return Math.sqrt((2 * step ** 2) / 12 + 2 * (REPEATABILITY_STEPS * step) ** 2);
};

/**
 * Relative standard uncertainty of a full charge taken from a plate or a documented figure: within 5 % either way, every
 * value in between equally likely (5 % ÷ √3). Common practice; JCGM 100:2008, 4.3.7.
 */
export const FULL_CHARGE_RELATIVE_U = 0.05 / Math.sqrt(3);

/**
 * Standard uncertainty of a leak rate, in the unit of the rate: rate × √((u_added ÷ added)² + (u_charge ÷ charge)²), JCGM
 * 100:2008, 5.1.6. Zero for a rate of zero. Throws RangeError for negative input.
 */
export const rateUncertainty = (
  rate: number,
  added: { kg: number; uncertaintyKg: number },
  chargeRelativeU = FULL_CHARGE_RELATIVE_U,
): number => {
  requireNotNegative(rate, 'A leak rate');
  requireNotNegative(added.uncertaintyKg, 'An uncertainty');
  return added.kg > 0 ? rate * Math.hypot(added.uncertaintyKg / added.kg, chargeRelativeU) : 0;
};
