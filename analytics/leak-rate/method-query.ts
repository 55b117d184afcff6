import 'server-only';
import { and, desc, eq } from 'drizzle-orm';
import { z } from 'zod';
import type { Tx } from '@/db/client';
import { siteLeakMethods as m } from '@/db/schema/charge-additions';
import { history } from '@/db/schema/history';
import { whoTheyAre } from '@/lib/recoveries/who';
import { LEAK_RATE_METHODS } from '@/lib/vocabulary';
import type { SiteMethod } from './contract';

const rowSchema = z.object({ method: z.enum(LEAK_RATE_METHODS) });

/** Which method a site keeps to, and every choice before it. */
export const getSiteMethod = async (tx: Tx, siteId: string): Promise<SiteMethod> => {
  const [chosen] = await tx.select().from(m).where(eq(m.siteId, siteId));
  if (!chosen) return { method: null, version: 0, history: [] };
  const entries = await tx
    .select()
    .from(history)
    .where(and(eq(history.tableName, 'site_leak_methods'), eq(history.rowId, chosen.id)))
    .orderBy(desc(history.entryNo));
  const nameOf = await whoTheyAre(
    tx,
    entries.map(({ actor }) => actor),
  );
  return {
    method: chosen.method,
    version: chosen.version,
    history: entries.map(({ actor, reason, changedAt, after }) => ({
      method: rowSchema.parse(after).method,
      who: nameOf(actor),
      changedAt: new Date(changedAt).toISOString(),
      why: reason,
    })),
  };
};
