import type { ChargeAddition } from '@/analytics/leak-rate/addition-events';

const KG_PER_LB = 0.45359237;

/** Pounds as the kilograms of the database. */
export const lb = (pounds: number): number => pounds * KG_PER_LB;

/** A leak top-up of some pounds on a day, unless told otherwise. */
export const added = (addedOn: string, pounds: number, rest: Partial<ChargeAddition> = {}): ChargeAddition => ({
  id: `${addedOn} ${pounds}`,
  addedOn,
  addedChargeKg: lb(pounds),
  uncertaintyKg: 0,
  reason: 'leak_top_up',
  leaksVerifiedOn: null,
  ...rest,
});
