import { requirePositive } from '../checked';
import { betaCdf } from '../distributions/beta';

/** Pays `share` of the price from this purity up; below the first step nothing is defined, so begin with 0. */
export type PaymentStep = { fromPurity: number; share: number };

/** The share of the price that a purity (0 to 1) earns: that of the highest step that it reaches. */
export const paymentShare = (steps: readonly PaymentStep[], purity: number): number =>
  steps.reduce((held, step) => (purity >= step.fromPurity ? step.share : held), 0);

export type StepOutcome = {
  /** Chance of each step. */
  probabilities: number[];
  meanShare: number;
  shareDeviation: number;
  /** Chance of being paid nothing. */
  nothingProbability: number;
};

/**
 * What steps pay on average for a purity with a beta distribution, exactly. The share at the mean purity would be another
 * figure: steps are no straight line.
 */
export const expectedPayment = (steps: readonly PaymentStep[], a: number, b: number): StepOutcome => {
  requirePositive(steps.length, 'The number of steps');
  const probabilities = steps.map(({ fromPurity }, index) => {
    const next = steps[index + 1];
    return (next ? betaCdf(next.fromPurity, a, b) : 1) - betaCdf(fromPurity, a, b);
  });
  const power = (of: (share: number) => number) =>
    steps.reduce((total, { share }, index) => total + (probabilities[index] ?? 0) * of(share), 0);
  const meanShare = power((share) => share);
  return {
    probabilities,
    meanShare,
    shareDeviation: Math.sqrt(Math.max(0, power((share) => share * share) - meanShare * meanShare)),
    nothingProbability: power((share) => (share === 0 ? 1 : 0)),
  };
};
