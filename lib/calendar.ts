const DAY = /^[12]\d{3}-\d{2}-\d{2}$/;

/** Whether a text is a day of the calendar, `YYYY-MM-DD`; February has no 30th. */
export const isDay = (text: string): boolean => {
  const date = DAY.test(text) ? new Date(`${text}T00:00:00Z`) : null;
  return date !== null && !Number.isNaN(date.getTime()) && date.toISOString().startsWith(text);
};
