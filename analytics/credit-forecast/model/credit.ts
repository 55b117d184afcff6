import { requireWhole } from '@/analytics/statistics/checked';
import { type Estimate, enough, tooFew } from '@/analytics/statistics/estimate';
import { drawnMean, drawnQuantile } from '@/analytics/statistics/monte-carlo/simulate';
import { type CreditTerms, drawCredit, type Held } from './credit-draws';
import type { Paths } from './paths';

/** Lab results of all refrigerants together before which purity is not known. */
export const RESULTS_NEEDED = 10;

/** Whole cents; one year in ten lands below `p10`, and one above `p90`. */
export type CreditFigure = { meanCents: number; p10Cents: number; p50Cents: number; p90Cents: number };
export type CreditForecast = {
  /** By month of payment. */
  months: CreditFigure[];
  sum: CreditFigure;
  /** How far chance alone may have moved the mean of the sum (one standard error). */
  meanErrorCents: number;
  /** Share of the sum's variance that goes when an input is held at its mean; shares need not add up to 1. */
  varianceShares: { mass: number; price: number; purity: number };
  /** Refrigerants without a price: their mass earns nothing here. */
  unpriced: string[];
};

const figureOf = (cents: Float64Array): CreditFigure => {
  const sorted = cents.slice().sort();
  const at = (p: number) => Math.round(drawnQuantile(sorted, p).value);
  return { meanCents: Math.round(drawnMean(sorted).mean), p10Cents: at(0.1), p50Cents: at(0.5), p90Cents: at(0.9) };
};

const sumOf = (months: readonly Float64Array[]): Float64Array => {
  const sums = new Float64Array(months[0]?.length ?? 0);
  for (const month of months) {
    month.forEach((cents, draw) => {
      sums[draw] = (sums[draw] ?? 0) + cents;
    });
  }
  return sums;
};

const varianceOf = (values: Float64Array): number => {
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
  return values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / values.length;
};

const checkTerms = ({ priceCorrelation, purities, delaysMonths }: CreditTerms): void => {
  if (!(priceCorrelation >= 0 && priceCorrelation <= 1)) {
    throw new RangeError(`A correlation of prices must lie between 0 and 1, not ${priceCorrelation}`);
  }
  if (delaysMonths.length === 0) throw new RangeError('A delay of payment must be given');
  for (const delay of delaysMonths) requireWhole(delay, 'A delay in months');
  for (const purity of [...purities.values()].flat()) {
    if (!(purity >= 0 && purity <= 1)) throw new RangeError(`A purity must lie between 0 and 1, not ${purity}`);
  }
};

/**
 * The reclaim credit of the months ahead from the drawn masses of a forecast: mass × price × purity's share × delay, drawn
 * `count` times with a kept seed. Means are of draws, so that they add up to the sum's within the rounding of a cent.
 * JCGM 101:2008. Needs ten lab results; throws a RangeError on terms that are none.
 */
export const forecastCredit = (
  paths: Paths,
  terms: CreditTerms,
  { count, seed }: { count: number; seed: string },
): Estimate<CreditForecast> => {
  requireWhole(count, 'The number of draws', 100);
  checkTerms(terms);
  const results = [...terms.purities.values()].flat().length;
  if (results < RESULTS_NEEDED) return tooFew(RESULTS_NEEDED, results, 'lab results');
  const months = drawCredit(paths, terms, count, seed);
  const sum = sumOf(months);
  const whole = varianceOf(sum);
  const shareOf = (held: Held): number => {
    const rest = varianceOf(sumOf(drawCredit(paths, terms, count, seed, held)));
    return whole > 0 ? Math.max(0, 1 - rest / whole) : 0;
  };
  return enough({
    months: months.map(figureOf),
    sum: figureOf(sum),
    meanErrorCents: drawnMean(sum).standardError,
    varianceShares: { mass: shareOf('mass'), price: shareOf('price'), purity: shareOf('purity') },
    unpriced: paths.refrigerants.filter((refrigerant) => !terms.prices.has(refrigerant)),
  });
};
