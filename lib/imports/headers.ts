import { createHash } from 'node:crypto';
import type { MassUnit, VacuumUnit } from '@/lib/vocabulary';
import type { RawRow } from './csv';
import { isMassField, isPressureField } from './field-kinds';
import { RECOVERY_FIELDS, type RecoveryField } from './fields';
import { HEADER_WORDS } from './header-words';
import { cleanText } from './text';
import { splitMassUnit, splitVacuumUnit } from './units';

/** What a header says by itself. `exact` is the field's own name in the file format, which beats any synonym. */
export type HeaderMeaning = {
  field: RecoveryField;
  exact: boolean;
  massUnit: MassUnit | null;
  vacuumUnit: VacuumUnit | null;
};

const wordsOf = (header: string): string =>
  cleanText(header)
    .toLowerCase()
    .replace(/#/g, ' number ')
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim()
    .replace(/\b(?:no|num|nr)\b/g, 'number')
    .replace(/\bdate and time\b/g, 'date time');

const FIELD_OF_WORDS = new Map(RECOVERY_FIELDS.flatMap((field) => HEADER_WORDS[field].map((words) => [words, field])));

const byWords = (words: string): RecoveryField | null => FIELD_OF_WORDS.get(wordsOf(words)) ?? null;

/** The field a header names, or null when it names none or could mean several. */
export const headerMeaning = (header: string): HeaderMeaning | null => {
  const exact = RECOVERY_FIELDS.find((field) => wordsOf(field) === wordsOf(header));
  if (exact) return { field: exact, exact: true, massUnit: null, vacuumUnit: null };
  const mass = splitMassUnit(header);
  const massField = mass ? massFieldOf(mass.rest) : null;
  if (mass && massField) return { field: massField, exact: false, massUnit: mass.unit, vacuumUnit: null };
  const vacuum = splitVacuumUnit(header);
  const vacuumField = vacuum ? byWords(vacuum.rest) : null;
  if (vacuum && isPressureField(vacuumField) && vacuumField)
    return { field: vacuumField, exact: false, massUnit: null, vacuumUnit: vacuum.unit };
  const field = byWords(header);
  return field && { field, exact: false, massUnit: null, vacuumUnit: null };
};

/** “Recovered (lb)” is a mass although “Recovered” alone is a date. */
const massFieldOf = (words: string): RecoveryField | null => {
  if (wordsOf(words) === 'recovered') return 'recovered_mass';
  const field = byWords(words);
  return isMassField(field) ? field : null;
};

const HEADER_WITHIN = 20;

/**
 * Which of the first rows names the columns: the one with most known names, the first of equals. A title above it is
 * passed over; without any known name it is the first row.
 */
export const findHeader = (rows: readonly RawRow[]): { position: number; known: number } => {
  let best = { position: 0, known: 0 };
  rows.slice(0, HEADER_WITHIN).forEach(({ cells }, position) => {
    const known = new Set(cells.map((cell) => headerMeaning(cell)?.field).filter(Boolean)).size;
    if (known > best.known) best = { position, known };
  });
  return best;
};

/** Headers as the rest of the reader names them: blank ones by their place, doubled ones told apart by a number. */
export const nameHeaders = (cells: readonly string[]): string[] => {
  const seen = new Map<string, number>();
  return cells.map((cell, index) => {
    const name = cleanText(cell) || `Column ${index + 1}`;
    const times = (seen.get(name) ?? 0) + 1;
    seen.set(name, times);
    return times === 1 ? name : `${name} (${times})`;
  });
};

/** The same for every file with this set of headers, whatever their order, case and spacing. */
export const headerKeyOf = (headers: readonly string[]): string =>
  createHash('sha256')
    .update(
      headers
        .map((h) => cleanText(h).toLowerCase())
        .sort()
        .join('\n'),
    )
    .digest('hex');
