import type { DateOrder } from './fields';
import { cleanText } from './text';

/** Two-digit years are read only into this span of years, which is shorter than a century. */
export type YearSpan = { first: number; last: number };

/** A written date: its day, and its time of day with the offset when the cell gives them. */
export type DateText = { date: string; time: string | null; offset: string | null };

type Parts = { year: string; month: number; day: string };

const MONTHS = ['jan', 'feb', 'mar', 'apr', 'may', 'jun', 'jul', 'aug', 'sep', 'oct', 'nov', 'dec'];
const YEAR_FIRST = /^(\d{4})([-/.])(\d{1,2})\2(\d{1,2})$/;
const COMPACT = /^((?:19|20)\d{2})(\d{2})(\d{2})$/;
const YEAR_LAST = /^(\d{1,2})([-/.])(\d{1,2})\2(\d{4})$/;
const SHORT_YEAR = /^(\d{1,2})([-/.])(\d{1,2})\2(\d{2})$/;
const DAY_NAME = /^(\d{1,2})[-/. ]{0,2}([a-z]{3,9})[-/., ]{0,2}(\d{4}|\d{2})$/i;
const NAME_DAY = /^([a-z]{3,9})\.? (\d{1,2}),? (\d{4})$/i;
const TIME =
  /^(.*?\d)(?:[T ]| ?, ?)(\d{1,2}):(\d{2})(?::(\d{2})(?:[.,]\d+)?)?(?: ?([ap])\.?m\.?)?(?: ?(Z|[+-](?:0\d|1[0-4]):?[0-5]\d))?$/i;

const FULL_NAMES = [
  ...['january', 'february', 'march', 'april', 'may', 'june', 'july', 'august', 'september', 'october', 'november'],
  'december',
];

const monthOf = (name: string): number => {
  const word = name.toLowerCase();
  return Math.max(MONTHS.indexOf(word), FULL_NAMES.indexOf(word), word === 'sept' ? 8 : -1) + 1;
};

const ordered = (order: DateOrder, [a = '', b = '', c = '']: string[]): Parts => {
  if (order === 'ymd') return { year: a, month: Number(b), day: c };
  return order === 'dmy' ? { year: c, month: Number(b), day: a } : { year: c, month: Number(a), day: b };
};

const partsOf = (text: string, order: DateOrder): Parts | null => {
  const first = YEAR_FIRST.exec(text);
  if (first) return ordered('ymd', [first[1] ?? '', first[3] ?? '', first[4] ?? '']);
  const compact = COMPACT.exec(text);
  if (compact) return ordered('ymd', compact.slice(1, 4));
  const last = YEAR_LAST.exec(text);
  if (last) return order === 'ymd' ? null : ordered(order, [last[1] ?? '', last[3] ?? '', last[4] ?? '']);
  const short = SHORT_YEAR.exec(text);
  if (short) return ordered(order, [short[1] ?? '', short[3] ?? '', short[4] ?? '']);
  const dayName = DAY_NAME.exec(text);
  if (dayName) return { day: dayName[1] ?? '', month: monthOf(dayName[2] ?? ''), year: dayName[3] ?? '' };
  const nameDay = NAME_DAY.exec(text);
  return nameDay && { month: monthOf(nameDay[1] ?? ''), day: nameDay[2] ?? '', year: nameDay[3] ?? '' };
};

const fullYear = (year: string, { first, last }: YearSpan): number | null => {
  if (year.length === 4) return Number(year);
  return (
    [1900 + Number(year), 2000 + Number(year)].find((candidate) => candidate >= first && candidate <= last) ?? null
  );
};

const timeOf = (hour: string, minute: string, second: string | undefined, half: string | undefined): string | null => {
  let hours = Number(hour);
  if (half) {
    if (hours < 1 || hours > 12) return null;
    hours = (hours % 12) + (half.toLowerCase() === 'p' ? 12 : 0);
  }
  if (hours > 23 || Number(minute) > 59 || Number(second ?? 0) > 59) return null;
  return `${String(hours).padStart(2, '0')}:${minute}:${second ?? '00'}`;
};

/**
 * Reads one date cell in the given order of day, month and year; null for what is no day of the calendar under it. Dates
 * that begin with a four-digit year or name their month read the same in every order. Accepts `-`, `/` and `.`, and a
 * time of day after a space, a comma or `T`, with am or pm and an offset.
 */
export const parseDateText = (text: string, order: DateOrder, span: YearSpan): DateText | null => {
  const clean = cleanText(text);
  const timed = TIME.exec(clean);
  const time = timed ? timeOf(timed[2] ?? '', timed[3] ?? '', timed[4], timed[5]) : null;
  if (timed && time === null) return null;
  const parts = partsOf(timed?.[1] ?? clean, order);
  const year = parts && fullYear(parts.year, span);
  if (!parts || !year) return null;
  const day = Number(parts.day);
  if (parts.month < 1 || parts.month > 12 || day < 1 || day > daysInMonth(year, parts.month)) return null;
  const date = `${String(year).padStart(4, '0')}-${String(parts.month).padStart(2, '0')}-${String(day).padStart(2, '0')}`;
  return { date, time, offset: timed?.[6]?.toUpperCase() ?? null };
};

const daysInMonth = (year: number, month: number): number => new Date(Date.UTC(year, month, 0)).getUTCDate();
