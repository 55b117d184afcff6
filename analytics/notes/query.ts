import 'server-only';
import { and, asc, count, desc, eq, gte, lt } from 'drizzle-orm';
import { dayAfter, firstDay } from '@/analytics/scope';
import type { Tx } from '@/db/client';
import { notes } from '@/db/schema/notes';
import { whoTheyAre } from '@/lib/recoveries/who';
import type { Note, NotesList, NotesQuery } from './contract';

/** As many notes as a chart and its table can bear. */
const MOST_NOTES = 500;

const columns = {
  id: notes.id,
  from: notes.fromDay,
  to: notes.toDay,
  text: notes.text,
  writtenBy: notes.writtenBy,
  writtenAt: notes.createdAt,
  version: notes.version,
};

const iso = (instant: string): string => new Date(instant).toISOString();

/** Notes of which at least one day lies in the period, the earliest first. */
export const getNotes = async (tx: Tx, { from, to }: NotesQuery): Promise<NotesList> => {
  const touching = and(
    from ? gte(notes.toDay, firstDay(from)) : undefined,
    to ? lt(notes.fromDay, dayAfter(to)) : undefined,
  );
  const rows = await tx
    .select(columns)
    .from(notes)
    .where(touching)
    .orderBy(asc(notes.fromDay), asc(notes.createdAt), asc(notes.id))
    .limit(MOST_NOTES);
  const [all] = await tx.select({ total: count() }).from(notes).where(touching);
  const nameOf = await whoTheyAre(
    tx,
    rows.map(({ writtenBy }) => writtenBy),
  );
  return {
    items: rows.map((row) => ({ ...row, writtenBy: nameOf(row.writtenBy), writtenAt: iso(row.writtenAt) })),
    total: all?.total ?? 0,
  };
};

/** The notes written since a day, the newest first. */
export const getLatestNotes = async (tx: Tx, since: string, most: number): Promise<Note[]> => {
  const rows = await tx
    .select(columns)
    .from(notes)
    .where(gte(notes.createdAt, since))
    .orderBy(desc(notes.createdAt), asc(notes.id))
    .limit(most);
  const nameOf = await whoTheyAre(
    tx,
    rows.map(({ writtenBy }) => writtenBy),
  );
  return rows.map((row) => ({ ...row, writtenBy: nameOf(row.writtenBy), writtenAt: iso(row.writtenAt) }));
};

/** One note; undefined when the company has none with this id. */
export const getNote = async (tx: Tx, id: string): Promise<Note | undefined> => {
  const [row] = await tx.select(columns).from(notes).where(eq(notes.id, id));
  if (!row) return undefined;
  const nameOf = await whoTheyAre(tx, [row.writtenBy]);
  return { ...row, writtenBy: nameOf(row.writtenBy), writtenAt: iso(row.writtenAt) };
};
