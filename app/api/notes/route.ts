import { noteSchema, notesList } from '@/analytics/notes/contract';
import { getNote, getNotes } from '@/analytics/notes/query';
import { readCompany, withCompany } from '@/db/client';
import { getRoute, json, jsonBody, withViewer } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';
import { noteBody } from '@/lib/notes/body';
import { createNote } from '@/lib/notes/write';

/** The notes that touch a period. */
export const GET = getRoute(notesList, (query, viewer) => readCompany(scopeOf(viewer), (tx) => getNotes(tx, query)));

/** Pins a note to a day or to a range of days: { from, to, text }. */
export const POST = withViewer('notes:write', async (request, viewer) => {
  const id = await createNote(viewer, await jsonBody(request, noteBody));
  const note = await withCompany(scopeOf(viewer), (tx) => getNote(tx, id));
  return json(noteSchema.parse(note), 201);
});
