import 'server-only';
import { desc, eq } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { coaching } from '@/db/schema/coaching';
import { whoTheyAre } from '@/lib/recoveries/who';
import type { Coaching, CoachingList, CoachingQuery } from './contract';

type Row = typeof coaching.$inferSelect;

const shown = (row: Row, nameOf: (actor: string) => string): Coaching => ({
  id: row.id,
  technicianId: row.technicianId,
  startedOn: row.startedOn,
  plan: row.plan,
  endedOn: row.endedOn,
  outcome: row.outcome,
  writtenBy: nameOf(row.writtenBy),
  writtenAt: new Date(row.createdAt).toISOString(),
  version: row.version,
});

const named = async (tx: Tx, rows: readonly Row[]): Promise<Coaching[]> => {
  const nameOf = await whoTheyAre(
    tx,
    rows.map(({ writtenBy }) => writtenBy),
  );
  return rows.map((row) => shown(row, nameOf));
};

/** Coachings, the latest first. */
export const getCoachings = async (tx: Tx, { technicianId }: CoachingQuery): Promise<CoachingList> => {
  const rows = await tx
    .select()
    .from(coaching)
    .where(technicianId ? eq(coaching.technicianId, technicianId) : undefined)
    .orderBy(desc(coaching.startedOn), desc(coaching.createdAt), desc(coaching.id));
  return { items: await named(tx, rows) };
};

/** One coaching; undefined when the company has none with this id. */
export const getCoaching = async (tx: Tx, id: string): Promise<Coaching | undefined> => {
  const rows = await tx.select().from(coaching).where(eq(coaching.id, id));
  return (await named(tx, rows))[0];
};
