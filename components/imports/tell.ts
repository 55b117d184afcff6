import type { Mapping, Question, Reading } from '@/lib/imports/contract';
import { DATE_ORDERS, DECIMAL_MARKS, type RecoveryField } from '@/lib/imports/fields';
import { MASS_UNITS, VACUUM_UNITS } from '@/lib/vocabulary';

const isOneOf = <Value extends string>(values: readonly Value[], text: string): text is Value =>
  values.some((value) => value === text);

/** Gives a column to a field (null: to none); the field that it held before is left without it. */
export const tellField = (mapping: Mapping, reading: Reading, header: string, field: RecoveryField | null): Mapping => {
  const columns = { ...mapping.columns };
  const before = reading.columns.find((column) => column.header === header)?.field;
  for (const [told, toldHeader] of Object.entries(columns))
    if (toldHeader === header) delete columns[told as RecoveryField]; // Object.entries widens the keys to string.
  if (before && before !== field && columns[before] === undefined) columns[before] = null;
  if (field) columns[field] = header;
  return { ...mapping, columns };
};

/** Says in which order the dates of a column are written. */
export const tellDateOrder = (mapping: Mapping, header: string, order: string): Mapping =>
  isOneOf(DATE_ORDERS, order) ? { ...mapping, dateOrders: { ...mapping.dateOrders, [header]: order } } : mapping;

/** Says which sign stands before the decimals of a column. */
export const tellDecimalMark = (mapping: Mapping, header: string, mark: string): Mapping =>
  isOneOf(DECIMAL_MARKS, mark) ? { ...mapping, decimalMarks: { ...mapping.decimalMarks, [header]: mark } } : mapping;

const without = (mapping: Mapping, key: keyof Mapping): Mapping => {
  const { [key]: _dropped, ...rest } = mapping;
  return rest;
};

/** Says the unit of rows that name none; an empty text takes it back. */
export const tellUnit = (mapping: Mapping, key: 'massUnit' | 'vacuumUnit', unit: string): Mapping => {
  if (key === 'massUnit' && isOneOf(MASS_UNITS, unit)) return { ...mapping, massUnit: unit };
  if (key === 'vacuumUnit' && isOneOf(VACUUM_UNITS, unit)) return { ...mapping, vacuumUnit: unit };
  return without(mapping, key);
};

/** Says how letters are encoded and what separates the cells; an empty text leaves it to the evidence. */
export const tellShape = (mapping: Mapping, key: 'encoding' | 'delimiter', value: string): Mapping => {
  const encodings = ['utf-8', 'utf-16le', 'utf-16be', 'windows-1252'] as const;
  const delimiters = [',', ';', '\t'] as const;
  if (key === 'encoding' && isOneOf(encodings, value)) return { ...mapping, encoding: value };
  if (key === 'delimiter' && isOneOf(delimiters, value)) return { ...mapping, delimiter: value };
  return without(mapping, key);
};

/** Answers a question. */
export const tellAnswer = (mapping: Mapping, reading: Reading, question: Question, value: string): Mapping => {
  const { about, field, header } = question;
  if (about === 'columns') return field ? tellField(mapping, reading, value, field) : mapping;
  if (about === 'dateOrder') return header ? tellDateOrder(mapping, header, value) : mapping;
  if (about === 'decimalMark') return header ? tellDecimalMark(mapping, header, value) : mapping;
  return tellUnit(mapping, about, value);
};

/** The answer that a mapping holds for a question, or an empty text. */
export const answerTo = (mapping: Mapping, { about, field, header }: Question): string => {
  if (about === 'columns') return (field && mapping.columns?.[field]) ?? '';
  if (about === 'dateOrder') return (header && mapping.dateOrders?.[header]) ?? '';
  if (about === 'decimalMark') return (header && mapping.decimalMarks?.[header]) ?? '';
  return mapping[about] ?? '';
};
