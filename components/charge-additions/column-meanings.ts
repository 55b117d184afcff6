import { ADDITION_FIELDS, type AdditionField, NEEDED_ADDITION_FIELDS } from '@/lib/charge-additions/file/fields';

/** What each column of a file of additions holds. */
export const COLUMN_MEANINGS: Record<AdditionField, string> = {
  addition_ref: 'Your own number of the addition. The same number again means the same addition.',
  added_on: 'The day, best as 2026-05-28. Another order is found out from the file where it can be.',
  site: 'The site as it is called in the records.',
  appliance: 'The unit at that site as it is called in the records; a unit that is not known is refused.',
  added_charge: 'What was put in, weighed: 12.5, or 1-8 for one pound and eight ounces.',
  mass_unit: 'lb, oz, lb-oz, kg or g; it may stand in the heading or in the cell instead.',
  reason:
    'leak_top_up, initial_charge, retrofit, seasonal_variance or unknown. Nothing means not known, and counts as leaked.',
  leaks_verified_on: 'The day on which a follow-up test showed all leaks repaired, where there was one.',
  notes: 'Anything to be remembered.',
};

/** Whether a row says nothing without the column. */
export const isNeededColumn = (field: AdditionField): boolean =>
  NEEDED_ADDITION_FIELDS.some((needed) => needed === field);

/** A file with the headings and one made-up row, to begin from. */
export const additionTemplate = (): string => {
  const example = [
    'A-1001',
    '2026-05-28',
    'Mill Street School',
    'RTU-1',
    '12.5',
    'lb',
    'leak_top_up',
    '2026-06-08',
    '',
  ];
  return `data:text/csv;charset=utf-8,${encodeURIComponent(`${ADDITION_FIELDS.join(',')}\r\n${example.join(',')}\r\n`)}`;
};
