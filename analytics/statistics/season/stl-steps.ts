import { fitAt, type Smoother, smooth } from './loess';

/** The mean of each `length` neighbours: `length - 1` fewer values than there were. */
export const movingMeans = (values: readonly number[], length: number): number[] => {
  const means: number[] = [];
  let sum = 0;
  values.forEach((value, index) => {
    sum += value - (index >= length ? (values[index - length] ?? 0) : 0);
    if (index >= length - 1) means.push(sum / length);
  });
  return means;
};

/**
 * Each month's values (January's, February's …) smoothed by themselves and carried one period beyond both ends:
 * `values.length + 2 * period` figures. Cleveland et al. (1990), step 2 of the inner loop.
 */
export const smoothCycles = (
  values: readonly number[],
  period: number,
  smoother: Smoother,
  weights?: readonly number[],
): number[] => {
  const extended = new Array<number>(values.length + 2 * period).fill(0);
  for (let phase = 0; phase < period; phase++) {
    const inPhase = (_: number, index: number) => index % period === phase;
    const own = values.filter(inPhase);
    const ownWeights = weights?.filter(inPhase);
    const fits = smooth(own, smoother, ownWeights);
    const reach = Math.min(smoother.window, own.length);
    const before = fitAt(own, -1, { first: 0, last: reach - 1 }, smoother, ownWeights) ?? fits[0];
    const afterSpan = { first: own.length - reach, last: own.length - 1 };
    const after = fitAt(own, own.length, afterSpan, smoother, ownWeights) ?? fits.at(-1);
    [before, ...fits, after].forEach((value, cycle) => {
      extended[cycle * period + phase] = value ?? 0;
    });
  }
  return extended;
};

/** What of the extended cycles is slow, and so belongs to the trend: step 3 of the inner loop. */
export const lowPass = (extended: readonly number[], period: number, smoother: Smoother): number[] =>
  smooth(movingMeans(movingMeans(movingMeans(extended, period), period), 3), smoother);

/** Weights from 1 down to 0 for what lies six median distances or more from the fit (bisquare): the outer loop. */
export const robustnessWeights = (remainders: readonly number[]): number[] => {
  const distances = remainders.map(Math.abs);
  const sorted = [...distances].sort((a, b) => a - b);
  const middle = Math.floor(sorted.length / 2);
  const bound = 3 * ((sorted[middle] ?? 0) + (sorted[sorted.length - 1 - middle] ?? 0));
  return distances.map((distance) => {
    if (distance <= 0.001 * bound) return 1;
    return distance <= 0.999 * bound ? (1 - (distance / bound) ** 2) ** 2 : 0;
  });
};
