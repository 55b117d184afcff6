import { requireFinite, requireNotNegative, requirePositive } from '@/analytics/statistics/checked';
import { CUSUM_DEFAULTS, type CusumPoint, cusumChart } from '@/analytics/statistics/control-charts/cusum';

/** A mass and what it is good for: ± the expanded error (twice the standard error) holds about 95 %. */
export type Stated = { mass: number; expanded: number };

/**
 * Own mass against the settled one in units of what both are good for: (a − b)/√(U_a² + U_b²). Beyond 1 they disagree.
 * ISO 13528:2022, 9.7. Throws a RangeError where neither has an error.
 */
export const normalisedError = (own: Stated, settled: Stated): { difference: number; en: number; agree: boolean } => {
  requireFinite([own.mass, settled.mass], 'Masses');
  requireNotNegative(own.expanded, 'Our expanded error');
  requireNotNegative(settled.expanded, 'Their expanded error');
  const reach = Math.hypot(own.expanded, settled.expanded);
  requirePositive(reach, 'The expanded error of both');
  const difference = own.mass - settled.mass;
  const en = difference / reach;
  return { difference, en, agree: Math.abs(en) <= 1 };
};

/**
 * Small differences that keep to one side, shipment by shipment: a CUSUM of differences over their standard errors. The
 * sums signal after about 10 shipments of one standard error, and by chance once in about 465.
 */
export const differencesOverTime = (
  shipments: readonly { difference: number; standardError: number }[],
): CusumPoint[] => {
  for (const { standardError } of shipments) requirePositive(standardError, 'The standard error of a difference');
  return cusumChart(
    shipments.map(({ difference, standardError }) => difference / standardError),
    { target: 0, ...CUSUM_DEFAULTS },
  );
};
