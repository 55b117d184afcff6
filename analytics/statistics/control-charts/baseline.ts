import { type Estimate, enough, tooFew } from '../estimate';
import { type IndividualsLimits, individualsLimits, medianIndividualsLimits } from './individuals-limits';

/** Values a baseline needs, from which on it is firm, and after which it is frozen. */
export const BASELINE = { least: 12, firm: 20, most: 24 } as const;

export type Baseline = {
  limits: IndividualsLimits;
  /** How many values the limits come from. */
  length: number;
  /** Fewer than `BASELINE.firm` values: the limits will still move. */
  provisional: boolean;
};

const isGross = (value: number, limits: IndividualsLimits): boolean => value < limits.lower || value > limits.upper;

/**
 * Limits frozen on the first 24 values; provisional from 12 to 19. A gross value among them (beyond the median form's
 * limits) would widen the mean form's limits and hide itself, so the median form is used then. Later values never
 * move a full baseline: a new one begins where the reader names a change, by passing the values from there on.
 */
export const baselineLimits = (values: readonly number[]): Estimate<Baseline> => {
  const inside = values.slice(0, BASELINE.most);
  const plain = individualsLimits(inside);
  const sturdy = medianIndividualsLimits(inside);
  if (!plain.enough || !sturdy.enough || inside.length < BASELINE.least) {
    return tooFew(BASELINE.least, inside.length, 'values');
  }
  const constant = sturdy.value.sigma === 0;
  const gross = !constant && inside.some((value) => isGross(value, sturdy.value));
  return enough({
    limits: gross ? sturdy.value : plain.value,
    length: inside.length,
    provisional: inside.length < BASELINE.firm,
  });
};
