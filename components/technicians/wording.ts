import type { HabitName } from '@/analytics/technician-comparison/habits';
import type { TechnicianRow } from '@/analytics/technicians/contract';
import { formatNumber, formatPoints } from '@/lib/format';

/** A value with its likely (95 %) range. */
export type Ranged = { value: number; low: number; high: number };

/** The effect of a technician with its range, in points of nameplate; null where nothing is said of him. */
export const effectOf = ({ effect, low, high }: Pick<TechnicianRow, 'effect' | 'low' | 'high'>): Ranged | null =>
  effect === null || low === null || high === null ? null : { value: effect, low, high };

/** `4.2 points below like jobs, likely range −6.0 to −2.1`. */
export const effectWords = ({ value, low, high }: Ranged): string => {
  const size = formatNumber(Math.abs(value), 1);
  const where = size === '0.0' ? 'as much as like jobs' : `${size} points ${value < 0 ? 'below' : 'above'} like jobs`;
  return `${where}, likely range ${formatPoints(low)} to ${formatPoints(high)}`;
};

/** The habits as a reader knows them. */
export const HABIT_LABELS: Record<HabitName, string> = {
  'hold made': 'Hold made',
  'level reached': 'Down to level',
  'weighed twice': 'Weighed before and after',
  'written the same day': 'Written the same day',
};
