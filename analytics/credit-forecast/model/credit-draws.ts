import { type PaymentStep, paymentShare } from '@/analytics/statistics/monte-carlo/payment-steps';
import { type Random, seededRandom } from '@/lib/random';
import { type Paths, placeOf } from './paths';
import type { PriceOutlook } from './price-outlook';

/** What turns mass into money. */
export type CreditTerms = {
  prices: ReadonlyMap<string, PriceOutlook>;
  /** Correlation of the prices' monthly moves. */
  priceCorrelation: number;
  /** Past lab results, 0 to 1, by refrigerant. */
  purities: ReadonlyMap<string, readonly number[]>;
  /** What share of the price a purity earns, the lowest step first. */
  steps: readonly PaymentStep[];
  /** Past months from a recovery's to its payment's. */
  delaysMonths: readonly number[];
};

/** An input that is held at its mean, to see what the others make of the spread. */
export type Held = 'mass' | 'price' | 'purity' | null;

/** Lab results of one refrigerant from which on they stand for themselves. */
const OWN_RESULTS = 10;

const puritiesOf = ({ purities }: CreditTerms, refrigerant: string): readonly number[] => {
  const own = purities.get(refrigerant) ?? [];
  return own.length >= OWN_RESULTS ? own : [...purities.values()].flat();
};

const mean = (values: readonly number[]): number => values.reduce((sum, value) => sum + value, 0) / values.length;

type Line = {
  row: number;
  price: PriceOutlook;
  shares: readonly number[];
  meanShare: number;
  meanKg: Float64Array;
};

const linesOf = (paths: Paths, terms: CreditTerms): Line[] =>
  paths.refrigerants.flatMap((refrigerant, row) => {
    const price = terms.prices.get(refrigerant);
    if (!price) return [];
    const shares = puritiesOf(terms, refrigerant).map((purity) => paymentShare(terms.steps, purity));
    const meanKg = Float64Array.from({ length: paths.horizon }, (_, step) => {
      const from = placeOf(paths, row, step, 0);
      return mean(Array.from(paths.kg.subarray(from, from + paths.count)));
    });
    return [{ row, price, shares, meanShare: mean(shares), meanKg }];
  });

/** Price factors of a line's months ahead that average 1: a walk of logarithms, partly shared by all lines. */
const walk = (sd: number, shared: readonly number[], correlation: number, random: Random): number[] => {
  let log = 0;
  return shared.map((common) => {
    const move = Math.sqrt(correlation) * common + Math.sqrt(1 - correlation) * random.normal(0, 1);
    log += sd * move - (sd * sd) / 2;
    return Math.exp(log);
  });
};

/**
 * Credit in whole cents by month of payment (rows) and draw, from drawn masses: mass × price × the share that the load's
 * purity earns, paid some months later. Steps are applied to each draw, since they are no straight line. What is paid
 * after the horizon is left out.
 */
export const drawCredit = (
  paths: Paths,
  terms: CreditTerms,
  count: number,
  seed: string,
  held: Held = null,
): Float64Array[] => {
  const { horizon } = paths;
  const lines = linesOf(paths, terms);
  const credit = Array.from({ length: horizon }, () => new Float64Array(count));
  // A source for each input: holding one must not move what the others draw.
  const random = seededRandom(seed);
  const [prices, purities, delays] = [random.fork('prices'), random.fork('purities'), random.fork('delays')];
  const { delaysMonths } = terms;
  for (let draw = 0; draw < count; draw++) {
    const path = draw % paths.count;
    const shared = Array.from({ length: horizon }, () => prices.normal(0, 1));
    for (const { row, price, shares, meanShare, meanKg } of lines) {
      const factors = walk(price.monthlyLogSd, shared, terms.priceCorrelation, prices);
      for (let step = 0; step < horizon; step++) {
        const drawnShare = shares[purities.integer(0, shares.length - 1)] ?? 0;
        const paid = step + (delaysMonths[delays.integer(0, delaysMonths.length - 1)] ?? 0);
        const month = credit[paid];
        if (!month) continue;
        const kg = held === 'mass' ? (meanKg[step] ?? 0) : (paths.kg[placeOf(paths, row, step, path)] ?? 0);
        const factor = held === 'price' ? 1 : (factors[paid] ?? 1);
        const share = held === 'purity' ? meanShare : drawnShare;
        month[draw] = (month[draw] ?? 0) + Math.round(kg * price.centsPerKg * factor * share);
      }
    }
  }
  return credit;
};
