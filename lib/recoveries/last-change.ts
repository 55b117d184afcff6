import 'server-only';
import { and, desc, eq } from 'drizzle-orm';
import { Temporal } from 'temporal-polyfill';
import type { Tx } from '@/db/client';
import { history } from '@/db/schema/history';
import { whoTheyAre } from './who';

/** Who changed a record last, and when in the company's zone: “Maria Lopez changed this record on 2026-03-04 at 14:02”. */
export const lastChange = async (tx: Tx, id: string, timeZone: string): Promise<string> => {
  const [entry] = await tx
    .select({ actor: history.actor, changedAt: history.changedAt })
    .from(history)
    .where(and(eq(history.tableName, 'recoveries'), eq(history.rowId, id)))
    .orderBy(desc(history.entryNo))
    .limit(1);
  if (!entry) return 'Somebody changed this record';
  const who = (await whoTheyAre(tx, [entry.actor]))(entry.actor);
  const at = Temporal.Instant.fromEpochMilliseconds(Date.parse(entry.changedAt)).toZonedDateTimeISO(timeZone);
  const name = `${who.charAt(0).toUpperCase()}${who.slice(1)}`;
  return `${name} changed this record on ${at.toPlainDate()} at ${at.toPlainTime().toString({ smallestUnit: 'minute' })}`;
};
