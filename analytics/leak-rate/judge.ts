import { requireNotNegative } from '@/analytics/statistics/checked';

/** Where a leak rate stands against a trigger. `close`: the trigger lies within twice the rate's uncertainty. */
export type AgainstTrigger = { above: boolean; close: boolean };

// Rates are quotients of binary fractions; what differs by less is the same rate.
const ROUNDING = 1e-9;

/**
 * A rate against the percentage above which leaks must be repaired; a rate that equals it is not above. Throws RangeError
 * for negative input.
 */
export const againstTrigger = (
  { percent, uncertainty }: { percent: number; uncertainty: number },
  trigger: number,
): AgainstTrigger => {
  requireNotNegative(percent, 'A leak rate');
  requireNotNegative(uncertainty, 'An uncertainty');
  return {
    above: percent - trigger > ROUNDING,
    close: Math.abs(percent - trigger) <= 2 * uncertainty + ROUNDING,
  };
};
