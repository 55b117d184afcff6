import { sampleStandardDeviation } from 'simple-statistics';
import { requirePositive, requireWhole } from '@/analytics/statistics/checked';
import { normalQuantile } from '@/analytics/statistics/distributions/normal';
import { type Estimate, enough, tooFew } from '@/analytics/statistics/estimate';

/** Monthly quotes before which their history says too little about how prices move. */
export const QUOTES_NEEDED = 24;

/** What a refrigerant is paid now, and how much the logarithm of its price moves in a month. */
export type PriceOutlook = { centsPerKg: number; monthlyLogSd: number };

/** From past monthly quotes in cents a kilogram, the latest last. Needs 24; throws a RangeError on one not above 0. */
export const outlookFromQuotes = (centsPerKg: readonly number[]): Estimate<PriceOutlook> => {
  for (const quote of centsPerKg) requirePositive(quote, 'A quote');
  const last = centsPerKg.at(-1);
  if (last === undefined || centsPerKg.length < QUOTES_NEEDED) {
    return tooFew(QUOTES_NEEDED, centsPerKg.length, 'monthly quotes');
  }
  const moves = centsPerKg.slice(1).map((quote, at) => Math.log(quote / (centsPerKg[at] ?? quote)));
  return enough({ centsPerKg: last, monthlyLogSd: sampleStandardDeviation(moves) });
};

/** From what a person takes for low and high in so many months: read as one chance in ten below, and one above. */
export const outlookFromRange = (centsPerKg: number, low: number, high: number, months: number): PriceOutlook => {
  requirePositive(centsPerKg, 'A quote');
  requirePositive(low, 'A low price');
  requireWhole(months, 'The months', 1);
  if (!(high >= low)) throw new RangeError(`The high price ${high} is below the low one ${low}`);
  const spread = Math.log(high / low) / (2 * normalQuantile(0.9));
  return { centsPerKg, monthlyLogSd: spread / Math.sqrt(months) };
};
