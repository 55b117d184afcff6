import 'server-only';
import { eq } from 'drizzle-orm';
import { withCompany } from '@/db/client';
import { historyHeads } from '@/db/schema/history';
import { scopeOf, type Viewer } from '@/lib/auth/viewer';

/** Bytes of answers that one process keeps; the ones unused for longest make room. */
const MOST_BYTES = 64 * 1024 * 1024;

const answers = new Map<string, string>();
let keptBytes = 0;

const forget = (key: string) => {
  keptBytes -= (answers.get(key)?.length ?? 0) + key.length;
  answers.delete(key);
};

const keep = (key: string, body: string) => {
  if (answers.has(key)) forget(key);
  answers.set(key, body);
  keptBytes += body.length + key.length;
  for (const oldest of answers.keys()) {
    if (keptBytes <= MOST_BYTES) break;
    forget(oldest);
  }
};

/** The last number of the company's history: it grows with every change that an analytic answer could show. */
const revisionOf = (viewer: Viewer): Promise<number> =>
  withCompany(scopeOf(viewer), async (tx) => {
    const [head] = await tx
      .select({ entryNo: historyHeads.entryNo })
      .from(historyHeads)
      .where(eq(historyHeads.companyId, viewer.companyId));
    return head?.entryNo ?? 0;
  });

/**
 * The answer to a question, computed once for each state of the company's records. The revision is read before the
 * answer is computed, so an answer may be newer than it says, never older. The local day is part of the question: it
 * decides which month is running.
 */
export const keptAnswer = async (viewer: Viewer, question: string, compute: () => Promise<string>): Promise<string> => {
  const revision = await revisionOf(viewer);
  const { technicianId } = scopeOf(viewer);
  const today = new Date().toLocaleDateString('sv-SE', { timeZone: viewer.timeZone });
  const key = [viewer.companyId, technicianId ?? '', viewer.timeZone, today, revision, question].join('|');
  const kept = answers.get(key);
  if (kept !== undefined) {
    // Moved to the young end.
    answers.delete(key);
    answers.set(key, kept);
    return kept;
  }
  const body = await compute();
  keep(key, body);
  return body;
};
