import { mean } from 'simple-statistics';
import { requireFinite, requireWhole } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';

export type ClassicalDecomposition = {
  /** One figure a position of the period: amounts that add to 0, or factors that average 1. */
  figures: number[];
  /** Centred moving mean; null where half a period is missing at the ends. */
  trend: (number | null)[];
};

/** The mean over one period around each position; an even period counts its two ends half. */
const centredMean = (values: readonly number[], period: number, position: number): number | null => {
  const half = Math.floor(period / 2);
  if (position < half || position + half >= values.length) return null;
  const around = values.slice(position - half, position + half + 1);
  const ends = period % 2 === 0 ? ((around[0] ?? 0) + (around.at(-1) ?? 0)) / 2 : 0;
  return (around.reduce((sum, value) => sum + value, 0) - ends) / period;
};

/**
 * Decomposition by moving means, for explaining and as a check; the product shows STL. Needs two full periods;
 * multiplicative throws a RangeError where a value is not above zero. Kendall & Stuart, The Advanced Theory of
 * Statistics, vol. 3, as R's `decompose`.
 */
export const classicalDecomposition = (
  values: readonly number[],
  period: number,
  form: 'additive' | 'multiplicative',
): Estimate<ClassicalDecomposition> => {
  requireFinite(values, 'The values of the series');
  requireWhole(period, 'The period', 2);
  const product = form === 'multiplicative';
  if (product && values.some((value) => value <= 0)) throw new RangeError('Factors of a season need values above 0');
  if (values.length < 2 * period) return tooFew(2 * period, values.length, 'values');

  const trend = values.map((_, position) => centredMean(values, period, position));
  const raw = Array.from({ length: period }, (_, phase) =>
    mean(
      values.flatMap((value, index) => {
        const level = trend[index];
        if (index % period !== phase || level === null || level === undefined) return [];
        return [product ? value / level : value - level];
      }),
    ),
  );
  const level = mean(raw);
  return enough({ figures: raw.map((figure) => (product ? figure / level : figure - level)), trend });
};
