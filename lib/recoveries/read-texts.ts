import { isDay } from '@/lib/calendar';
import type { FieldError } from '@/lib/errors';
import type { RecoveryRow } from '@/lib/imports/rows';
import {
  APPLIANCE_CATEGORIES,
  CERTIFICATION_TYPES,
  DISPOSITIONS,
  JOB_TYPES,
  MASS_UNITS,
  VACUUM_UNITS,
} from '@/lib/vocabulary';
import { FIELD_LABELS, FILE_COLUMNS, RECORD_FIELDS, type RecordField, type RecordTexts } from './fields';
import { readWhen } from './local-time';
import { readMasses } from './read-masses';
import { readPressures } from './read-pressures';

/** What a reader must know besides the texts: the company's zone, the catalogue's designations, the company's day. */
export type TextContext = { timeZone: string; refrigerants: ReadonlySet<string>; today: string };

/** Collects what is wrong, field by field. */
export type Faults = (field: RecordField, message: string) => null;

const NEEDED = ['recordRef', 'recoveredAt', 'technician', 'site', 'appliance', 'refrigerant', 'massUnit'] as const;
const LONGEST_NAME = 200;
const LONGEST_NOTE = 4000;
/** Nothing was recovered and written down before the trade had scales for it; an older date is a slip. */
const EARLIEST_DAY = '1950-01-01';

const oneOf = <Word extends string>(
  words: readonly Word[],
  field: RecordField,
  text: string,
  fault: Faults,
): Word | null => {
  const found = words.find((word) => word === text);
  if (text !== '' && !found) fault(field, `“${text}” is none of ${words.join(', ')}`);
  return found ?? null;
};

const checkTexts = (texts: RecordTexts, fault: Faults): void => {
  for (const field of NEEDED) if (texts[field] === '') fault(field, `${FIELD_LABELS[field]} is needed`);
  for (const field of RECORD_FIELDS) {
    const longest = field === 'notes' ? LONGEST_NOTE : LONGEST_NAME;
    if (texts[field].length > longest) fault(field, `Longer than ${longest} characters`);
  }
};

/** The designation as the catalogue writes it: `r410a` and `R-410A` are one. Null when the catalogue has no such. */
export const toDesignation = (text: string, refrigerants: ReadonlySet<string>): string | null => {
  const bare = (name: string) => name.toUpperCase().replace(/[^A-Z0-9()]/g, '');
  const wanted = bare(text).replace(/^R?/, 'R');
  for (const designation of refrigerants) if (bare(designation) === wanted) return designation;
  return null;
};

const readDates = (texts: RecordTexts, context: TextContext, fault: Faults) => {
  const when = texts.recoveredAt === '' ? null : readWhen(texts.recoveredAt, context.timeZone);
  if (texts.recoveredAt !== '' && !when)
    fault('recoveredAt', 'Write the day as YYYY-MM-DD, with the time as YYYY-MM-DDTHH:MM');
  if (when && when.recoveredOn > context.today) fault('recoveredAt', `The day lies after today, ${context.today}`);
  if (when && when.recoveredOn < EARLIEST_DAY) fault('recoveredAt', `The day lies before ${EARLIEST_DAY}`);
  if (texts.manufacturedOn !== '' && !isDay(texts.manufacturedOn))
    fault('manufacturedOn', 'Write the day as YYYY-MM-DD');
  return { when, manufacturedOn: texts.manufacturedOn || null };
};

const enteredTexts = (texts: RecordTexts): Record<string, string> =>
  Object.fromEntries(RECORD_FIELDS.flatMap((field) => (texts[field] ? [[FILE_COLUMNS[field], texts[field]]] : [])));

/**
 * Reads a record from what was typed. Gives the record, or every fault by field; names are not looked up here. Numbers
 * are written with a decimal point, masses in `massUnit`, pressures in `vacuumUnit`.
 */
export const readTexts = (
  texts: RecordTexts,
  context: TextContext,
): { ok: true; row: RecoveryRow } | { ok: false; errors: FieldError[] } => {
  const errors: FieldError[] = [];
  const fault: Faults = (path, message) => {
    errors.push({ path, message });
    return null;
  };
  checkTexts(texts, fault);
  const refrigerant = toDesignation(texts.refrigerant, context.refrigerants);
  if (texts.refrigerant !== '' && !refrigerant)
    fault('refrigerant', `“${texts.refrigerant}” is no refrigerant of the catalogue`);
  const { when, manufacturedOn } = readDates(texts, context, fault);
  const massUnit = oneOf(MASS_UNITS, 'massUnit', texts.massUnit, fault);
  const masses = massUnit && readMasses(texts, massUnit, fault);
  const pressures = readPressures(texts, oneOf(VACUUM_UNITS, 'vacuumUnit', texts.vacuumUnit, fault), fault);
  const words = {
    jobType: oneOf(JOB_TYPES, 'jobType', texts.jobType, fault),
    category: oneOf(APPLIANCE_CATEGORIES, 'category', texts.category, fault),
    disposition: oneOf(DISPOSITIONS, 'disposition', texts.disposition, fault),
    technicianCertification: oneOf(
      CERTIFICATION_TYPES,
      'technicianCertification',
      texts.technicianCertification,
      fault,
    ),
  };
  if (errors.length || !when || !refrigerant || !massUnit || !masses || !pressures) return { ok: false, errors };
  const { recordRef, technician, site, appliance } = texts;
  const row: RecoveryRow = {
    ...{ recordRef, technician, site, appliance, refrigerant, massUnit, manufacturedOn },
    ...when,
    ...masses,
    ...pressures,
    ...words,
    branch: texts.branch || null,
    cylinder: texts.cylinder || null,
    notes: texts.notes || null,
    entered: enteredTexts(texts),
    extra: {},
  };
  return { ok: true, row };
};
