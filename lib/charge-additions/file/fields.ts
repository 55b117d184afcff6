import type { RecoveryField } from '@/lib/imports/fields';
import { ADDITION_REASONS, type AdditionReason } from '@/lib/vocabulary';

/** Columns of a file of charge additions, in the order of its template. The browser reads this too. */
export const ADDITION_FIELDS = [
  'addition_ref',
  'added_on',
  'site',
  'appliance',
  'added_charge',
  'mass_unit',
  'reason',
  'leaks_verified_on',
  'notes',
] as const;
export type AdditionField = (typeof ADDITION_FIELDS)[number];

/** Without these a row says nothing. */
export const NEEDED_ADDITION_FIELDS = [
  'addition_ref',
  'added_on',
  'site',
  'appliance',
  'added_charge',
] as const satisfies readonly AdditionField[];

/**
 * The column of a recovery file that is written in the same way: dates, masses and names of both files are read by one
 * reader.
 */
export const READ_AS = {
  addition_ref: 'record_ref',
  added_on: 'recovered_at',
  site: 'site',
  appliance: 'appliance',
  added_charge: 'recovered_mass',
  mass_unit: 'mass_unit',
  reason: 'disposition',
  leaks_verified_on: 'manufactured_on',
  notes: 'notes',
} as const satisfies Record<AdditionField, RecoveryField>;

/** What a column may be called besides the field's own name: lower case, words apart by one space. */
export const ADDITION_HEADERS: Record<AdditionField, readonly string[]> = {
  addition_ref: ['ref', 'reference', 'ticket', 'ticket number', 'work order', 'number'],
  added_on: ['date', 'date added', 'day', 'charged on', 'service date'],
  site: ['site name', 'location', 'facility'],
  appliance: ['unit', 'unit tag', 'equipment', 'appliance tag', 'system'],
  added_charge: ['added', 'amount', 'amount added', 'refrigerant added', 'charge added', 'added mass', 'quantity'],
  mass_unit: ['unit of mass', 'units', 'uom', 'weight unit'],
  reason: ['why', 'reason added', 'type'],
  leaks_verified_on: ['verified on', 'leaks verified', 'repair verified', 'verification date', 'repaired and verified'],
  notes: ['note', 'remarks', 'comment', 'comments'],
};

const REASON_WORDS: Record<AdditionReason, readonly string[]> = {
  leak_top_up: ['leak', 'leak repair', 'top up', 'topup', 'service', 'service top up', 'leak or service', 'recharge'],
  initial_charge: ['install', 'installation', 'initial', 'first charge', 'commissioning', 'new install'],
  retrofit: ['conversion', 'converted'],
  seasonal_variance: ['seasonal', 'season', 'seasonal adjustment'],
  unknown: ['not known', 'not stated', 'other'],
};

const wordsOf = (text: string): string =>
  text
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim();

const REASON_OF = new Map(
  ADDITION_REASONS.flatMap((reason) =>
    [wordsOf(reason), ...REASON_WORDS[reason]].map((word): [string, AdditionReason] => [word, reason]),
  ),
);

/** The reason that a word of a file means, or null when it means none. */
export const reasonOf = (text: string): AdditionReason | null => REASON_OF.get(wordsOf(text)) ?? null;

/** The field that a header without its unit names, or null. */
export const additionFieldOf = (header: string): AdditionField | null => {
  const words = wordsOf(header);
  return (
    ADDITION_FIELDS.find((field) => wordsOf(field) === words) ??
    ADDITION_FIELDS.find((field) => ADDITION_HEADERS[field].includes(words)) ??
    null
  );
};
