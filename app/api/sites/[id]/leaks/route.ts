import { siteLeaksSchema } from '@/analytics/leak-rate/contract';
import { getSiteLeaks } from '@/analytics/leak-rate/places-query';
import { readCompany } from '@/db/client';
import { idOf } from '@/lib/api/id-of';
import { json, withViewer } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';

type Context = RouteContext<'/api/sites/[id]/leaks'>;

/** The method of a site and what is known of each of its appliances. */
export const GET = withViewer('leaks:read', async (_request, viewer, context: Context) => {
  const id = await idOf(context, 'This site');
  return json(siteLeaksSchema.parse(await readCompany(scopeOf(viewer), (tx) => getSiteLeaks(tx, id))));
});
