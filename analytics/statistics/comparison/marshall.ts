import { sum } from 'simple-statistics';
import { requireNotNegative, requirePositive, requireSameLength } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';

export type MarshallRates = {
  mean: number;
  betweenVariance: number;
  /** Share of the way each member keeps from the mean, and the ratio it ends with. */
  members: { weight: number; ratio: number }[];
};

/**
 * Observed over expected, drawn towards the overall ratio by moments, without a likelihood. Needs two members. Marshall
 * (1991), Applied Statistics 40, 283-294.
 */
export const marshallRates = (observed: readonly number[], expected: readonly number[]): Estimate<MarshallRates> => {
  requireSameLength(observed, expected, 'Observed and expected counts');
  for (const count of observed) requireNotNegative(count, 'An observed count');
  for (const count of expected) requirePositive(count, 'An expected count');
  if (expected.length < 2) return tooFew(2, expected.length, 'members');
  const exposure = sum([...expected]);
  const mean = sum([...observed]) / exposure;
  const ratios = observed.map((count, index) => count / (expected[index] ?? 1));
  const spread = sum(ratios.map((ratio, index) => (expected[index] ?? 0) * (ratio - mean) ** 2)) / exposure;
  const betweenVariance = Math.max(0, spread - (mean * expected.length) / exposure);
  const members = ratios.map((ratio, index) => {
    const chance = mean / (expected[index] ?? 1);
    const weight = betweenVariance + chance > 0 ? betweenVariance / (betweenVariance + chance) : 0;
    return { weight, ratio: mean + weight * (ratio - mean) };
  });
  return enough({ mean, betweenVariance, members });
};
