import type { LargeJob, MassHistory } from './history';

const MONTH = /^(\d{4})-(0[1-9]|1[0-2])$/;

/** Months since January of year 0; throws a RangeError on what is no month `YYYY-MM`. */
export const placeOfMonth = (month: string): number => {
  const [, year, monthNo] = MONTH.exec(month) ?? [];
  if (year === undefined || monthNo === undefined) throw new RangeError(`No month: ${month}`);
  return 12 * Number(year) + Number(monthNo) - 1;
};

/** The month `step` months after another: `monthAfter('2026-11', 2)` is `2027-01`. */
export const monthAfter = (month: string, step: number): string => {
  const place = placeOfMonth(month) + step;
  return `${String(Math.floor(place / 12)).padStart(4, '0')}-${String((place % 12) + 1).padStart(2, '0')}`;
};

/** A sum of routine jobs, or one large job. */
export type MonthMass = { month: string; refrigerant: string; recoveredKg: number };

/**
 * Rows of months as the history that is forecast from: whole months from `from` to `to`, both included. Rows outside are
 * left out; a month without a row of a refrigerant is 0, a month in `lost` is not known. Throws a RangeError on months
 * that are none or in the wrong order.
 */
export const historyOfMonths = (
  { from, to }: { from: string; to: string },
  routine: readonly MonthMass[],
  large: readonly MonthMass[],
  lost: readonly string[] = [],
): MassHistory => {
  const first = placeOfMonth(from);
  const months = placeOfMonth(to) - first + 1;
  if (months < 1) throw new RangeError(`${to} is before ${from}`);
  const within = (month: string): number | null => {
    const at = placeOfMonth(month) - first;
    return at >= 0 && at < months ? at : null;
  };
  const routineKg = new Map<string, number[]>();
  for (const { month, refrigerant, recoveredKg } of routine) {
    const at = within(month);
    if (at === null) continue;
    const masses = routineKg.get(refrigerant) ?? Array.from({ length: months }, () => 0);
    masses[at] = (masses[at] ?? 0) + recoveredKg;
    routineKg.set(refrigerant, masses);
  }
  const largeJobs = large.flatMap(({ month, refrigerant, recoveredKg }): LargeJob[] => {
    const at = within(month);
    return at === null ? [] : [{ at, refrigerant, recoveredKg }];
  });
  return {
    firstMonthOfYear: first % 12,
    months,
    routineKg,
    largeJobs,
    lost: new Set(lost.map(within).filter((at) => at !== null)),
  };
};
