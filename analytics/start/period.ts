/** How far back "lately" reaches: low recoveries, refused files and notes of these days are news. */
const LATELY_DAYS = 30;

/** The day `count` days before a day `YYYY-MM-DD`. */
export const daysBefore = (day: string, count: number): string => {
  const [year = 0, monthNo = 1, dayNo = 1] = day.split('-').map(Number);
  return new Date(Date.UTC(year, monthNo - 1, dayNo - count)).toISOString().slice(0, 10);
};

/** First day of "lately": with today thirty days. */
export const latelyFrom = (today: string): string => daysBefore(today, LATELY_DAYS - 1);
