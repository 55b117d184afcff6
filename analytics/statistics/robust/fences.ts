import { type Estimate, enough, tooFew } from '../estimate';
import { medcouple } from './medcouple';
import { fiveNumbers, quantile } from './quantile';

/** Bounds of usual values, in their unit. */
export type Fences = { lower: number; upper: number };

/** Values from which on the skew is known well enough to move a fence by it. */
export const ADJUSTED_FENCES_NEED = 30;

/**
 * Q1 − 1.5 IQR and Q3 + 1.5 IQR, quartiles of type 7. Needs two values. Tukey, Exploratory Data Analysis (1977).
 */
export const fences = (values: readonly number[]): Estimate<Fences> => {
  const low = quantile(values, 0.25);
  const high = quantile(values, 0.75);
  if (!low.enough || !high.enough || values.length < 2) return tooFew(2, values.length, 'values');
  const reach = 1.5 * (high.value - low.value);
  return enough({ lower: low.value - reach, upper: high.value + reach });
};

/**
 * Fences that lean with the skew: hinges −/+ 1.5 e^(∓4 or 3 × medcouple) times their distance. With a long low tail the
 * lower one forgives more and the upper one less. `least` is how many values it asks for; three can be computed.
 * Hubert & Vandervieren (2008), Computational Statistics & Data Analysis 52, 5186-5201.
 */
export const adjustedFences = (values: readonly number[], least = ADJUSTED_FENCES_NEED): Estimate<Fences> => {
  const numbers = fiveNumbers(values);
  const skew = medcouple(values);
  if (!numbers.enough || !skew.enough || values.length < least) return tooFew(least, values.length, 'values');
  const { lowerHinge, upperHinge } = numbers.value;
  const reach = 1.5 * (upperHinge - lowerHinge);
  const [down, up] = skew.value >= 0 ? [-4, 3] : [-3, 4];
  return enough({
    lower: lowerHinge - reach * Math.exp(down * skew.value),
    upper: upperHinge + reach * Math.exp(up * skew.value),
  });
};
