import { type LargeJob, type MassHistory, monthOfYear } from './history';
import { borrowedSeason } from './season';

/** Jobs that masses are drawn from, and after how many months a job counts half. */
const MOST_JOBS = 120;
const HALF_LIFE = 120;

export type LargePlant = {
  /** Jobs a month on average over the year. */
  jobsPerMonth: number;
  /** How many jobs that average rests on; a recent one counts whole. */
  jobsSeen: number;
  /** Twelve factors, January first. */
  season: number[];
  /** The last jobs and the chance that one comes again; chances add up to 1. */
  pool: { job: LargeJob; chance: number }[];
};

const MOST_GROWTH = 1.5;

/**
 * Large jobs come by chance, more of them in some months: how many a month, and what they bring, from the last ones. Recent
 * ones count more.
 */
export const largePlant = (history: MassHistory, routineSeason: readonly number[]): LargePlant => {
  const { months, largeJobs, lost } = history;
  const counts = Array.from({ length: months }, (_, at): number | null => (lost.has(at) ? null : 0));
  for (const { at } of largeJobs) counts[at] = (counts[at] ?? 0) + 1;
  const weightAt = (at: number) => 0.5 ** ((months - 1 - at) / HALF_LIFE);
  let [jobs, weights] = [0, 0];
  counts.forEach((count, at) => {
    if (count === null) return;
    jobs += weightAt(at) * count;
    weights += weightAt(at);
  });
  const last = [...largeJobs].sort((a, b) => a.at - b.at).slice(-MOST_JOBS);
  const all = last.reduce((sum, { at }) => sum + weightAt(at), 0);
  return {
    jobsPerMonth: weights > 0 ? jobs / weights : 0,
    jobsSeen: jobs,
    season: borrowedSeason(counts, routineSeason, history.firstMonthOfYear),
    pool: last.map((job) => ({ job, chance: weightAt(job.at) / all })),
  };
};

/**
 * How the company's routine volume stands against what it was while the large jobs came: they are too few to show growth
 * themselves. At most by half either way.
 */
const growthOf = (routineMasses: readonly number[], levelAhead: number): number => {
  const { length } = routineMasses;
  let [sum, weights] = [0, 0];
  routineMasses.forEach((mass, at) => {
    const weight = 0.5 ** ((length - 1 - at) / HALF_LIFE);
    sum += weight * mass;
    weights += weight;
  });
  const growth = sum > 0 ? (levelAhead * weights) / sum : 1;
  return Math.min(MOST_GROWTH, Math.max(1 / MOST_GROWTH, growth));
};

/** Jobs to expect in each month ahead, growing as routine volume does: `levelsAhead` are its kg without season. */
export const jobsAhead = (
  history: MassHistory,
  plant: LargePlant,
  routineMasses: readonly number[],
  levelsAhead: readonly number[],
): number[] =>
  levelsAhead.map(
    (level, step) =>
      plant.jobsPerMonth *
      (plant.season[monthOfYear(history, history.months + step)] ?? 1) *
      growthOf(routineMasses, level),
  );

/** Mean kg of one large job by refrigerant. */
export const kgPerJob = ({ pool }: LargePlant): Map<string, number> => {
  const means = new Map<string, number>();
  for (const { job, chance } of pool) {
    means.set(job.refrigerant, (means.get(job.refrigerant) ?? 0) + chance * job.recoveredKg);
  }
  return means;
};
