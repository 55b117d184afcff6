import { requireNotNegative, requirePositive, requireWhole } from '@/analytics/statistics/checked';

/** Days of the period that both methods of 40 CFR 82.152 look at. */
export const LEAK_RATE_DAYS = 365;

/**
 * Leak rate in percent of the full charge a year by the annualizing method of 40 CFR 82.152: added ÷ full charge ×
 * 365 ÷ the shorter of 365 days and the days since refrigerant was last added. `days` null means that no earlier addition
 * is known: the whole 365 days are taken, which gives the least rate that is possible. Throws RangeError for a full charge
 * that is not above zero, for a negative mass and for less than one day.
 */
export const annualizedRate = (addedKg: number, fullChargeKg: number, days: number | null): number => {
  requireNotNegative(addedKg, 'The added charge');
  requirePositive(fullChargeKg, 'The full charge');
  if (days !== null) requireWhole(days, 'The days since the last addition', 1);
  const period = Math.min(LEAK_RATE_DAYS, days ?? LEAK_RATE_DAYS);
  return ((addedKg * LEAK_RATE_DAYS) / (fullChargeKg * period)) * 100;
};
