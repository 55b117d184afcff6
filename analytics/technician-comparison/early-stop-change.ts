import type { Columns } from './columns';
import type { JobChances } from './job-chances';
import { FIRST_JOBS, SHORT_ON_ARRIVAL } from './judged-jobs';
import { levelStep } from './level-step';

/** From a day on a technician stopped more or fewer of his pulls early than before. */
export type EarlyStopChange = { technician: number; fromDay: number; before: number; after: number; p: number };

const LEAST_CHANCE = 0.001;
/** Change of the share below which it is not worth a word. */
const LEAST_CHANGE = 0.06;

/** The clearest lasting change of each technician's share of early stops: one who was coached is judged by what came after. */
export const earlyStopChanges = (columns: Columns, chances: JobChances, reasons: Uint8Array): EarlyStopChange[] => {
  const all = columns.technicians.map(() => ({
    values: [] as number[],
    weights: [] as number[],
    days: [] as number[],
  }));
  for (let at = 0; at < columns.count; at++) {
    const own = all[columns.technician[at] ?? 0];
    if (!own || !chances.comparable[at] || Number.isNaN(chances.shallower[at] ?? Number.NaN)) continue;
    if (reasons[at] === FIRST_JOBS || reasons[at] === SHORT_ON_ARRIVAL) continue;
    const present = 1 - (chances.short[at] ?? 0);
    if (present <= 0.01) continue;
    own.values.push((chances.early[at] ?? 0) / present);
    own.weights.push(present);
    own.days.push(columns.days[at] ?? 0);
  }
  return all.flatMap(({ values, weights, days }, technician) => {
    const weight = weights.reduce((sum, own) => sum + own, 0);
    const share = values.reduce((sum, own, at) => sum + own * (weights[at] ?? 0), 0) / Math.max(1, weight);
    const step = levelStep({ values, weights }, Math.sqrt(share * (1 - share)));
    if (!step || step.p * columns.technicians.length > LEAST_CHANCE) return [];
    if (Math.abs(step.difference) < LEAST_CHANGE) return [];
    const p = Math.min(1, step.p * columns.technicians.length);
    return [{ technician, fromDay: days[step.at] ?? 0, before: step.before, after: step.after, p }];
  });
};
