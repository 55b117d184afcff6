import { sum } from 'simple-statistics';
import { requireFinite, requirePositive, requireSameLength } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';
import { type Winsorised, winsorise } from './winsorise';

/** Members below which their normal spread cannot be told. */
export const OVERDISPERSION_NEEDS = 5;

export type Overdispersion = {
  /** Standard scores against the target by chance alone. */
  scores: number[];
  /** Mean square of the scores: 1 where members differ by chance alone. Raw, and with its tails drawn in. */
  factor: number;
  factorWinsorised: number;
  bounds: Pick<Winsorised, 'lower' | 'upper'>;
  /** Variance between members beyond chance, in squared units, from either factor. */
  betweenVariance: number;
  betweenVarianceWinsorised: number;
  /** Scores that allow for the members' normal spread, by widening all alike or by adding a variance. */
  multiplicativeScores: number[];
  additiveScores: number[];
};

const betweenFrom = (factor: number, weights: readonly number[]): number => {
  const total = sum([...weights]);
  const spare = total - sum(weights.map((weight) => weight * weight)) / total;
  return Math.max(0, (weights.length * factor - (weights.length - 1)) / spare);
};

/**
 * How much members differ beyond chance, and scores that allow for it. `deviations` are from the target. `least` is how
 * many members it asks for; two can be computed. Spiegelhalter (2005), Quality and Safety in Health Care 14, 347-351.
 */
export const overdispersion = (
  deviations: readonly number[],
  standardErrors: readonly number[],
  least = OVERDISPERSION_NEEDS,
): Estimate<Overdispersion> => {
  requireFinite(deviations, 'Deviations');
  requireSameLength(deviations, standardErrors, 'Deviations and standard errors');
  for (const error of standardErrors) requirePositive(error, 'A standard error');
  const scores = deviations.map((deviation, index) => deviation / (standardErrors[index] ?? 1));
  const drawnIn = winsorise(scores);
  if (!drawnIn.enough || scores.length < Math.max(2, least))
    return tooFew(Math.max(2, least), scores.length, 'members');

  const meanSquare = (values: readonly number[]) => sum(values.map((value) => value * value)) / values.length;
  const weights = standardErrors.map((error) => 1 / (error * error));
  const factor = meanSquare(scores);
  const factorWinsorised = meanSquare(drawnIn.value.values);
  const betweenVarianceWinsorised = betweenFrom(factorWinsorised, weights);
  return enough({
    scores,
    factor,
    factorWinsorised,
    bounds: { lower: drawnIn.value.lower, upper: drawnIn.value.upper },
    betweenVariance: betweenFrom(factor, weights),
    betweenVarianceWinsorised,
    multiplicativeScores: scores.map((score) => score / Math.sqrt(Math.max(1, factorWinsorised))),
    additiveScores: deviations.map(
      (deviation, index) => deviation / Math.hypot(standardErrors[index] ?? 1, Math.sqrt(betweenVarianceWinsorised)),
    ),
  });
};
