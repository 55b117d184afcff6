import { FIRST_JOBS_LEFT_OUT } from '../statistics/comparison/who-is-judged';
import { type Columns, KNOWN_SHORT } from './columns';

/** Days after the company's first record from which on a first record means a newcomer, not a book begun late. */
const NEWCOMER_AFTER_DAYS = 90;

/** Days from which to which a technician's jobs are set aside: the reading of his scale is in doubt. `to` is outside. */
export type SetAside = { fromDay: number; toDay: number };

/** Why a job does not count for the judgement of who did it; 0 where it counts. */
export const COUNTS = 0;
export const FIRST_JOBS = 1;
export const SCALE_IN_DOUBT = 2;
export const SHORT_ON_ARRIVAL = 3;
/** He has worked otherwise since, and is judged by that. */
export const BEFORE_CHANGE = 4;

/**
 * By job, whether it counts for the judgement of its technician, or why not. Recoveries are in the order of time.
 * `earlierJobs` are those that a technician did before the first of these.
 */
export const judgedJobs = (
  columns: Columns,
  earlierJobs: ReadonlyMap<string, number>,
  setAside: ReadonlyMap<number, SetAside> = new Map(),
  judgedFrom: ReadonlyMap<number, number> = new Map(),
): Uint8Array => {
  const { count, technician, days, decided, technicians } = columns;
  const reasons = new Uint8Array(count);
  const begins = days[0] ?? 0;
  const before = technicians.map((name) => earlierJobs.get(name) ?? 0);
  const anyEarlier = before.some((jobs) => jobs > 0);
  const newcomer: (boolean | undefined)[] = [];
  for (let at = 0; at < count; at++) {
    const person = technician[at] ?? 0;
    const day = days[at] ?? 0;
    newcomer[person] ??= anyEarlier || day - begins > NEWCOMER_AFTER_DAYS;
    const done = before[person] ?? 0;
    before[person] = done + 1;
    const aside = setAside.get(person);
    if (decided[at] === KNOWN_SHORT) reasons[at] = SHORT_ON_ARRIVAL;
    else if (aside && day >= aside.fromDay && day < aside.toDay) reasons[at] = SCALE_IN_DOUBT;
    else if (day < (judgedFrom.get(person) ?? Number.NEGATIVE_INFINITY)) reasons[at] = BEFORE_CHANGE;
    else if (newcomer[person] && done < FIRST_JOBS_LEFT_OUT) reasons[at] = FIRST_JOBS;
  }
  return reasons;
};
