import { requireNotNegative, requirePositive } from '@/analytics/statistics/checked';
import { LEAK_RATE_DAYS } from './annualizing';
import { daysBefore } from './days';

/**
 * Leak rate in percent of the full charge by the rolling average method of 40 CFR 82.152: what was added in the period ÷
 * full charge. Throws RangeError for a full charge that is not above zero and for a negative mass.
 */
export const rollingAverageRate = (addedInPeriodKg: number, fullChargeKg: number): number => {
  requireNotNegative(addedInPeriodKg, 'The added charge');
  requirePositive(fullChargeKg, 'The full charge');
  return (addedInPeriodKg / fullChargeKg) * 100;
};

/**
 * The day after which additions count on `day`: 365 days before, or the last day before `day` on which a follow-up test
 * showed all leaks repaired, whichever is later (40 CFR 82.152). A test on the day itself came after the addition that is
 * rated.
 */
export const rollingPeriodStart = (
  day: string,
  verifiedOn: readonly string[],
): { after: string; verified: string | null } => {
  const yearBefore = daysBefore(day, LEAK_RATE_DAYS);
  const verified = verifiedOn
    .filter((tested) => tested < day)
    .sort()
    .at(-1);
  return verified && verified > yearBefore ? { after: verified, verified } : { after: yearBefore, verified: null };
};
