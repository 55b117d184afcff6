import { z } from 'zod';
import { noteSchema } from '@/analytics/notes/contract';
import { getNote } from '@/analytics/notes/query';
import { withCompany } from '@/db/client';
import { throwBadInput } from '@/lib/api/problem';
import { json, jsonBody, searchInput, withViewer } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';
import { notFound } from '@/lib/errors';
import { noteChange, noteDeletion } from '@/lib/notes/body';
import { changeNote, deleteNote } from '@/lib/notes/write';

type Context = RouteContext<'/api/notes/[id]'>;

const noteIdOf = async ({ params }: Context): Promise<string> => {
  const id = z.uuid().safeParse((await params).id);
  if (!id.success) throw notFound('This note');
  return id.data;
};

/** Changes a note: { version, from, to, text }. */
export const PATCH = withViewer('notes:write', async (request, viewer, context: Context) => {
  const id = await noteIdOf(context);
  await changeNote(viewer, id, await jsonBody(request, noteChange));
  const note = await withCompany(scopeOf(viewer), (tx) => getNote(tx, id));
  if (!note) throw notFound('This note');
  return json(noteSchema.parse(note));
});

/** Takes a note away, in the version that was seen: ?version=2. */
export const DELETE = withViewer('notes:write', async (request, viewer, context: Context) => {
  const id = await noteIdOf(context);
  const query = noteDeletion.safeParse(searchInput(request.url));
  if (!query.success) return throwBadInput(query.error);
  await deleteNote(viewer, id, query.data.version);
  return json({ id });
});
