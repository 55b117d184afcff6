import { requireWhole } from './checked';

export type QuadratureNode = { at: number; weight: number };

/** Legendre's polynomial of the order and its derivative at x, by the three-term recurrence. */
const legendre = (order: number, x: number): [value: number, slope: number] => {
  let [before, value] = [1, x];
  for (let k = 2; k <= order; k++) [before, value] = [value, ((2 * k - 1) * x * value - (k - 1) * before) / k];
  return [value, (order * (x * value - before)) / (x * x - 1)];
};

/**
 * Gauss-Legendre nodes on an interval: Σ weight f(at) is exact for polynomials of degree 2 order − 1. Roots by Newton's
 * method. Abramowitz & Stegun 25.4.29-30.
 */
export const gaussLegendre = (order: number, from: number, to: number): QuadratureNode[] => {
  requireWhole(order, 'The order of the quadrature', 2);
  return Array.from({ length: order }, (_, index) => {
    let x = Math.cos((Math.PI * (index + 0.75)) / (order + 0.5));
    for (let step = 0; step < 8; step++) {
      const [value, slope] = legendre(order, x);
      x -= value / slope;
    }
    const [, slope] = legendre(order, x);
    return { at: (from + to + (to - from) * x) / 2, weight: (to - from) / ((1 - x * x) * slope * slope) };
  });
};
