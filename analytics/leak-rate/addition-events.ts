import { requirePositive } from '@/analytics/statistics/checked';
import { groupBy } from '@/analytics/statistics/group-by';
import type { AdditionReason } from '@/lib/vocabulary';

/** Refrigerant that was put into one appliance on one day, as it was written down. */
export type ChargeAddition = {
  id: string;
  /** Local date, `YYYY-MM-DD`. */
  addedOn: string;
  addedChargeKg: number;
  /** Standard uncertainty of the added mass, kg. */
  uncertaintyKg: number;
  reason: AdditionReason;
  /** The day on which a follow-up test showed all leaks repaired, where known. */
  leaksVerifiedOn: string | null;
};

/** All additions of one day: one event, so that no rate is ever divided by zero days. */
export type AdditionEvent = {
  addedOn: string;
  additionIds: string[];
  /** Everything that went in, kg. */
  addedKg: number;
  /** What counts as leaked, kg. */
  countedKg: number;
  /** Standard uncertainty of `countedKg`, kg. */
  uncertaintyKg: number;
  reasons: AdditionReason[];
};

/**
 * What counts as leaked: a top-up, and an addition of which nobody said why. The first charge at installation, a retrofit
 * and the return of what a season took out do not (40 CFR 82.157(b), 82.152 "seasonal variance").
 */
export const countsAsLeaked = (reason: AdditionReason): boolean => reason === 'leak_top_up' || reason === 'unknown';

const eventOf = (addedOn: string, additions: readonly ChargeAddition[]): AdditionEvent => {
  const counted = additions.filter(({ reason }) => countsAsLeaked(reason));
  const kg = (list: readonly ChargeAddition[]) => list.reduce((sum, { addedChargeKg }) => sum + addedChargeKg, 0);
  return {
    addedOn,
    additionIds: additions.map(({ id }) => id),
    addedKg: kg(additions),
    countedKg: kg(counted),
    uncertaintyKg: Math.hypot(...counted.map(({ uncertaintyKg }) => uncertaintyKg)),
    reasons: [...new Set(additions.map(({ reason }) => reason))],
  };
};

/** Additions as events, the earliest first. Throws RangeError for a mass that is not above zero. */
export const additionEvents = (additions: readonly ChargeAddition[]): AdditionEvent[] => {
  for (const { addedChargeKg } of additions) requirePositive(addedChargeKg, 'An added charge');
  return [...groupBy(additions, ({ addedOn }) => addedOn)]
    .map(([addedOn, ofDay]) => eventOf(addedOn, ofDay))
    .sort((a, b) => a.addedOn.localeCompare(b.addedOn));
};
