const parts = (month: string): [year: number, month: number] => [Number(month.slice(0, 4)), Number(month.slice(5, 7))];

/** Whole months from one `YYYY-MM` to another. */
export const monthsBetween = (from: string, to: string): number => {
  const [[fromYear, fromMonth], [toYear, toMonth]] = [parts(from), parts(to)];
  return (toYear - fromYear) * 12 + toMonth - fromMonth;
};

/** The month some months later. */
export const monthAfter = (month: string, months: number): string => {
  const [year, of] = parts(month);
  const at = year * 12 + of - 1 + months;
  return `${Math.floor(at / 12)}-${String((at % 12) + 1).padStart(2, '0')}`;
};

/** Every month from first to last, both included. */
export const monthsFromTo = (first: string, last: string): string[] =>
  Array.from({ length: monthsBetween(first, last) + 1 }, (_, i) => monthAfter(first, i));

/** January is 0. */
export const monthOfYear = (month: string): number => parts(month)[1] - 1;

export const daysInMonth = (month: string): number => {
  const [year, of] = parts(month);
  return new Date(Date.UTC(year, of, 0)).getUTCDate();
};
