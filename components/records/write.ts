import type { RecordDetail } from '@/analytics/records/contract';
import { ApiError, apiFetch } from '@/lib/api/client';
import { RECORD_FIELDS, type RecordField, type RecordTexts } from '@/lib/recoveries/fields';

const PATH = '/api/recoveries';

const sent = (method: 'POST' | 'PATCH', body: unknown, headers: Record<string, string> = {}): RequestInit => ({
  method,
  headers: { 'content-type': 'application/json', ...headers },
  body: JSON.stringify(body),
});

/** Sends a new record; the same key sent again writes no second one. Throws ApiError with faults by field. */
export const sendNewRecord = (texts: RecordTexts, createNames: boolean, key: string): Promise<RecordDetail> =>
  apiFetch(PATH, sent('POST', { ...texts, createNames }, { 'idempotency-key': key }));

/** The fields that differ from the ones that were read, as they are now. */
export const changedFields = (from: RecordTexts, to: RecordTexts): Partial<RecordTexts> =>
  Object.fromEntries(RECORD_FIELDS.filter((field) => from[field] !== to[field]).map((field) => [field, to[field]]));

/** Sends a correction of the version that was read. Throws ApiError: 409 without faults means a newer version. */
export const sendCorrection = (
  record: Pick<RecordDetail, 'id' | 'version'>,
  correction: { reason: string; changes: Partial<RecordTexts>; createNames: boolean },
): Promise<RecordDetail> => apiFetch(`${PATH}/${record.id}`, sent('PATCH', { version: record.version, ...correction }));

/** The record as it is now. */
export const fetchRecord = (id: string): Promise<RecordDetail> => apiFetch(`${PATH}/${id}`);

/** What the server refused: the faults by field, and a sentence where they name none. */
export type Refusal = { errors: Readonly<Record<string, string>>; sentence: string | null };

export const NOTHING_REFUSED: Refusal = { errors: {}, sentence: null };

/** What an error of sending says to the person at the form. */
export const refusalOf = (error: unknown): Refusal => {
  if (!(error instanceof ApiError))
    return { errors: {}, sentence: error instanceof Error ? error.message : 'The record could not be sent.' };
  const errors: Record<string, string> = {};
  for (const { path, message } of error.errors) errors[path.split('.').at(-1) ?? ''] ??= message;
  const known: readonly string[] = RECORD_FIELDS satisfies readonly RecordField[];
  const named = Object.keys(errors).some((path) => known.includes(path));
  return { errors, sentence: named ? null : error.message };
};
