import { additionSchema } from '@/analytics/charge-additions/contract';
import { getAddition } from '@/analytics/charge-additions/query';
import { withCompany } from '@/db/client';
import { idOf } from '@/lib/api/id-of';
import { throwBadInput } from '@/lib/api/problem';
import { json, jsonBody, searchInput, withViewer } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';
import { additionChange, additionRemoval } from '@/lib/charge-additions/body';
import { correctAddition, removeAddition } from '@/lib/charge-additions/write';
import { notFound } from '@/lib/errors';

type Context = RouteContext<'/api/charge-additions/[id]'>;

/** Corrects an addition: { version, why, … }. */
export const PATCH = withViewer('leaks:write', async (request, viewer, context: Context) => {
  const id = await idOf(context, 'This addition');
  await correctAddition(viewer, id, await jsonBody(request, additionChange));
  const addition = await withCompany(scopeOf(viewer), (tx) => getAddition(tx, id));
  if (!addition) throw notFound('This addition');
  return json(additionSchema.parse(addition));
});

/** Takes an addition out of the figures, in the version that was seen: ?version=2&why=… */
export const DELETE = withViewer('leaks:write', async (request, viewer, context: Context) => {
  const id = await idOf(context, 'This addition');
  const query = additionRemoval.safeParse(searchInput(request.url));
  if (!query.success) return throwBadInput(query.error);
  await removeAddition(viewer, id, query.data);
  return json({ id });
});
