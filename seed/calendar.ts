import { Temporal } from 'temporal-polyfill';

/** `count` months ending with `endMonth`, oldest first, as `YYYY-MM`. */
export const monthsUntil = (endMonth: string, count: number): string[] => {
  const end = Temporal.PlainYearMonth.from(endMonth);
  return Array.from({ length: count }, (_, i) => end.subtract({ months: count - 1 - i }).toString());
};

/** The last month that is over in the zone on the given instant. */
export const monthBefore = (now: Temporal.Instant, timeZone: string): string =>
  now.toZonedDateTimeISO(timeZone).toPlainDate().toPlainYearMonth().subtract({ months: 1 }).toString();

/** Days of the month on which crews work: Monday to Friday, and Saturdays in summer. */
export const workDays = (month: string): string[] => {
  const first = Temporal.PlainYearMonth.from(month);
  const lastWeekday = first.month >= 5 && first.month <= 9 ? 6 : 5;
  return Array.from({ length: first.daysInMonth }, (_, i) => first.toPlainDate({ day: i + 1 }))
    .filter((day) => day.dayOfWeek <= lastWeekday)
    .map(String);
};

/** January is 0. */
export const monthOfYear = (month: string): number => Number(month.slice(5)) - 1;

export const yearOf = (month: string): number => Number(month.slice(0, 4));
