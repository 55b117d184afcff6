import { LARGE_PLANT_KG, type LargeJob, type MassHistory } from '@/analytics/credit-forecast/model/history';
import { seededRandom } from '@/lib/random';

const SEASON = [0.7, 0.7, 0.85, 1, 1.15, 1.35, 1.45, 1.35, 1.1, 0.9, 0.75, 0.7];

export type Company = {
  months: number;
  /** Kg a month in the middle of the history. */
  routineKg: number;
  /** Relative spread of a month about its mean. */
  noise: number;
  growthPerMonth?: number;
  largeJobsPerMonth?: number;
  refrigerants?: number;
};

/** A company whose process is known: a season, growth, refrigerants of fixed shares, large jobs by chance. */
export const madeUpCompany = (
  seed: string,
  { months, routineKg, noise, growthPerMonth = 0, largeJobsPerMonth = 0, refrigerants = 3 }: Company,
): MassHistory => {
  const random = seededRandom(`made-up ${seed}`);
  const names = Array.from({ length: refrigerants }, (_, at) => `R-${at + 1}`);
  const weights = names.map((_, at) => 1 / (at + 1));
  const all = weights.reduce((sum, weight) => sum + weight, 0);
  const volumes = Array.from({ length: months }, (_, at) => {
    const mean = routineKg * (SEASON[at % 12] ?? 1) * Math.exp(growthPerMonth * (at - months / 2));
    return noise > 0 ? (mean * random.gamma(1 / noise ** 2)) / (1 / noise ** 2) : mean;
  });
  const largeJobs: LargeJob[] = volumes.flatMap((_, at) =>
    Array.from({ length: largeJobsPerMonth > 0 ? random.poisson(largeJobsPerMonth) : 0 }, () => ({
      at,
      refrigerant: random.pick(names),
      recoveredKg: LARGE_PLANT_KG * (1 + 4 * random.gamma(2)),
    })),
  );
  return {
    firstMonthOfYear: 0,
    months,
    routineKg: new Map(names.map((name, at) => [name, volumes.map((mass) => (mass * (weights[at] ?? 0)) / all)])),
    largeJobs,
    lost: new Set(),
  };
};

/** Means of the months after the history, as the process has them. */
export const trueRoutineKg = ({ months, routineKg, growthPerMonth = 0 }: Company, step: number): number =>
  routineKg * (SEASON[(months + step) % 12] ?? 1) * Math.exp(growthPerMonth * (months + step - months / 2));
