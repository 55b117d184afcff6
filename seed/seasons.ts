import { monthOfYear, yearOf } from './calendar';
import type { EquipmentKind } from './equipment';

const PEAK = 6.4;
const wave = (month: number, amplitude: number) => Math.exp(amplitude * Math.cos((2 * Math.PI * (month - PEAK)) / 12));

/** How busy the month is for the equipment against a middling month. */
const season = (kind: EquipmentKind['season'], month: number): number => {
  switch (kind) {
    // Heat pumps break down in the cold: a low second hump in January.
    case 'cooling':
      return wave(month, 0.62) + (month === 0 || month === 1 || month === 11 ? 0.22 : 0);
    case 'refrigeration':
      return wave(month, 0.07);
    // Large plant is opened when it can stand still.
    case 'plant':
      return [1.3, 1.35, 1.4, 1.2, 0.8, 0.5, 0.45, 0.5, 0.8, 1.2, 1.3, 1.2][month] ?? 1;
    case 'even':
      return 1;
  }
};

/** Work grows by this a year. */
const GROWTH = 0.015;
/** In the spring of 2020 only what had broken down was looked after. */
const STILL_MONTHS = ['2020-04', '2020-05'];

/** Expected jobs on this equipment in the month, for the whole company. */
export const expectedJobs = (kind: EquipmentKind, month: string, firstMonth: string): number => {
  const years = yearOf(month) - yearOf(firstMonth);
  const still = STILL_MONTHS.includes(month) ? 0.62 : 1;
  return kind.monthlyJobs * season(kind.season, monthOfYear(month)) * (1 + GROWTH) ** years * still;
};
