import { type Dimension, dayAfter, firstDay, isNarrowed, type Scope } from '@/analytics/scope';
import { monthOf as monthOfInstant } from '@/analytics/scope-address';
import { monthsAfter } from './series';

const monthOf = (day: string): string => day.slice(0, 7);
const startsMonth = (day: string): boolean => day.endsWith('-01');

const wholeMonths = (scope: Scope): boolean =>
  (!scope.from || startsMonth(firstDay(scope.from))) && (!scope.to || startsMonth(dayAfter(scope.to)));

/** Whether views that are summed by month can answer: whole months, narrowed by nothing but the split dimension. */
export const answeredByMonth = (scope: Scope, by: Dimension): boolean => wholeMonths(scope) && !isNarrowed(scope, by);

/** Whether the months over all keys stand ready: whole months, narrowed by nothing. */
export const summedByMonth = (scope: Scope): boolean => wholeMonths(scope) && !isNarrowed(scope);

/** Months of which the scope's first or last day leaves a part out. */
export const cutMonths = (scope: Scope): string[] => {
  const from = scope.from && !startsMonth(firstDay(scope.from)) ? [monthOf(firstDay(scope.from))] : [];
  const to = scope.to && !startsMonth(dayAfter(scope.to)) ? [monthOf(dayAfter(scope.to))] : [];
  return [...new Set([...from, ...to])];
};

/** The running month of a zone when the scope reaches it, else null. */
export const partialMonth = (scope: Scope, now: Date, timeZone: string): string | null => {
  const running = monthOfInstant(now, timeZone);
  const begins = !scope.from || firstDay(scope.from) < `${monthsAfter(running, 1)}-01`;
  const ends = !scope.to || dayAfter(scope.to) > `${running}-01`;
  return begins && ends ? running : null;
};

/**
 * The scope of the months that come a year before a scope's and that it does not hold whole itself; null when it has no
 * beginning, and so holds them all.
 */
export const yearBeforeScope = (scope: Scope): Scope | null => {
  if (!scope.from) return null;
  const begins = monthOf(firstDay(scope.from));
  const lastOutside = monthsAfter(begins, startsMonth(firstDay(scope.from)) ? -1 : 0);
  const lastAsked = scope.to ? monthsAfter(monthOf(scope.to), -12) : lastOutside;
  const [to] = [lastOutside, lastAsked].sort();
  return { ...scope, from: monthsAfter(begins, -12), to };
};
