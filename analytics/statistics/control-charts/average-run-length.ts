import { Matrix, solve } from 'ml-matrix';
import { requireFiniteNumber, requirePositive } from '../checked';
import { normalCdf, normalDensity } from '../distributions/normal';
import { gaussLegendre } from '../quadrature';

// Order at which the run lengths below 10,000 no longer move in their ninth figure.
const ORDER = 60;

/** L in L = 1 + K L: how many values pass, on average, before a signal from each state. */
const meanPassage = (kernel: number[][]): number[] => {
  const system = Matrix.eye(kernel.length).sub(new Matrix(kernel));
  return solve(system, Matrix.ones(kernel.length, 1)).to1DArray();
};

/**
 * Values to the first one beyond ± `width` standard deviations, on average, when the mean is off target by `shift`
 * standard deviations: 370 at 3 and no shift.
 */
export const averageRunLengthOfLimits = (width: number, shift: number): number => {
  requirePositive(width, 'The width of the limits');
  requireFiniteNumber(shift, 'The shift');
  return 1 / (normalCdf(-width - shift) + normalCdf(shift - width));
};

/**
 * Values to the first signal of an EWMA chart with steady limits, on average. Solves Crowder's integral equation on
 * Gauss-Legendre nodes; all arguments in standard deviations. Crowder (1987), Technometrics 29, 401-407.
 */
export const averageRunLengthOfEwma = (design: { weight: number; width: number }, shift: number): number => {
  const { weight, width } = design;
  requirePositive(weight, 'The weight');
  requirePositive(width, 'The width of the limits');
  requireFiniteNumber(shift, 'The shift');
  const half = width * Math.sqrt(weight / (2 - weight));
  // An odd order has a node in the middle, which is where the chart begins.
  const nodes = gaussLegendre(ORDER + 1, -half, half);
  const kernel = nodes.map((now) =>
    nodes.map((next) => (next.weight / weight) * normalDensity((next.at - (1 - weight) * now.at) / weight - shift)),
  );
  return meanPassage(kernel)[ORDER / 2] ?? Number.POSITIVE_INFINITY;
};

const oneSided = (slack: number, threshold: number, shift: number): number => {
  const nodes = gaussLegendre(ORDER, 0, threshold);
  const states = [0, ...nodes.map((node) => node.at)];
  const kernel = states.map((now) => [
    normalCdf(slack - now - shift),
    ...nodes.map((next) => next.weight * normalDensity(next.at + slack - now - shift)),
  ]);
  return meanPassage(kernel)[0] ?? Number.POSITIVE_INFINITY;
};

/**
 * Values to the first signal of a two-sided CUSUM without head start, on average; all arguments in standard deviations.
 * Page's integral equation for each side, and 1/L = 1/L⁺ + 1/L⁻. Vance (1986), Journal of Quality Technology 18, 189-193.
 */
export const averageRunLengthOfCusum = (design: { slack: number; threshold: number }, shift: number): number => {
  const { slack, threshold } = design;
  requirePositive(slack, 'The slack');
  requirePositive(threshold, 'The threshold');
  requireFiniteNumber(shift, 'The shift');
  return 1 / (1 / oneSided(slack, threshold, shift) + 1 / oneSided(slack, threshold, -shift));
};
