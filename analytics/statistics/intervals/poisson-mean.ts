import { requireProbability, requireWhole } from '../checked';
import { chiSquareQuantile } from '../distributions/gamma';
import { normalQuantile } from '../distributions/normal';
import type { Interval } from './interval';

/** Exact interval of the count to be expected where `count` were seen. Garwood (1936), Biometrika 28, 437-442. */
export const garwood = (count: number, level = 0.95): Interval => {
  requireWhole(count, 'A count');
  requireProbability(level, 'The level of the interval');
  const tail = (1 - level) / 2;
  return {
    lower: count === 0 ? 0 : chiSquareQuantile(tail, 2 * count) / 2,
    upper: chiSquareQuantile(1 - tail, 2 * count + 2) / 2,
  };
};

/** Byar's approximation of the same. Breslow & Day, Statistical Methods in Cancer Research II (1987), p. 69. */
export const byar = (count: number, level = 0.95): Interval => {
  requireWhole(count, 'A count');
  requireProbability(level, 'The level of the interval');
  const z = normalQuantile((1 + level) / 2);
  const bound = (seen: number, side: -1 | 1) => seen * (1 - 1 / (9 * seen) + (side * z) / (3 * Math.sqrt(seen))) ** 3;
  return { lower: count === 0 ? 0 : bound(count, -1), upper: bound(count + 1, 1) };
};
