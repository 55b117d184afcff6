import { dayNumber, daysAround } from '../baselines/ticket-dates';
import type { Rule } from './rule';

/** Days that a ticket may lie between its neighbours by number before its date is doubtful. */
const SLACK_DAYS = 120;
const CERTAINTY = { future: 0.99, outOfOrder: 0.7, aYearOff: 0.9 } as const;
const YEAR_DAYS = 365.25;
const NEAR_A_YEAR_DAYS = 45;

const dateOf = (day: number): string => new Date(day * 86_400_000).toISOString().slice(0, 10);

/** Dated after today, or far from the tickets numbered before and after it. */
export const dateDoubtful: Rule = ({ record, baselines, settings }) => {
  const { recoveredOn } = record;
  const finding = (certainty: number, from: string | null, to: string | null) => ({
    rule: 'date_doubtful' as const,
    certainty,
    expectedMassKg: null,
    evidence: { recoveredOn, from, to, today: settings.today },
  });
  if (recoveredOn > settings.today) return finding(CERTAINTY.future, null, null);
  const around = daysAround(baselines.tickets, record.recordRef);
  if (!around) return null;
  const day = dayNumber(recoveredOn);
  const off = Math.max(around.from - day, day - around.to);
  if (off <= SLACK_DAYS) return null;
  const fromWholeYear = Math.abs(off / YEAR_DAYS - Math.max(1, Math.round(off / YEAR_DAYS))) * YEAR_DAYS;
  const certainty = fromWholeYear < NEAR_A_YEAR_DAYS ? CERTAINTY.aYearOff : CERTAINTY.outOfOrder;
  return finding(certainty, dateOf(around.from), dateOf(around.to));
};
