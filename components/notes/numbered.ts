import type { Note } from '@/analytics/notes/contract';
import type { ChartNote } from '@/components/charts/layer';
import { daysInMonth, endsMonth } from '@/lib/calendar';
import { formatDay, formatMonth } from '@/lib/format';

/** A note with the number by which chart, table and list speak of it. */
export type NumberedNote = Note & { no: number };

/** Notes in order of their days, counted from one. */
export const numbered = (notes: readonly Note[]): NumberedNote[] =>
  notes.map((note, index) => ({ ...note, no: index + 1 }));

/** Notes over the months that they touch. */
export const chartNotes = (notes: readonly NumberedNote[]): ChartNote[] =>
  notes.map(({ id, no, from, to }) => ({ id, no, first: from.slice(0, 7), last: to.slice(0, 7) }));

/** Notes of which a day lies in the month. */
export const notesOfMonth = (notes: readonly NumberedNote[], month: string): NumberedNote[] =>
  notes.filter(({ from, to }) => from.slice(0, 7) <= month && month <= to.slice(0, 7));

/** The days of a note in words: `Jul 3, 2026`, `July 2026`, `Jun 28, 2026 to Jul 10, 2026`. */
export const noteDays = ({ from, to }: Pick<Note, 'from' | 'to'>): string => {
  if (from === to) return formatDay(from);
  if (from.slice(0, 7) === to.slice(0, 7) && from.endsWith('-01') && endsMonth(to)) return formatMonth(from);
  return `${formatDay(from)} to ${formatDay(to)}`;
};

/** The first and last day of a month, for a note about all of it. */
export const wholeMonth = (month: string): { from: string; to: string } => ({
  from: `${month}-01`,
  to: `${month}-${String(daysInMonth(month)).padStart(2, '0')}`,
});
