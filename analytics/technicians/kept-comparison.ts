import 'server-only';
import { and, eq, gt, inArray, sql } from 'drizzle-orm';
import { DIGEST_VERSION } from '@/analytics/record-digest/version';
import type { TechnicianComparison } from '@/analytics/technician-comparison/compare-technicians';
import type { Tx } from '@/db/client';
import { history } from '@/db/schema/history';
import { recordDigests as d } from '@/db/schema/record-digests';
import type { StandingComparison } from './comparison';

/** A comparison follows from these: the records, what was decided of their flags, and the company's time zone. */
const STANDS_ON = ['recoveries', 'flags', 'companies'];

/** The comparison over all records as the last digest left it; null before the first, or when it was made otherwise. */
export const keptComparison = async (tx: Tx): Promise<StandingComparison | null> => {
  const since = tx
    .select({ entryNo: history.entryNo })
    .from(history)
    .where(
      and(eq(history.companyId, d.companyId), gt(history.entryNo, d.revision), inArray(history.tableName, STANDS_ON)),
    );
  const [kept] = await tx
    .select({
      comparison: d.comparison,
      revision: d.revision,
      madeAt: d.madeAt,
      current: sql<boolean>`not exists ${since}`,
    })
    .from(d)
    .where(eq(d.version, DIGEST_VERSION));
  if (!kept) return null;
  // Written by this version of the digest, as JSON of this type.
  const comparison = kept.comparison as TechnicianComparison;
  return { ...kept, comparison, madeAt: new Date(kept.madeAt).toISOString() };
};
