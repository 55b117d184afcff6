import { groupBy } from '../../statistics/group-by';
import type { JudgedRecord } from '../record';

/** Where numbered tickets stand in time: by prefix, pairs of number and day (days since 1970), in order. */
export type TicketDates = Record<string, { number: number; day: number }[]>;

const LEAST_TICKETS = 40;
const PAIRS = 400;
/** Share of neighbouring tickets that must stand in order before their order says anything. */
const ORDERED_SHARE = 0.95;

/** A ticket number's prefix and figures: `T-000123` is `T-` and 123. Null for numbers that end otherwise. */
export const ticketNumber = (recordRef: string): { prefix: string; number: number } | null => {
  const match = /^(.*?)(\d{1,12})$/.exec(recordRef);
  return match ? { prefix: match[1] ?? '', number: Number(match[2]) } : null;
};

export const dayNumber = (date: string): number => Date.parse(`${date}T00:00:00Z`) / 86_400_000;

/** The order of tickets in time, as far as numbers rise with dates. */
export const fitTicketDates = (records: readonly JudgedRecord[]): TicketDates => {
  const numbered = records.flatMap((record) => {
    const ticket = ticketNumber(record.recordRef);
    return ticket ? [{ ...ticket, day: dayNumber(record.recoveredOn) }] : [];
  });
  const dates: TicketDates = {};
  for (const [prefix, group] of groupBy(numbered, (ticket) => ticket.prefix)) {
    if (group.length < LEAST_TICKETS) continue;
    const ordered = group.sort((a, b) => a.number - b.number);
    const rising = ordered.filter(({ day }, i) => day >= (ordered[i - 1]?.day ?? day)).length;
    if (rising < ORDERED_SHARE * ordered.length) continue;
    const stride = Math.ceil(ordered.length / PAIRS);
    dates[prefix] = ordered.flatMap((_, i) => {
      if (i % stride) return [];
      // The middle day of its neighbourhood, so that one wrong date is nobody's yardstick.
      const near = ordered.slice(Math.max(0, i - 2), i + 3).sort((a, b) => a.day - b.day);
      const { number = 0 } = ordered[i] ?? {};
      return [{ number, day: near[Math.floor(near.length / 2)]?.day ?? 0 }];
    });
  }
  return dates;
};

/** The days between which tickets around this number were written; null where their order says nothing. */
export const daysAround = (dates: TicketDates, recordRef: string): { from: number; to: number } | null => {
  const ticket = ticketNumber(recordRef);
  const pairs = ticket ? dates[ticket.prefix] : undefined;
  if (!ticket || !pairs?.length) return null;
  const at = pairs.findIndex(({ number }) => number > ticket.number);
  const [before, after] = at < 0 ? [pairs.at(-1), undefined] : [pairs[at - 1], pairs[at]];
  if (!before || !after) return null;
  return { from: before.day, to: after.day };
};
