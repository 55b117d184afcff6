import { isDay } from '@/lib/calendar';

/**
 * Years between tests of a 4B, 4BA or 4BW cylinder: 49 CFR 180.209(a), (e), (f) and (j). Recovery cylinders are commonly
 * tested after five.
 */
export const REQUALIFICATION_YEARS = [5, 7, 10, 12] as const;
export type RequalificationYears = (typeof REQUALIFICATION_YEARS)[number];

/** Days before the due date from which on a cylinder should be sent for its test. *Common practice.* */
const SOON_DAYS = 60;
const DAY_MS = 86_400_000;

/** The day by which a cylinder tested on `testedOn` must be tested again; 29 February falls to the 28th. */
export const requalificationDue = (testedOn: string, years: RequalificationYears = 5): string => {
  if (!isDay(testedOn)) throw new RangeError(`No day: ${testedOn}`);
  const [year = '', month = '', day = ''] = testedOn.split('-');
  const due = `${Number(year) + years}-${month}-${day}`;
  return isDay(due) ? due : `${Number(year) + years}-02-28`;
};

export type RequalificationState = 'valid' | 'due soon' | 'overdue';

/**
 * Whether a cylinder may be filled on a day: past its date it may not be filled and then offered for transport; what was
 * filled before may still travel. 49 CFR 173.301(a)(6).
 */
export const requalificationState = (dueOn: string, today: string): RequalificationState => {
  if (!(isDay(dueOn) && isDay(today))) throw new RangeError(`No days: ${dueOn}, ${today}`);
  if (today > dueOn) return 'overdue';
  return Date.parse(dueOn) - Date.parse(today) <= SOON_DAYS * DAY_MS ? 'due soon' : 'valid';
};
