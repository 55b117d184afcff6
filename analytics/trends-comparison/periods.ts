import { everyMonth, monthsAfter } from '@/analytics/monthly-trends/series';
import { dayAfter, firstDay } from '@/analytics/scope';
import type { ChosenPeriod } from './versus';

/** Days, half-open: `until` is the first day that is not meant. */
export type Span = { from: string; until: string };

/** One side of a comparison: whole months by name, parts of months as days, and all of it as few spans as possible. */
export type Side = { wholeMonths: string[]; parts: Span[]; spans: Span[] };

/** What is compared with what, month by month; `shortened` says why it is less than what was asked for. */
export type ComparedPeriods = {
  now: Side;
  before: Side;
  shortened: 'to twelve months' | 'to the shorter one' | 'to where records begin' | null;
};

type PeriodQuestion = {
  from: string | null;
  to: string | null;
  /** The other period; null is the same one a year before. */
  versus: ChosenPeriod | null;
  /** The company's local date. */
  today: string;
  /** Month of the company's first record. */
  begins: string;
};

const YEAR = 12;
const LAST_POSSIBLE_DAY = 31;

/** Days of a month that a period holds; `last` null is the month's own end, whichever day that is. */
type MonthDays = { month: string; first: number; last: number | null };
const isWhole = ({ first, last }: MonthDays): boolean => first === 1 && last === null;
const dayNo = (day: string): number => Number(day.slice(8));

const monthDays = (from: string, until: string, runningMonth: string): MonthDays[] => {
  if (from >= until) return [];
  const lastDay = dayBefore(until);
  return everyMonth(from.slice(0, 7), lastDay.slice(0, 7)).map((month) => ({
    month,
    first: from.startsWith(month) ? dayNo(from) : 1,
    // The running month goes on after today, also on its last day.
    last: lastDay.startsWith(month) && (month === runningMonth || !until.endsWith('-01')) ? dayNo(lastDay) : null,
  }));
};

/** The day before a day, `YYYY-MM-DD`. */
export const dayBefore = (day: string): string => {
  const date = new Date(`${day}T00:00:00Z`);
  date.setUTCDate(date.getUTCDate() - 1);
  return date.toISOString().slice(0, 10);
};

const spanOf = (month: string, first: number, last: number): Span => {
  const [year = 0, monthNo = 1] = month.split('-').map(Number);
  const day = (n: number) => new Date(Date.UTC(year, monthNo - 1, n)).toISOString().slice(0, 10);
  const length = new Date(Date.UTC(year, monthNo, 0)).getUTCDate();
  return { from: day(first), until: day(Math.min(last, length) + 1) };
};

/** The same days of two months; both whole where both are, null where they share none. */
const sameDays = (now: MonthDays, before: MonthDays): { now: Span; before: Span; whole: boolean } | null => {
  const first = Math.max(now.first, before.first);
  const last = Math.min(now.last ?? LAST_POSSIBLE_DAY, before.last ?? LAST_POSSIBLE_DAY);
  const spans = { now: spanOf(now.month, first, last), before: spanOf(before.month, first, last) };
  const some = ({ from, until }: Span) => from < until;
  return some(spans.now) && some(spans.before) ? { ...spans, whole: isWhole(now) && isWhole(before) } : null;
};

/** The part of the longer list to lay beside the shorter: the latest that begins in the same month of the year. */
const beside = (longer: MonthDays[], shorter: MonthDays[]): MonthDays[] => {
  const wanted = shorter[0]?.month.slice(5);
  const at = longer.findLastIndex(
    ({ month }, index) => month.slice(5) === wanted && index + shorter.length <= longer.length,
  );
  return longer.slice(Math.max(at, 0), Math.max(at, 0) + shorter.length);
};

const joined = (spans: readonly Span[]): Span[] => {
  const whole: Span[] = [];
  for (const span of spans) {
    const last = whole.at(-1);
    if (last?.until === span.from) last.until = span.until;
    else whole.push({ ...span });
  }
  return whole;
};

const sideOf = (months: readonly { span: Span; whole: boolean }[]): Side => ({
  wholeMonths: months.filter(({ whole }) => whole).map(({ span }) => span.from.slice(0, 7)),
  parts: months.filter(({ whole }) => !whole).map(({ span }) => span),
  spans: joined(months.map(({ span }) => span)),
});

/** Both periods as lists of months of one length, before their days are laid on each other. */
const besideEachOther = (asked: MonthDays[], other: MonthDays[] | null): { now: MonthDays[]; before: MonthDays[] } => {
  if (!other) {
    const now = asked.slice(-YEAR);
    return { now, before: now.map(({ month }) => ({ month: monthsAfter(month, -YEAR), first: 1, last: null })) };
  }
  return asked.length > other.length
    ? { now: beside(asked, other), before: other }
    : { now: asked, before: other.length > asked.length ? beside(other, asked) : other };
};

/**
 * Lays a period beside another one, month on month and, where a month is not whole, the same days on the same days: the
 * running month's days 1 to 9 on days 1 to 9 of its counterpart. Without another period it is the same one a year
 * before, of at most the last twelve months, since a longer one would be compared with itself. Months before the
 * company's first record are left out on both sides. Null when nothing is left to compare.
 */
export const comparedPeriods = ({ from, to, versus, today, begins }: PeriodQuestion): ComparedPeriods | null => {
  const tomorrow = dayAfter(today);
  const monthsOf = (first: string, until: string) =>
    monthDays(first, until < tomorrow ? until : tomorrow, today.slice(0, 7));
  const asked = monthsOf(firstDay(from ?? begins), to ? dayAfter(to) : tomorrow);
  const other = versus && monthsOf(firstDay(versus.from), dayAfter(versus.to));

  const { now, before } = besideEachOther(asked, other);
  const known = before.map(({ month }) => month >= begins);
  const pairs = now.flatMap((month, index) => {
    const then = before[index];
    return (then && known[index] && sameDays(month, then)) || [];
  });
  if (!pairs.length) return null;

  const shortened = (): ComparedPeriods['shortened'] => {
    if (known.includes(false)) return 'to where records begin';
    if (other) return asked.length === other.length ? null : 'to the shorter one';
    return asked.length > YEAR ? 'to twelve months' : null;
  };
  return {
    now: sideOf(pairs.map((pair) => ({ span: pair.now, whole: pair.whole }))),
    before: sideOf(pairs.map((pair) => ({ span: pair.before, whole: pair.whole }))),
    shortened: shortened(),
  };
};
