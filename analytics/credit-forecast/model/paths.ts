import { type Random, seededRandom } from '@/lib/random';
import type { Expected } from './expected';
import type { MassHistory } from './history';
import type { LargePlant } from './large-plant';
import { sharesAhead } from './mix';
import { type RoutineNoise, routineNoise } from './noise';
import { drawPortions, portionsOf } from './portions';

/** Months of large jobs vary more than chance numbers alone: a gamma of this shape about their mean. */
const LARGE_SHAPE = 20;

/** Drawn kg: refrigerant by month by path, all in one list. */
export type Paths = { count: number; refrigerants: string[]; horizon: number; kg: Float64Array };

/** Position of a drawn mass in the list. */
export const placeOf = ({ horizon, count }: Paths, refrigerant: number, step: number, path: number): number =>
  (refrigerant * horizon + step) * count + path;

/** Factors of the months ahead that average 1: each month's own, and what of it stays. */
const drawVolume = (noise: RoutineNoise, horizon: number, random: Random): number[] => {
  const factor = (spread: number) => {
    const shape = 1 / spread ** 2;
    return random.gamma(shape) / shape;
  };
  let level = factor(noise.level);
  return Array.from({ length: horizon }, () => {
    const month = factor(noise.monthly);
    const drawn = level * month;
    level *= 1 + noise.persistence * (month - 1);
    return drawn;
  });
};

/** Shares of each month ahead with what is not known of them; they add up to 1. */
const drawShares = ({ trends, horizon }: Expected, random: Random): number[][] => {
  const drawn = trends.map((trend) => ({
    ...trend,
    logShare: trend.logShare + trend.logShareError * random.normal(0, 1) - trend.logShareError ** 2 / 2,
    growth: trend.growth + trend.growthError * random.normal(0, 1),
  }));
  return Array.from({ length: horizon }, (_, step) => sharesAhead(drawn, step + 1));
};

const cumulative = ({ pool }: LargePlant): Float64Array => {
  let sum = 0;
  return Float64Array.from(pool, ({ chance }) => {
    sum += chance;
    return sum;
  });
};

/** The first place whose running sum passes `at`. */
const drawn = (sums: Float64Array, at: number): number => {
  let [low, high] = [0, sums.length - 1];
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((sums[middle] ?? 1) > at) high = middle;
    else low = middle + 1;
  }
  return low;
};

/**
 * Plays the months ahead `count` times: volume, shares, portions of routine jobs, large jobs one by one. All refrigerants
 * of a path belong together, so that sums of a path are drawn sums. The same seed gives the same paths.
 */
export const drawPaths = (history: MassHistory, expected: Expected, count: number, seed: string): Paths => {
  const { refrigerants, horizon, routineKg, trends, plant, jobs } = expected;
  const random = seededRandom(seed);
  const paths: Paths = { count, refrigerants, horizon, kg: new Float64Array(refrigerants.length * horizon * count) };
  const place = new Map(refrigerants.map((name, at) => [name, at]));
  const rows = trends.map(({ refrigerant }) => place.get(refrigerant) ?? 0);
  const now = sharesAhead(trends, 0);
  const usual = routineKg.reduce((sum, mass) => sum + mass, 0) / Math.max(1, horizon);
  const portions = trends.map((trend, at) => portionsOf(trend, usual * (now[at] ?? 0)));
  const noise = routineNoise(history, expected);
  const sums = cumulative(plant);
  const poolRows = plant.pool.map(({ job }) => place.get(job.refrigerant) ?? 0);
  for (let path = 0; path < count; path++) {
    const volume = drawVolume(noise, horizon, random);
    const shares = drawShares(expected, random);
    for (let step = 0; step < horizon; step++) {
      const month = (routineKg[step] ?? 0) * (volume[step] ?? 1);
      rows.forEach((row, at) => {
        const portion = portions[at];
        if (portion) {
          paths.kg[placeOf(paths, row, step, path)] = drawPortions(month * (shares[step]?.[at] ?? 0), portion, random);
        }
      });
      if (sums.length === 0) continue;
      const mean = ((jobs[step] ?? 0) * random.gamma(LARGE_SHAPE)) / LARGE_SHAPE;
      for (let job = random.poisson(mean); job > 0; job--) {
        const at = drawn(sums, random.between(0, 1));
        const row = placeOf(paths, poolRows[at] ?? 0, step, path);
        paths.kg[row] = (paths.kg[row] ?? 0) + (plant.pool[at]?.job.recoveredKg ?? 0);
      }
    }
  }
  return paths;
};

/** The drawn masses of one refrigerant in one month, the smallest first. */
export const drawnFor = (paths: Paths, refrigerant: number, step: number): Float64Array => {
  const from = placeOf(paths, refrigerant, step, 0);
  return paths.kg.slice(from, from + paths.count).sort();
};

/** The drawn masses of all refrigerants together in one month, the smallest first. */
export const drawnTotal = (paths: Paths, step: number): Float64Array => {
  const totals = new Float64Array(paths.count);
  paths.refrigerants.forEach((_, refrigerant) => {
    const from = placeOf(paths, refrigerant, step, 0);
    for (let path = 0; path < paths.count; path++) totals[path] = (totals[path] ?? 0) + (paths.kg[from + path] ?? 0);
  });
  return totals.sort();
};
