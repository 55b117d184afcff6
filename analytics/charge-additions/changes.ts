import 'server-only';
import { and, desc, eq, sql } from 'drizzle-orm';
import { z } from 'zod';
import type { Tx } from '@/db/client';
import { history } from '@/db/schema/history';
import { whoTheyAre } from '@/lib/recoveries/who';
import type { AdditionChanges } from './contract';

const MOST_CHANGES = 200;

// The history leaves out what is null.
const rowSchema = z.object({
  added_on: z.string(),
  entered_mass: z.string(),
  mass_unit: z.string(),
  reason: z.string(),
  leaks_verified_on: z.string().nullish(),
  addition_ref: z.string().nullish(),
  notes: z.string().nullish(),
});

const words = (row: Record<string, unknown> | null) => {
  if (row === null) return null;
  const said = rowSchema.parse(row);
  return {
    addedOn: said.added_on,
    addedCharge: `${said.entered_mass} ${said.mass_unit}`,
    reason: said.reason,
    leaksVerifiedOn: said.leaks_verified_on ?? null,
    additionRef: said.addition_ref ?? null,
    notes: said.notes ?? null,
  };
};

/** Every change of the additions of an appliance, removals included, the newest first. */
export const getAdditionChanges = async (tx: Tx, applianceId: string): Promise<AdditionChanges> => {
  const entries = await tx
    .select()
    .from(history)
    .where(
      and(
        eq(history.tableName, 'charge_additions'),
        sql`coalesce(${history.after}, ${history.before}) ->> 'appliance_id' = ${applianceId}`,
      ),
    )
    .orderBy(desc(history.entryNo))
    .limit(MOST_CHANGES);
  const nameOf = await whoTheyAre(tx, [...new Set(entries.map(({ actor }) => actor))]);
  return {
    items: entries.map(({ entryNo, rowId, changedAt, action, actor, reason, before, after }) => ({
      entryNo,
      additionId: rowId,
      changedAt: new Date(changedAt).toISOString(),
      action,
      who: nameOf(actor),
      why: reason,
      before: words(before),
      after: words(after),
    })),
  };
};
