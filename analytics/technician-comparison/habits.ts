import type { CrewComparison } from './compare-crew';
import { COUNTS } from './judged-jobs';
import type { ComparedRecovery } from './recovery';

export const HABITS = ['hold made', 'level reached', 'weighed twice', 'written the same day'] as const;
export type HabitName = (typeof HABITS)[number];

export type Habit = {
  /** Jobs of which it is known, and the share with it; null where it is known of none. */
  known: number;
  share: number | null;
  /** Colleagues' share. */
  others: number | null;
  /** What the difference of shares makes of the yield, as a share of the full charge; null where jobs with and without don't differ. */
  costs: number | null;
};
export type Habits = Record<HabitName, Habit>;

/** Readings in inches of mercury are good to about this. */
const READING_KPA = 0.1;
/** Jobs with and without a habit before the two are set against each other, and how clear the difference must be. */
const LEAST_JOBS = 20;
const CLEAR_SCORE = 3;

const isKept = (job: ComparedRecovery): Record<HabitName, boolean | null> => ({
  'hold made': job.held,
  'level reached':
    job.finalVacuumKpaAbs === null || job.requiredLevelKpaAbs === null
      ? null
      : job.finalVacuumKpaAbs <= job.requiredLevelKpaAbs + READING_KPA,
  'weighed twice': job.weighedTwice,
  'written the same day': job.writtenSameDay,
});

type Tally = { known: number; kept: number; weight: [number, number]; sum: [number, number] };
const empty = (): Tally => ({ known: 0, kept: 0, weight: [0, 0], sum: [0, 0] });

/** How much better jobs with the habit go than the same people's jobs without; null where that isn't clear. */
const gainOf = (tallies: readonly Tally[], variance: number): number | null => {
  let [precision, sum] = [0, 0];
  for (const { weight, sum: sums } of tallies) {
    const [without, kept] = weight;
    if (Math.min(without, kept) < 1) continue;
    const own = 1 / (1 / without + 1 / kept);
    precision += own;
    sum += own * (sums[1] / kept - sums[0] / without);
  }
  if (precision < LEAST_JOBS / 2 || variance <= 0) return null;
  const gain = sum / precision;
  return gain * Math.sqrt(precision / variance) >= CLEAR_SCORE ? gain : null;
};

/**
 * Each technician's habits beside his colleagues', and what they go with. A habit's gain is taken within people (jobs of
 * the same technician with and without it), so that it isn't only a name for who has it.
 */
export const habits = (recoveries: readonly ComparedRecovery[], crew: CrewComparison): Habits[] => {
  const { columns, chances, reasons } = crew;
  const tallies = HABITS.map(() => columns.technicians.map(empty));
  recoveries.forEach((job, at) => {
    if (reasons[at] !== COUNTS) return;
    const kept = isKept(job);
    HABITS.forEach((habit, place) => {
      const own = tallies[place]?.[columns.technician[at] ?? 0];
      const has = kept[habit];
      if (!own || has === null) return;
      own.known += 1;
      own.kept += Number(has);
      if (!chances.comparable[at]) return;
      const weight = 1 - (chances.short[at] ?? 0);
      own.weight[has ? 1 : 0] += weight;
      own.sum[has ? 1 : 0] += weight * ((columns.yields[at] ?? 0) - (crew.expected[at] ?? 0));
    });
  });
  const habitOf = (place: number, person: number): Habit => {
    const all = tallies[place] ?? [];
    const { known, kept } = all[person] ?? empty();
    const others = all.filter((_, other) => other !== person);
    const knownOfOthers = others.reduce((sum, own) => sum + own.known, 0);
    const share = known > 0 ? kept / known : null;
    const usual = knownOfOthers > 0 ? others.reduce((sum, own) => sum + own.kept, 0) / knownOfOthers : null;
    const gain = share !== null && usual !== null && share < usual ? gainOf(all, crew.usualVariance) : null;
    return { known, share, others: usual, costs: gain === null ? null : gain * ((share ?? 0) - (usual ?? 0)) };
  };
  return columns.technicians.map((_, person) => ({
    'hold made': habitOf(0, person),
    'level reached': habitOf(1, person),
    'weighed twice': habitOf(2, person),
    'written the same day': habitOf(3, person),
  }));
};

/** The habit that costs most, if any costs as much as half a point of nameplate. */
export const habitBehind = (own: Habits): HabitName | null => {
  const costly = HABITS.filter((habit) => (own[habit].costs ?? 0) <= -0.005);
  return costly.sort((a, b) => (own[a].costs ?? 0) - (own[b].costs ?? 0))[0] ?? null;
};
