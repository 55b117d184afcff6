import { requirePositive } from '@/analytics/statistics/checked';
import { groupBy } from '@/analytics/statistics/group-by';
import { type ChargeAddition, countsAsLeaked } from './addition-events';
import { CHRONIC_PERCENT } from './chronic-percent';

export type CalendarYear = { year: number; addedKg: number; percent: number; chronic: boolean };

// Sums of binary fractions: 125 % may come out a hair below.
const ROUNDING = 1e-9;

/**
 * What was added as leaked in each calendar year, against the full charge; the earliest year first. A chronic leaker is
 * reported by 1 March of the year after. Throws RangeError for a full charge that is not above zero.
 */
export const calendarYears = (additions: readonly ChargeAddition[], fullChargeKg: number): CalendarYear[] => {
  requirePositive(fullChargeKg, 'The full charge');
  const counted = additions.filter(({ reason }) => countsAsLeaked(reason));
  return [...groupBy(counted, ({ addedOn }) => addedOn.slice(0, 4))]
    .map(([year, ofYear]) => {
      const addedKg = ofYear.reduce((sum, { addedChargeKg }) => sum + addedChargeKg, 0);
      const percent = (addedKg / fullChargeKg) * 100;
      return { year: Number(year), addedKg, percent, chronic: percent >= CHRONIC_PERCENT - ROUNDING };
    })
    .sort((a, b) => a.year - b.year);
};
