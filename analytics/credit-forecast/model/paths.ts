import { type Random, seededRandom } from '@/lib/random';
import type { Expected } from './expected';
import type { MassHistory } from './history';
import type { LargePlant } from './large-plant';
import { growthMonths, type ShareTrend, sharesAhead } from './mix';
import { type RoutineNoise, routineNoise } from './noise';
import { drawPortions, portionsOf } from './portions';

/** Months of large jobs vary more than chance numbers alone: a gamma of this shape about their mean. */
const LARGE_SHAPE = 20;
/** Squared coefficient of variation of a large job's mass: how much less a mean mass is known than a number of jobs. */
const USUAL_JOB_VARIATION = 0.4;

/** Drawn kg: refrigerant by month by path, all in one list. */
export type Paths = { count: number; refrigerants: readonly string[]; horizon: number; kg: Float64Array };

/** Position of a drawn mass in the list. */
export const placeOf = ({ horizon, count }: Paths, refrigerant: number, step: number, path: number): number =>
  (refrigerant * horizon + step) * count + path;

/** A gamma factor that averages 1. */
const factor = (shape: number, random: Random): number => random.gamma(shape) / shape;

/** Factors of the months ahead that average 1: each month's own, and what of it stays. */
const drawVolume = (noise: RoutineNoise, horizon: number, random: Random): number[] => {
  let level = factor(1 / noise.level ** 2, random);
  return Array.from({ length: horizon }, () => {
    const month = factor(1 / noise.monthly ** 2, random);
    const drawn = level * month;
    level *= 1 + noise.persistence * (month - 1);
    return drawn;
  });
};

/** Fills in the shares of one path, month by month, with what is not known of them; a month's add up to 1. */
const drawShares = (
  trends: readonly ShareTrend[],
  growth: Float64Array,
  shares: Float64Array,
  random: Random,
): void => {
  const width = trends.length;
  trends.forEach((trend, at) => {
    const now = trend.logShare + trend.logShareError * random.normal(0, 1) - trend.logShareError ** 2 / 2;
    const rate = trend.growth + trend.growthError * random.normal(0, 1);
    for (let step = 0; step < growth.length; step++) {
      shares[step * width + at] = Math.exp(now + rate * (growth[step] ?? 0));
    }
  });
  for (let step = 0; step < growth.length; step++) {
    let all = 0;
    for (let at = 0; at < width; at++) all += shares[step * width + at] ?? 0;
    for (let at = 0; at < width; at++) shares[step * width + at] = (shares[step * width + at] ?? 0) / all;
  }
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
  const { refrigerants, horizon, routineKg, trends, plant, jobs, soFarKg } = expected;
  const random = seededRandom(seed);
  const paths: Paths = { count, refrigerants, horizon, kg: new Float64Array(refrigerants.length * horizon * count) };
  const place = new Map(refrigerants.map((name, at) => [name, at]));
  const rows = trends.map(({ refrigerant }) => place.get(refrigerant) ?? 0);
  const now = sharesAhead(trends, 0);
  const usual = routineKg.reduce((sum, mass) => sum + mass, 0) / Math.max(1, horizon);
  const portions = trends.map((trend, at) => portionsOf(trend, usual * (now[at] ?? 0)));
  const noise = routineNoise(history, expected);
  for (const [refrigerant, mass] of soFarKg) {
    const from = placeOf(paths, place.get(refrigerant) ?? 0, 0, 0);
    paths.kg.fill(mass, from, from + count);
  }
  const sums = cumulative(plant);
  const poolRows = plant.pool.map(({ job }) => place.get(job.refrigerant) ?? 0);
  const growth = Float64Array.from({ length: horizon }, (_, step) => growthMonths(step + 1));
  const shares = new Float64Array(horizon * trends.length);
  const rateShape = Math.max(1, plant.jobsSeen / (1 + USUAL_JOB_VARIATION));
  for (let path = 0; path < count; path++) {
    const volume = drawVolume(noise, horizon, random);
    drawShares(trends, growth, shares, random);
    const rate = factor(rateShape, random);
    for (let step = 0; step < horizon; step++) {
      const month = (routineKg[step] ?? 0) * (volume[step] ?? 1);
      rows.forEach((row, at) => {
        const portion = portions[at];
        if (portion) {
          const to = placeOf(paths, row, step, path);
          paths.kg[to] =
            (paths.kg[to] ?? 0) + drawPortions(month * (shares[step * trends.length + at] ?? 0), portion, random);
        }
      });
      if (sums.length === 0) continue;
      const mean = (jobs[step] ?? 0) * rate * factor(LARGE_SHAPE, random);
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
