import { requireNotNegative, requirePositive, requireSameLength } from '../checked';

/** √(observed/expected) − 1, whose standard error 1/(2√expected) hardly depends on the true rate. */
export type SquareRootDeviations = { deviations: number[]; standardErrors: number[] };

/** Counts against expected counts on the scale of Bartlett (1936). Spiegelhalter (2005), Statistics in Medicine 24. */
export const squareRootDeviations = (
  observed: readonly number[],
  expected: readonly number[],
): SquareRootDeviations => {
  requireSameLength(observed, expected, 'Observed and expected counts');
  for (const count of observed) requireNotNegative(count, 'An observed count');
  for (const count of expected) requirePositive(count, 'An expected count');
  return {
    deviations: observed.map((count, index) => Math.sqrt(count / (expected[index] ?? 1)) - 1),
    standardErrors: expected.map((count) => 1 / (2 * Math.sqrt(count))),
  };
};
