import { requireFinite } from '@/analytics/statistics/checked';

/** From this full charge on a job is large plant (100 lb): a few such jobs make most of a year's mass. */
export const LARGE_PLANT_KG = 45.359237;

export type LargeJob = {
  /** Position of its month in the history. */
  at: number;
  refrigerant: string;
  recoveredKg: number;
};

/** What a company recovered, month by month without a gap in the calendar; whole months only. */
export type MassHistory = {
  /** Month of the year of the first month, 0 for January. */
  firstMonthOfYear: number;
  /** How many months. */
  months: number;
  /** Routine jobs by refrigerant, kg a month; 0 where nothing came in. */
  routineKg: ReadonlyMap<string, readonly number[]>;
  largeJobs: readonly LargeJob[];
  /** Positions of months whose records are known to be lost: they are not 0. */
  lost: ReadonlySet<number>;
};

/** Throws a RangeError on masses below 0, lists of another length than the months, and jobs outside of them. */
export const requireHistory = ({ months, routineKg, largeJobs }: MassHistory): void => {
  for (const [refrigerant, masses] of routineKg) {
    requireFinite(masses, `Masses of ${refrigerant}`);
    if (masses.length !== months) throw new RangeError(`${refrigerant} has ${masses.length} months of ${months}`);
    if (masses.some((mass) => mass < 0)) throw new RangeError(`${refrigerant} has a mass below 0`);
  }
  for (const { at, recoveredKg } of largeJobs) {
    if (!(Number.isInteger(at) && at >= 0 && at < months)) throw new RangeError(`A large job lies outside: ${at}`);
    if (!(recoveredKg >= 0)) throw new RangeError(`A large job has no mass: ${recoveredKg}`);
  }
};

/** What was known after the first `months` months. */
export const historyUntil = (history: MassHistory, months: number): MassHistory => ({
  ...history,
  months,
  routineKg: new Map([...history.routineKg].map(([name, masses]) => [name, masses.slice(0, months)])),
  largeJobs: history.largeJobs.filter(({ at }) => at < months),
  lost: new Set([...history.lost].filter((at) => at < months)),
});

/** All refrigerants that were ever recovered, in the order of their names. */
export const refrigerantsOf = ({ routineKg, largeJobs }: MassHistory): string[] =>
  [...new Set([...routineKg.keys(), ...largeJobs.map(({ refrigerant }) => refrigerant)])].sort();

/** Routine kg a month of all refrigerants; null for a lost month. */
export const routineTotals = ({ months, routineKg, lost }: MassHistory): (number | null)[] =>
  Array.from({ length: months }, (_, at) =>
    lost.has(at) ? null : [...routineKg.values()].reduce((sum, masses) => sum + (masses[at] ?? 0), 0),
  );

/** Large jobs' kg by refrigerant and month. */
export const largeKg = ({ months, largeJobs }: MassHistory, refrigerant: string): number[] => {
  const masses = Array.from({ length: months }, () => 0);
  for (const job of largeJobs) {
    if (job.refrigerant === refrigerant) masses[job.at] = (masses[job.at] ?? 0) + job.recoveredKg;
  }
  return masses;
};

/** Month of the year, 0 to 11, of a position in the history or after it. */
export const monthOfYear = ({ firstMonthOfYear }: Pick<MassHistory, 'firstMonthOfYear'>, at: number): number =>
  (firstMonthOfYear + at) % 12;
