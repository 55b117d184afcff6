import { formatMonthName } from '@/lib/format';

const isJanuary = (month: string) => month.endsWith('-01');
const isQuarter = (month: string) => ['01', '04', '07', '10'].includes(month.slice(5));

/** Months that get a tick: all of them, quarters or years, by the pixels each month has. */
export const tickedMonths = (months: readonly string[], pixelsPerMonth: number, narrow: boolean): string[] => {
  if (pixelsPerMonth >= (narrow ? 16 : 25)) return [...months];
  if (pixelsPerMonth >= 10) return months.filter(isQuarter);
  return months.filter(isJanuary);
};

/** The name at a tick: `Nov`, on a phone `N`; where only years are ticked, nothing. */
export const tickName = (month: string, onlyYears: boolean, narrow: boolean): string => {
  if (onlyYears) return '';
  const name = formatMonthName(month, 'short');
  return narrow ? name.slice(0, 1) : name;
};

/** The year under a tick: at every January, and at the first tick when no January follows soon. */
export const tickYear = (month: string, ticked: readonly string[]): string => {
  const first = ticked[0];
  const firstCounts = month === first && !ticked.slice(0, 3).some(isJanuary);
  return isJanuary(month) || firstCounts ? month.slice(0, 4) : '';
};
