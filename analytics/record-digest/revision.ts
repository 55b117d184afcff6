import 'server-only';
import { eq } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { historyHeads } from '@/db/schema/history';

/** Where the company's history ends; 0 before the first change. */
export const readRevision = async (tx: Tx, companyId: string): Promise<number> => {
  const [head] = await tx
    .select({ entryNo: historyHeads.entryNo })
    .from(historyHeads)
    .where(eq(historyHeads.companyId, companyId));
  return head?.entryNo ?? 0;
};
