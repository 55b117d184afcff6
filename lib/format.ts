import { kgToUnit } from './units';
import type { DisplayUnit } from './vocabulary';

/** How figures, dates and names are written for people. Pure, no clock; the browser reads this too. */

const MINUS = '\u2212';
const NON_BREAKING_HYPHEN = '\u2011';
const NON_BREAKING_SPACE = '\u00a0';
const LOCALE = 'en-US';

const withMinus = (text: string): string => text.replace('-', MINUS);

const decimal = (value: number, digits: number): string => {
  const text = new Intl.NumberFormat(LOCALE, { minimumFractionDigits: digits, maximumFractionDigits: digits }).format(
    value,
  );
  // What rounds to nothing has no sign.
  return withMinus(/[1-9]/.test(text) ? text : text.replace('-', ''));
};

/** A plain number with grouping and a true minus sign; an em dash for what is no number. */
export const formatNumber = (value: number, digits = 0): string =>
  Number.isFinite(value) ? decimal(value, digits) : '—';

/** A count of things: `1,214`. */
export const formatCount = (count: number): string => formatNumber(count, 0);

/** Kilograms in the viewer's unit, the figure alone: units stand in headers and labels. */
export const formatMass = (kg: number, unit: DisplayUnit, digits = 1): string =>
  formatNumber(kgToUnit(kg, unit), digits);

/** Kilograms in the viewer's unit with the unit behind, held together: `1,214.6 lb`. */
export const formatMassWithUnit = (kg: number, unit: DisplayUnit, digits = 1): string =>
  `${formatMass(kg, unit, digits)}${NON_BREAKING_SPACE}${unit}`;

/** A share (0.841) in per cent: `84.1%`. */
export const formatPercent = (share: number, digits = 0): string =>
  Number.isFinite(share) ? `${decimal(share * 100, digits)}%` : '—';

/** A difference with its sign always said: `+26%`, `−3%`; nothing to say is `0%`. */
export const formatChange = (share: number, digits = 0): string => {
  const text = formatPercent(share, digits);
  return share > 0 && /[1-9]/.test(text) ? `+${text}` : text;
};

/** Points (hundredths of a share) with their sign always said: `+1.0`, `−4.2`; nothing to say is `0.0`. */
export const formatPoints = (points: number, digits = 1): string => {
  const text = formatNumber(points, digits);
  if (!/[1-9]/.test(text)) return text.replace(MINUS, '');
  return points > 0 ? `+${text}` : text;
};

const dateParts = (text: string): [year: number, month: number, day: number] => {
  const [year = Number.NaN, month = 1, day = 1] = text.split('-').map(Number);
  return [year, month, day];
};

// Local dates are formatted as if they were UTC, so that no machine's zone moves them.
const inUtc = (text: string, options: Intl.DateTimeFormatOptions): string => {
  const [year, month, day] = dateParts(text);
  const date = new Date(Date.UTC(year, month - 1, day));
  return Number.isNaN(date.getTime())
    ? text
    : new Intl.DateTimeFormat(LOCALE, { ...options, timeZone: 'UTC' }).format(date);
};

/** A month `2026-11` (or the month of a day) as `November 2026`, short as `Nov 2026`; other text as it is. */
export const formatMonth = (month: string, style: 'long' | 'short' = 'long'): string =>
  inUtc(month.slice(0, 7), { month: style, year: 'numeric' });

/** The name of a month alone: `November`, short `Nov`. */
export const formatMonthName = (month: string, style: 'long' | 'short' = 'long'): string =>
  inUtc(month.slice(0, 7), { month: style });

/** A local day `2026-11-30` as `Nov 30, 2026`; other text as it is. */
export const formatDay = (day: string): string => inUtc(day, { month: 'short', day: 'numeric', year: 'numeric' });

/** A local day with its weekday: `Tuesday, December 1, 2026`; other text as it is. */
export const formatWeekday = (day: string): string => inUtc(day, { dateStyle: 'full' });

/** An ISO instant in the company's zone as `Nov 30, 2026, 17:42`; other text as it is. */
export const formatInstant = (instant: string, timeZone: string): string => {
  const date = new Date(instant);
  if (Number.isNaN(date.getTime())) return instant;
  const day = new Intl.DateTimeFormat(LOCALE, { dateStyle: 'medium', timeZone }).format(date);
  const time = new Intl.DateTimeFormat(LOCALE, { hour: '2-digit', minute: '2-digit', hourCycle: 'h23', timeZone });
  return `${day}, ${time.format(date)}`;
};

/** A count with its noun: `1 recovery`, `1,204 recoveries`. */
export const plural = (count: number, one: string, many: string): string =>
  `${formatCount(count)}${NON_BREAKING_SPACE}${count === 1 ? one : many}`;

/** A refrigerant's designation that never breaks at its hyphen: `R‑22`. For reading only, never for keys. */
export const formatDesignation = (designation: string): string => designation.replaceAll('-', NON_BREAKING_HYPHEN);

/** The text with plain hyphens, spaces and minus signs: for files and for comparing, where what keeps lines whole is in the way. */
export const plainCharacters = (text: string): string =>
  text.replaceAll(NON_BREAKING_HYPHEN, '-').replaceAll(NON_BREAKING_SPACE, ' ').replaceAll(MINUS, '-');

/** Names in a sentence: `A`, `A and B`, `A, B and C`; more than `most` are counted. */
export const formatList = (names: readonly string[], most = 3): string => {
  const shown = names.length > most ? [...names.slice(0, most - 1), `${names.length - most + 1} more`] : names;
  const last = shown.at(-1) ?? '';
  return shown.length < 2 ? last : `${shown.slice(0, -1).join(', ')} and ${last}`;
};
