import { sum } from 'simple-statistics';
import { requireFinite, requireNotNegative, requireSameLength } from '@/analytics/statistics/checked';
import { twoSidedP } from '@/analytics/statistics/distributions/normal';

/** Masses in one unit; `…Error` is a standard error in it, `…Slope` a relative one of a scale. */
export type MassFlow = {
  recovered: readonly number[];
  recoveredErrors: readonly number[];
  ownSlope: number;
  shipped: number;
  shippedError: number;
  theirSlope: number;
  /** What stood in cylinders before and after. */
  opening: number;
  closing: number;
  stockError: number;
};

/** From how many standard errors on a balance is looked at, and investigated. */
export const BALANCE_LIMITS = { look: 2, investigate: 3 } as const;
export type BalanceVerdict = 'within weighing error' | 'look' | 'investigate';

export type Balance = {
  /** Opening + recovered − shipped − closing: above 0 where mass is missing. */
  difference: number;
  random: number;
  systematic: number;
  standardError: number;
  z: number;
  p: number;
  verdict: BalanceVerdict;
  /** Null where nothing was recovered. */
  percentOfRecovered: number | null;
};

const verdictOf = (z: number): BalanceVerdict => {
  const size = Math.abs(z);
  if (size > BALANCE_LIMITS.investigate) return 'investigate';
  return size > BALANCE_LIMITS.look ? 'look' : 'within weighing error';
};

/**
 * Whether the mass closes within what the scales can tell. Errors of single weighings add in quadrature; a scale's slope
 * acts on the whole sum, so that many small weighings do not make it smaller. JCGM 100:2008 (GUM), 5.2. Throws a
 * RangeError where no error is given at all: then nothing can be judged.
 */
export const massBalance = (flow: MassFlow): Balance => {
  const { recovered, recoveredErrors, ownSlope, shipped, shippedError, theirSlope, opening, closing, stockError } =
    flow;
  requireFinite([...recovered, shipped, opening, closing], 'Masses');
  for (const error of [...recoveredErrors, ownSlope, shippedError, theirSlope, stockError]) {
    requireNotNegative(error, 'A standard error');
  }
  requireSameLength(recovered, recoveredErrors, 'Recovered masses and their errors');
  const total = sum([...recovered]);
  const difference = opening + total - shipped - closing;
  const random = Math.hypot(...recoveredErrors, shippedError, stockError, stockError);
  const systematic = Math.hypot(ownSlope * total, theirSlope * shipped);
  const standardError = Math.hypot(random, systematic);
  if (standardError === 0) throw new RangeError('A balance needs to know how well was weighed');
  const z = difference / standardError;
  return {
    difference,
    random,
    systematic,
    standardError,
    z,
    p: twoSidedP(z),
    verdict: verdictOf(z),
    percentOfRecovered: total > 0 ? (100 * difference) / total : null,
  };
};
