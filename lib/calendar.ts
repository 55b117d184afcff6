const DAY = /^[12]\d{3}-\d{2}-\d{2}$/;

/** Whether a text is a day of the calendar, `YYYY-MM-DD`; February has no 30th. */
export const isDay = (text: string): boolean => {
  const date = DAY.test(text) ? new Date(`${text}T00:00:00Z`) : null;
  return date !== null && !Number.isNaN(date.getTime()) && date.toISOString().startsWith(text);
};

/** Days of the month `YYYY-MM` (or of a day's month). */
export const daysInMonth = (month: string): number => {
  const [year = 0, monthNo = 1] = month.split('-').map(Number);
  return new Date(Date.UTC(year, monthNo, 0)).getUTCDate();
};

/** Whether a day is the last of its month. */
export const endsMonth = (day: string): boolean => Number(day.slice(8)) === daysInMonth(day);
