import type { FieldError } from '@/lib/errors';
import { RECOVERY_FIELDS } from '@/lib/imports/fields';
import { rowReader } from '@/lib/imports/row';
import type { ReadContext, RecoveryRow, RowReason } from '@/lib/imports/rows';
import { FILE_COLUMNS, RECORD_FIELDS, type RecordTexts } from './fields';
import { formLayout } from './form-layout';

/** What a reader must know besides the texts: the company's zone, the catalogue's designations, the company's day. */
export type TextContext = Omit<ReadContext, 'fileName'>;

const FIELD_OF = new Map<string, string>(RECORD_FIELDS.map((field) => [FILE_COLUMNS[field], field]));

const toFieldError = ({ column, message }: RowReason): FieldError => ({
  path: FIELD_OF.get(column ?? '') ?? '',
  message,
});

/**
 * Reads a record from what was typed, by the rules of the recovery file: ISO dates, decimal points, masses in
 * `massUnit`, pressures in `vacuumUnit`. Gives the record, or every fault by field; names are not looked up here.
 */
export const readTexts = (
  texts: RecordTexts,
  context: TextContext,
  { weightsKept = false }: { weightsKept?: boolean } = {},
): { ok: true; row: RecoveryRow } | { ok: false; errors: FieldError[] } => {
  const byColumn = new Map<string, string>(RECORD_FIELDS.map((field) => [FILE_COLUMNS[field], texts[field]]));
  const cells = RECOVERY_FIELDS.map((column) => byColumn.get(column) ?? '');
  const read = rowReader(formLayout(texts, weightsKept), { ...context, fileName: '' })({
    line: 1,
    cells,
    quoteFault: false,
  });
  return read.ok ? { ok: true, row: read.row } : { ok: false, errors: read.reasons.map(toFieldError) };
};
