import { requireFinite } from '../checked';
import type { IndividualsLimits } from './individuals-limits';

type Pattern = { length: number; holds: (window: readonly number[]) => boolean };

const oneSide = (window: readonly number[]): boolean =>
  window.every((score) => score > 0) || window.every((score) => score < 0);
const steps = (window: readonly number[]): number[] =>
  window.slice(1).map((score, index) => Math.sign(score - (window[index] ?? score)));
const oneWay = (window: readonly number[]): boolean =>
  steps(window).every((step) => step > 0) || steps(window).every((step) => step < 0);
const alternating = (window: readonly number[]): boolean =>
  steps(window).every((step, index, all) => step !== 0 && (index === 0 || step === -(all[index - 1] ?? 0)));

// The last point must lie outside itself, or the pattern would be reported again one point late.
const beyondOnOneSide = (count: number, bound: number) => (window: readonly number[]) =>
  [1, -1].some(
    (side) => side * (window.at(-1) ?? 0) > bound && window.filter((score) => side * score > bound).length >= count,
  );

/**
 * Patterns of standard scores that chance seldom makes. Nelson (1984), Journal of Quality Technology 16, 237-239, his
 * tests 1 to 8 in order; `eightOneSide` is the older rule of Western Electric (1956).
 */
export const RUN_RULES = {
  beyondLimits: { length: 1, holds: ([score = 0]) => Math.abs(score) > 3 },
  nineOneSide: { length: 9, holds: oneSide },
  sixOneWay: { length: 6, holds: oneWay },
  fourteenAlternating: { length: 14, holds: alternating },
  twoOfThreeBeyondTwo: { length: 3, holds: beyondOnOneSide(2, 2) },
  fourOfFiveBeyondOne: { length: 5, holds: beyondOnOneSide(4, 1) },
  fifteenWithinOne: { length: 15, holds: (window) => window.every((score) => Math.abs(score) < 1) },
  eightOutsideOne: { length: 8, holds: (window) => window.every((score) => Math.abs(score) > 1) },
  eightOneSide: { length: 8, holds: oneSide },
} as const satisfies Record<string, Pattern>;
export type RunRule = keyof typeof RUN_RULES;

/**
 * The two rules that are on: together one false alarm in about 153 values (Champ & Woodall 1987, Technometrics 29,
 * 393-399) and a shift of one standard deviation found in about 15; all eight of Nelson's would cry wolf every 73.
 */
export const DEFAULT_RUN_RULES: readonly RunRule[] = ['beyondLimits', 'eightOneSide'];

/** Distances from the centre in standard deviations; all zero where the baseline was constant. */
export const standardScores = (
  values: readonly number[],
  { centre, sigma }: Pick<IndividualsLimits, 'centre' | 'sigma'>,
): number[] => values.map((value) => (sigma > 0 ? (value - centre) / sigma : 0));

/** Positions (from 0) of the points that complete the rule's pattern. */
export const signalsOf = (rule: RunRule, scores: readonly number[]): number[] => {
  requireFinite(scores, 'Standard scores');
  const { length, holds }: Pattern = RUN_RULES[rule];
  return scores.flatMap((_, end) => (end + 1 >= length && holds(scores.slice(end + 1 - length, end + 1)) ? [end] : []));
};
