import { normalDensity } from '../statistics/distributions/normal';

/** A weighted sequence in the order of time: values about a level, and how much each one tells (0 to 1). */
export type Sequence = { values: readonly number[]; weights: readonly number[] };
export type LevelStep = {
  /** Position of the first value after the step. */
  at: number;
  before: number;
  after: number;
  /** After less before, and its standard error. */
  difference: number;
  standardError: number;
  /** Chance of a step that stands out as much in a level that never changed, all places for it allowed for. */
  p: number;
};

/** Weight that must lie on either side of a step. */
const LEAST_WEIGHT = 8;

/** James, James & Siegmund (1987), Biometrika 74, 71-83: the largest of scores over shares t₀ to t₁ of the sequence. */
const chanceOfLargest = (score: number, from: number, to: number): number => {
  if (score < 2) return 1;
  const span = Math.log((to * (1 - from)) / (from * (1 - to)));
  return Math.min(1, normalDensity(score) * ((score - 1 / score) * span + 4 / score));
};

/** The place at which the level steps most clearly, with a usual deviation of one value. Null where the weight is too little. */
export const levelStep = ({ values, weights }: Sequence, deviation: number): LevelStep | null => {
  let [weight, sum] = [0, 0];
  values.forEach((value, at) => {
    weight += weights[at] ?? 0;
    sum += (weights[at] ?? 0) * value;
  });
  if (weight < 2 * LEAST_WEIGHT || deviation <= 0) return null;
  let best: (Omit<LevelStep, 'p'> & { score: number }) | null = null;
  let [weightBefore, sumBefore] = [0, 0];
  for (let at = 1; at < values.length; at++) {
    weightBefore += weights[at - 1] ?? 0;
    sumBefore += (weights[at - 1] ?? 0) * (values[at - 1] ?? 0);
    const weightAfter = weight - weightBefore;
    if (weightBefore < LEAST_WEIGHT || weightAfter < LEAST_WEIGHT) continue;
    const before = sumBefore / weightBefore;
    const after = (sum - sumBefore) / weightAfter;
    const standardError = deviation * Math.sqrt(1 / weightBefore + 1 / weightAfter);
    const score = Math.abs(after - before) / standardError;
    if (best === null || score > best.score)
      best = { at, before, after, difference: after - before, standardError, score };
  }
  if (best === null) return null;
  const { score, ...step } = best;
  return { ...step, p: chanceOfLargest(score, LEAST_WEIGHT / weight, 1 - LEAST_WEIGHT / weight) };
};

/** Weighted mean of the positions from `from` up to but not including `to`, with the weight it rests on. */
export const levelOf = ({ values, weights }: Sequence, from: number, to: number): { mean: number; weight: number } => {
  let [weight, sum] = [0, 0];
  for (let at = from; at < to; at++) {
    weight += weights[at] ?? 0;
    sum += (weights[at] ?? 0) * (values[at] ?? 0);
  }
  return { mean: weight > 0 ? sum / weight : 0, weight };
};
