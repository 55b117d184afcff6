import type { Dimension } from '@/analytics/dimensions';
import { type Answer, changeWords } from '@/analytics/monthly-trends/sentence';
import { endsMonth } from '@/lib/calendar';
import { formatDay, formatMassWithUnit, formatMonth, formatMonthName, formatPercent } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';
import type { Comparison } from './contract';

type Days = { from: string; to: string };

/** Days in words: `November 2026`, `January to November 2026`, `Nov 1 to Dec 9, 2026`, `Dec 9, 2026`. */
export const periodWords = ({ from, to }: Days): string => {
  const sameYear = from.slice(0, 4) === to.slice(0, 4);
  if (from.endsWith('-01') && endsMonth(to)) {
    if (from.slice(0, 7) === to.slice(0, 7)) return formatMonth(from);
    return `${sameYear ? formatMonthName(from) : formatMonth(from)} to ${formatMonth(to)}`;
  }
  if (from === to) return formatDay(from);
  const beginning = sameYear ? formatDay(from).replace(/, \d{4}$/, '') : formatDay(from);
  return `${beginning} to ${formatDay(to)}`;
};

/** The same with its preposition: `in November 2026`, `from January to November 2026`, `on Dec 9, 2026`. */
const whenWords = (days: Days): string => {
  const words = periodWords(days);
  if (words.includes(' to ')) return `from ${words}`;
  return days.from === days.to ? `on ${words}` : `in ${words}`;
};

const signed = (ratio: number): string => `${formatPercent(Math.abs(ratio - 1))} ${ratio >= 1 ? 'more' : 'less'}`;

/** How far the change of a comparison can be believed, as a sentence; empty where there is nothing to doubt. */
export const certaintyWords = ({ ratio, clear, now, before }: Comparison): string => {
  if (!ratio) return '';
  const range = `between ${signed(ratio.low)} and ${signed(ratio.high)}`;
  if (clear) return `Jobs of such sizes would not differ so much by chance: the change lies ${range}.`;
  const few = Math.min(now.recoveries, before.recoveries) < 30 ? 'So few jobs say little' : 'Jobs differ much in size';
  return `${few}: the change may lie ${range}, which is no clear change.`;
};

/** Which key makes more than half of the difference, as a sentence; empty when none does, or when it is of people. */
export const moverNote = (
  { movers, difference }: Comparison,
  by: Dimension,
  unit: DisplayUnit,
  nameOf: (key: string) => string,
): string => {
  const [most] = movers;
  // A person is not the reason for a period: jobs are handed out, and holidays taken.
  if (!most || movers.length < 2 || by === 'technician' || difference.mass === 0) return '';
  if (most.difference * Math.sign(difference.mass) <= Math.abs(difference.mass) / 2) return '';
  const much = formatMassWithUnit(Math.abs(most.difference), unit, 0);
  return `Most of the difference is ${nameOf(most.key)}: ${much} ${most.difference > 0 ? 'more' : 'less'}.`;
};

/** The period against the chosen other one, as the answer of the screen. */
export const comparisonAnswer = ({ now, before }: Comparison, unit: DisplayUnit): Answer => ({
  before: `${periodWords(now)} brought in `,
  figure: formatMassWithUnit(now.recoveredMass, unit, 0),
  after: changeWords(now.recoveredMass, before.recoveredMass, whenWords(before)),
  month: null,
});

/** The longer view under an answer about one month: the whole period against a year before, and how sure that is. */
export const comparisonNote = (comparison: Comparison, unit: DisplayUnit): string => {
  const { now, before } = comparison;
  const mass = formatMassWithUnit(now.recoveredMass, unit, 0);
  const told = `${periodWords(now)} brought in ${mass}${changeWords(now.recoveredMass, before.recoveredMass, whenWords(before))}`;
  return [told, certaintyWords(comparison)].filter(Boolean).join(' ');
};

/** What was left out so that like stands against like; empty when nothing was. */
export const likeForLikeWords = ({ sameDays, shortened, now, before }: Comparison): string => {
  const days = sameDays ? 'A month that is not whole stands against the same days of its counterpart.' : '';
  const why = {
    'to twelve months': 'A longer period would be compared with a part of itself: these are its last twelve months.',
    'to the shorter one': `The two differ in length: ${periodWords(now)} is laid beside ${periodWords(before)}.`,
    'to where records begin': 'Months before the first record are left out on both sides.',
  } as const;
  return [shortened ? why[shortened] : '', days].filter(Boolean).join(' ');
};
