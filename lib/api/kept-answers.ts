import 'server-only';
import { createHash } from 'node:crypto';
import { type AskingViewer, scopeOf } from '@/lib/auth/viewer';

/** An answer ready to be sent: its bytes, and a name that only this content has (a weak entity tag: it may be compressed). */
export type KeptAnswer = { etag: string; body: Uint8Array<ArrayBuffer> };

/** Bytes of answers that one process keeps; the ones unused for longest make room. */
const MOST_BYTES = 64 * 1024 * 1024;

type Entry = { answer: Promise<KeptAnswer>; bytes: number };
const entries = new Map<string, Entry>();
let keptBytes = 0;

const forget = (key: string) => {
  keptBytes -= entries.get(key)?.bytes ?? 0;
  entries.delete(key);
};

/** Moves an entry to the young end. */
const renew = (key: string, entry: Entry) => {
  entries.delete(key);
  entries.set(key, entry);
};

/** Counts an answer once its size is known; the oldest ones make room for it. */
const weigh = (key: string, entry: Entry, { body }: KeptAnswer) => {
  if (entries.get(key) !== entry) return;
  entry.bytes = body.length + key.length;
  keptBytes += entry.bytes;
  for (const oldest of entries.keys()) {
    if (keptBytes <= MOST_BYTES) break;
    forget(oldest);
  }
};

const ready = (text: string): KeptAnswer => {
  const body = new Uint8Array(Buffer.from(text));
  const etag = `W/"${createHash('sha256').update(body).digest('base64url')}"`;
  return { etag, body };
};

/**
 * The answer to a question, computed once for each state of the company's records; whoever asks meanwhile waits for the
 * same computation. The viewer's revision was read before, so an answer may be newer than it says, never older. The
 * local day is part of the question: it decides which month is running.
 */
export const keptAnswer = (
  viewer: AskingViewer,
  question: string,
  compute: () => Promise<string>,
): Promise<KeptAnswer> => {
  const { technicianId } = scopeOf(viewer);
  const today = new Date().toLocaleDateString('sv-SE', { timeZone: viewer.timeZone });
  const key = [viewer.companyId, technicianId ?? '', viewer.timeZone, today, viewer.revision, question].join('|');
  const kept = entries.get(key);
  if (kept) {
    renew(key, kept);
    return kept.answer;
  }
  const entry: Entry = { answer: compute().then(ready), bytes: 0 };
  entries.set(key, entry);
  entry.answer.then(
    (answer) => weigh(key, entry, answer),
    // A failure is nobody's answer but theirs who waited for it.
    () => entries.get(key) === entry && forget(key),
  );
  return entry.answer;
};
