import type { LeakRateMethod } from '@/lib/vocabulary';
import { type AdditionEvent, additionEvents, type ChargeAddition } from './addition-events';
import { annualizedRate } from './annualizing';
import { daysBetween } from './days';
import { rollingAverageRate, rollingPeriodStart } from './rolling-average';
import { rateUncertainty } from './uncertainty';

/** A leak rate as it must be computed when refrigerant is added. */
export type LeakRate = {
  /** Percent of the full charge: a year's worth (annualizing) or of the period (rolling average). */
  percent: number;
  /** Standard uncertainty in the same percent. */
  uncertainty: number;
  /** Additions after this day count. Null where no earlier addition is known and 365 days are taken. */
  after: string | null;
  /** The follow-up test that the period begins with, if it does. */
  leaksVerifiedOn: string | null;
};

/** One day of additions; `rate` is null when nothing of it counts as leaked, so that none is to be computed. */
export type RatedEvent = AdditionEvent & { rate: LeakRate | null };

const annualized = (event: AdditionEvent, before: AdditionEvent | undefined, fullChargeKg: number): LeakRate => {
  const days = before ? daysBetween(before.addedOn, event.addedOn) : null;
  const percent = annualizedRate(event.countedKg, fullChargeKg, days);
  return {
    percent,
    uncertainty: rateUncertainty(percent, { kg: event.countedKg, uncertaintyKg: event.uncertaintyKg }),
    after: before?.addedOn ?? null,
    leaksVerifiedOn: null,
  };
};

const rolling = (event: AdditionEvent, until: readonly AdditionEvent[], verified: string[], fullChargeKg: number) => {
  const start = rollingPeriodStart(event.addedOn, verified);
  const inPeriod = until.filter(({ addedOn }) => addedOn > start.after);
  const kg = inPeriod.reduce((sum, { countedKg }) => sum + countedKg, 0);
  const percent = rollingAverageRate(kg, fullChargeKg);
  const uncertaintyKg = Math.hypot(...inPeriod.map((counted) => counted.uncertaintyKg));
  return {
    percent,
    uncertainty: rateUncertainty(percent, { kg, uncertaintyKg }),
    after: start.after,
    leaksVerifiedOn: start.verified,
  };
};

/**
 * The leak rate at each day on which refrigerant was added to one appliance, the earliest first, by one method of 40 CFR
 * 82.152. Null when the full charge is not known to be above zero: there is no rate without one. Whatever went in counts
 * as the last addition of the annualizing method, also what is no leak itself.
 */
export const leakRates = (
  additions: readonly ChargeAddition[],
  fullChargeKg: number | null,
  method: LeakRateMethod,
): RatedEvent[] | null => {
  if (fullChargeKg === null || !(fullChargeKg > 0)) return null;
  const events = additionEvents(additions);
  const verified = additions.flatMap(({ leaksVerifiedOn }) => leaksVerifiedOn ?? []);
  return events.map((event, index) => {
    if (event.countedKg === 0) return { ...event, rate: null };
    const rate =
      method === 'annualizing'
        ? annualized(event, events[index - 1], fullChargeKg)
        : rolling(event, events.slice(0, index + 1), verified, fullChargeKg);
    return { ...event, rate };
  });
};
