import { siteMethodSchema } from '@/analytics/leak-rate/contract';
import { getSiteMethod } from '@/analytics/leak-rate/method-query';
import { readCompany } from '@/db/client';
import { idOf } from '@/lib/api/id-of';
import { json, jsonBody, withViewer } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';
import { chooseMethod, methodBody } from '@/lib/charge-additions/settings';

type Context = RouteContext<'/api/sites/[id]/leak-method'>;

/** Chooses the method of a site: { method, version, why }. */
export const PUT = withViewer('leaks:write', async (request, viewer, context: Context) => {
  const id = await idOf(context, 'This site');
  await chooseMethod(viewer, id, await jsonBody(request, methodBody));
  return json(siteMethodSchema.parse(await readCompany(scopeOf(viewer), (tx) => getSiteMethod(tx, id))));
});
