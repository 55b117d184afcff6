import { siteHistorySchema } from '@/analytics/visits/contract';
import { getSiteHistory } from '@/analytics/visits/query';
import { readCompany } from '@/db/client';
import { idOf } from '@/lib/api/id-of';
import { json, withViewer } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';
import { notFound } from '@/lib/errors';

/** One site and its recoveries of all time. */
export const GET = withViewer('sites:read', async (_request, viewer, context: RouteContext<'/api/sites/[id]'>) => {
  const id = await idOf(context, 'This site');
  const found = await readCompany(scopeOf(viewer), (tx) => getSiteHistory(tx, id));
  if (!found) throw notFound('This site');
  return json(siteHistorySchema.parse(found));
});
