import type { Evidence } from './evidence';
import { type PersonSums, standardErrorOf } from './person-sums';
import type { PlainEffect } from './plain-effects';

/** A technician against like jobs of colleagues, as a share of the full charge, with its standard error. */
export type FairEffect = {
  effect: number;
  standardError: number;
  /** Whether units that came short are left to luck (told by the vacuum), or all jobs are taken as they are. */
  method: 'short units excused' | 'all jobs';
};

/** Which jobs were on short units is an inference: about a tenth of an effect hangs on it (`npm run bench -- technicians`). */
const SORTING_DOUBT = 0.1;

/**
 * What a technician's work makes of a unit's charge. Where vacuums are told, jobs count by the chance that the unit did
 * not come short, and the share lost there is held against all that his jobs would have given: most of the luck is gone
 * with the leaks, and early stops are still in it. Without vacuums an early stop looks like a leak, so all jobs count.
 */
export const fairEffect = (
  sums: PersonSums,
  plain: PlainEffect,
  { byVacuum }: Pick<Evidence, 'byVacuum'>,
): FairEffect => {
  if (!byVacuum || sums.presentExpected <= 0)
    return { effect: plain.effect, standardError: plain.standardError, method: 'all jobs' };
  const there = plain.expected / sums.presentExpected;
  const effect = there * sums.present.mean;
  return {
    effect,
    standardError: Math.hypot(there * standardErrorOf(sums.present), SORTING_DOUBT * effect),
    method: 'short units excused',
  };
};
