import { z } from 'zod';
import { coachingSchema } from '@/analytics/coaching/contract';
import { getCoaching } from '@/analytics/coaching/query';
import { withCompany } from '@/db/client';
import { throwBadInput } from '@/lib/api/problem';
import { json, jsonBody, searchInput, withViewer } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';
import { coachingChange, coachingDeletion } from '@/lib/coaching/body';
import { changeCoaching, deleteCoaching } from '@/lib/coaching/write';
import { notFound } from '@/lib/errors';

type Context = RouteContext<'/api/coaching/[id]'>;

const idOf = async ({ params }: Context): Promise<string> => {
  const id = z.uuid().safeParse((await params).id);
  if (!id.success) throw notFound('This coaching');
  return id.data;
};

/** Changes a coaching or writes down what came of it: { version, startedOn, plan, endedOn, outcome }. */
export const PATCH = withViewer('coaching:write', async (request, viewer, context: Context) => {
  const id = await idOf(context);
  await changeCoaching(viewer, id, await jsonBody(request, coachingChange));
  const coaching = await withCompany(scopeOf(viewer), (tx) => getCoaching(tx, id));
  if (!coaching) throw notFound('This coaching');
  return json(coachingSchema.parse(coaching));
});

/** Takes a coaching away, in the version that was seen: ?version=2. */
export const DELETE = withViewer('coaching:write', async (request, viewer, context: Context) => {
  const id = await idOf(context);
  const query = coachingDeletion.safeParse(searchInput(request.url));
  if (!query.success) return throwBadInput(query.error);
  await deleteCoaching(viewer, id, query.data.version);
  return json({ id });
});
