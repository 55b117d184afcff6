import { requireFinite, requireFiniteNumber, requireNotNegative, requirePositive } from '../checked';

export type EwmaDesign = {
  /** Level on target and standard deviation of single values, in the unit of the values. */
  target: number;
  sigma: number;
  /** Weight of the newest value, above 0 and at most 1. */
  weight?: number;
  /** Half-width of the limits in standard deviations of the average. */
  width?: number;
};
export type EwmaPoint = { average: number; lower: number; upper: number; beyond: boolean };
export type EwmaChart = { points: EwmaPoint[]; steadyLower: number; steadyUpper: number };

/** One false alarm in 500 values, and a shift of one standard deviation found in about 10. */
export const EWMA_DEFAULTS = { weight: 0.2, width: 2.962 } as const;

/**
 * Exponentially weighted moving average z = λx + (1 − λ)z, begun on target, with limits that widen to the steady ones:
 * target ± L σ √(λ/(2 − λ) (1 − (1 − λ)^2t)). NIST/SEMATECH e-Handbook, 6.3.2.4.
 */
export const ewmaChart = (values: readonly number[], design: EwmaDesign): EwmaChart => {
  const { target, sigma, weight = EWMA_DEFAULTS.weight, width = EWMA_DEFAULTS.width } = design;
  requireFinite(values, 'The values of the chart');
  requireFiniteNumber(target, 'The target');
  requireNotNegative(sigma, 'The standard deviation');
  requirePositive(weight, 'The weight');
  requirePositive(width, 'The width of the limits');
  if (weight > 1) throw new RangeError(`The weight must be at most 1, not ${weight}`);

  const steady = width * sigma * Math.sqrt(weight / (2 - weight));
  let average = target;
  const points = values.map((value, index) => {
    average = weight * value + (1 - weight) * average;
    const half = steady * Math.sqrt(1 - (1 - weight) ** (2 * (index + 1)));
    return { average, lower: target - half, upper: target + half, beyond: Math.abs(average - target) > half };
  });
  return { points, steadyLower: target - steady, steadyUpper: target + steady };
};
