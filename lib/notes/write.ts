import 'server-only';
import { and, eq } from 'drizzle-orm';
import { type Tx, withCompany } from '@/db/client';
import { notes } from '@/db/schema/notes';
import { scopeOf, type Viewer } from '@/lib/auth/viewer';
import { badInput, conflict, notFound } from '@/lib/errors';
import type { NoteBody, NoteChange } from './body';

/** Pins a note; gives its id. */
export const createNote = (viewer: Viewer, { from, to = from, text }: NoteBody): Promise<string> =>
  withCompany(scopeOf(viewer), async (tx) => {
    const [row] = await tx
      .insert(notes)
      .values({ companyId: viewer.companyId, fromDay: from, toDay: to, text, writtenBy: viewer.actor })
      .returning({ id: notes.id });
    if (!row) throw new Error('A note that was written has no id');
    return row.id;
  });

const ofId = (viewer: Viewer, id: string) => and(eq(notes.companyId, viewer.companyId), eq(notes.id, id));

/** The note as it stands, held until the transaction ends; throws 404 when there is none, 409 when it is newer. */
const holdNote = async (tx: Tx, viewer: Viewer, id: string, version: number) => {
  const [stored] = await tx.select().from(notes).where(ofId(viewer, id)).for('update');
  if (!stored) throw notFound('This note');
  if (stored.version !== version)
    throw conflict('Somebody changed this note since you opened it. Look at it as it is now, then try again.');
  return stored;
};

/**
 * Changes a note. Throws 404 when there is none, 409 when somebody changed it since `version`, 400 when its end would
 * come before its beginning.
 */
export const changeNote = (viewer: Viewer, id: string, { version, from, to, text }: NoteChange): Promise<void> =>
  withCompany(scopeOf(viewer), async (tx) => {
    const stored = await holdNote(tx, viewer, id, version);
    const changed = { fromDay: from ?? stored.fromDay, toDay: to ?? stored.toDay, text: text ?? stored.text };
    if (changed.toDay < changed.fromDay)
      throw badInput([{ path: from ? 'from' : 'to', message: 'The end lies before the beginning' }]);
    await tx.update(notes).set(changed).where(ofId(viewer, id));
  });

/** Takes a note away; what it said stays in the history. Throws 404 when there is none, 409 when it is newer. */
export const deleteNote = (viewer: Viewer, id: string, version: number): Promise<void> =>
  withCompany(scopeOf(viewer), async (tx) => {
    await holdNote(tx, viewer, id, version);
    await tx.delete(notes).where(ofId(viewer, id));
  });
