import { type DateText, parseDateText } from './date-text';
import { FIELD_NAMES } from './field-names';
import type { DateOrder } from './fields';
import type { ToLocalTime } from './local-time';
import type { RowCells } from './row-cells';
import { yearSpanOf } from './year-span';

const ORDER_WORDS: Record<DateOrder, string> = {
  ymd: 'year, month, day',
  dmy: 'day, month, year',
  mdy: 'month, day, year',
};

const readDate = (cells: RowCells, field: 'recovered_at' | 'manufactured_on', today: string): DateText | null => {
  const text = cells.value(field);
  const column = cells.column(field);
  if (text === '' || !column) return null;
  if (!column.dateOrder)
    return cells.refuse(
      field,
      'not_decided',
      'It is not decided yet in which order the dates of this column are written.',
    );
  const span = yearSpanOf(field, today);
  const date = parseDateText(text, column.dateOrder, span);
  if (!date) return cells.refuse(field, 'not_a_date', `“${text}” is no date (${ORDER_WORDS[column.dateOrder]}).`);
  if (Number(date.date.slice(0, 4)) < span.first)
    return cells.refuse(field, 'date_too_early', `The ${FIELD_NAMES[field]} lies before ${span.first}.`);
  return date;
};

const refuseFuture = (cells: RowCells, field: 'recovered_at' | 'manufactured_on', today: string): null =>
  cells.refuse(field, 'date_in_future', `The ${FIELD_NAMES[field]} lies after today, ${today}.`);

/** The company's local day of the recovery and, with a time of day, the instant; null when refused. */
export const readRecoveredAt = (
  cells: RowCells,
  today: string,
  toLocalTime: ToLocalTime,
): { recoveredOn: string; recoveredAt: string | null } | null => {
  if (cells.value('recovered_at') === '')
    return cells.refuse('recovered_at', 'missing', 'The date of the recovery is missing.');
  const date = readDate(cells, 'recovered_at', today);
  if (!date) return null;
  const { on, at } = toLocalTime(date);
  return on > today ? refuseFuture(cells, 'recovered_at', today) : { recoveredOn: on, recoveredAt: at };
};

/** The day an appliance was made, null when not stated or refused. */
export const readManufacturedOn = (cells: RowCells, today: string): string | null => {
  const date = readDate(cells, 'manufactured_on', today)?.date ?? null;
  return date && date > today ? refuseFuture(cells, 'manufactured_on', today) : date;
};
