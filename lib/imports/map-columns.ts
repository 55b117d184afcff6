import { badInput, unreadable } from '@/lib/errors';
import type { ColumnReading, Mapping, Question } from './contract';
import { FIELD_NAMES } from './field-names';
import { NEEDED_FIELDS, RECOVERY_FIELDS, type RecoveryField } from './fields';
import { type HeaderMeaning, headerMeaning } from './headers';
import { listWords } from './text';

/** Which field a column holds, who said so, and what its header says besides. */
export type MappedColumn = {
  index: number;
  header: string;
  field: RecoveryField | null;
  fieldFrom: ColumnReading['fieldFrom'];
  meaning: HeaderMeaning | null;
};

type Columns = NonNullable<Mapping['columns']>;

const sameHeader = (a: string, b: string) => a.trim().toLowerCase() === b.trim().toLowerCase();

const findColumn = (columns: MappedColumn[], header: string): MappedColumn | undefined =>
  columns.find((c) => c.header === header) ?? columns.find((c) => sameHeader(c.header, header));

const give = (column: MappedColumn, field: RecoveryField, from: ColumnReading['fieldFrom']) => {
  column.field = field;
  column.fieldFrom = from;
};

/** Takes the person's word; throws 400 for a header that is not in the file and for one given to two fields. */
const applyTold = (columns: MappedColumn[], told: Columns): void => {
  for (const field of RECOVERY_FIELDS) {
    const header = told[field];
    if (header === undefined || header === null) continue;
    const column = findColumn(columns, header);
    const path = `mapping.columns.${field}`;
    if (!column) throw badInput([{ path, message: `The file has no column “${header}”.` }]);
    if (column.field)
      throw badInput([
        { path, message: `“${header}” is given to ${FIELD_NAMES[column.field]} already; one column holds one field.` },
      ]);
    give(column, field, 'told');
  }
};

const applyRemembered = (columns: MappedColumn[], remembered: Columns, settled: ReadonlySet<RecoveryField>): void => {
  for (const field of RECOVERY_FIELDS) {
    const header = remembered[field];
    const column = header && !settled.has(field) ? findColumn(columns, header) : undefined;
    if (column && !column.field) give(column, field, 'remembered');
  }
};

/** Takes the headers' word; where two columns are called the same field, none is taken and the person is asked. */
const applyNames = (columns: MappedColumn[], settled: ReadonlySet<RecoveryField>): Question[] => {
  const questions: Question[] = [];
  for (const field of RECOVERY_FIELDS) {
    if (settled.has(field) || columns.some((c) => c.field === field)) continue;
    const named = columns.filter((c) => !c.field && c.meaning?.field === field);
    const exact = named.filter((c) => c.meaning?.exact);
    const candidates = exact.length ? exact : named;
    const [only] = candidates;
    if (candidates.length === 1 && only) give(only, field, 'name');
    else if (only) questions.push(ask(field, candidates, 'More than one column could hold'));
  }
  return questions;
};

const ask = (field: RecoveryField, candidates: MappedColumn[], why: string): Question => ({
  about: 'columns',
  header: null,
  field,
  sentence: `${why} ${FIELD_NAMES[field]}. Which one is it?`,
  choices: candidates.map(({ header }) => ({ value: header, label: header })),
});

const missingFields = (columns: MappedColumn[]): RecoveryField[] => {
  const has = (field: RecoveryField) => columns.some((c) => c.field === field);
  const weighed = has('recovered_mass') || (has('start_weight') && has('end_weight'));
  return [...NEEDED_FIELDS.filter((field) => !has(field)), ...(weighed ? [] : (['recovered_mass'] as const))];
};

/**
 * Decides which column holds which field: as told now, else as told for the same headers before, else by the headers'
 * own words. Gives questions for needed fields that no column holds. Throws 400 for a told header that is not there,
 * 422 when needed fields are missing and no column is left that could hold them.
 */
export const mapColumns = (
  headers: readonly string[],
  told: Mapping,
  remembered: Mapping | null,
): { columns: MappedColumn[]; questions: Question[] } => {
  const columns = headers.map((header, index): MappedColumn => {
    const meaning = headerMeaning(header.replace(/ \(\d+\)$/, ''));
    return { index, header, field: null, fieldFrom: 'none', meaning };
  });
  const settledBy = (mapping: Mapping | null) =>
    RECOVERY_FIELDS.filter((field) => mapping?.columns?.[field] !== undefined);
  applyTold(columns, told.columns ?? {});
  const settled = new Set(settledBy(told));
  applyRemembered(columns, remembered?.columns ?? {}, settled);
  for (const field of settledBy(remembered)) settled.add(field);
  const questions = applyNames(columns, settled);
  const free = columns.filter(({ field }) => !field);
  const missing = missingFields(columns).filter((field) => !questions.some((q) => q.field === field));
  if (missing.length && free.length === 0)
    throw unreadable(
      `No column holds ${listWords(
        missing.map((field) => FIELD_NAMES[field]),
        'and',
      )}.`,
    );
  return { columns, questions: [...questions, ...missing.map((field) => ask(field, free, 'No column is called'))] };
};
