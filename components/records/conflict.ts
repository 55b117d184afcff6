import { RECORD_FIELDS, type RecordField, type RecordTexts } from '@/lib/recoveries/fields';

/** A field that somebody else changed while it stood open here. */
export type Clash = { field: RecordField; began: string; theirs: string; mine: string };

/** What the other correction changed, and for each field what stands here now. */
export const clashesOf = (began: RecordTexts, theirs: RecordTexts, mine: RecordTexts): Clash[] =>
  RECORD_FIELDS.filter((field) => began[field] !== theirs[field]).map((field) => ({
    field,
    began: began[field],
    theirs: theirs[field],
    mine: mine[field],
  }));

/** The newer version with what was typed here laid over it: fields that were not touched follow the newer one. */
export const rebased = (began: RecordTexts, theirs: RecordTexts, mine: RecordTexts): RecordTexts => ({
  ...theirs,
  ...Object.fromEntries(
    RECORD_FIELDS.filter((field) => mine[field] !== began[field]).map((field) => [field, mine[field]]),
  ),
});
