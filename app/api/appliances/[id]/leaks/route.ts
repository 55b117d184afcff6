import { applianceLeaksSchema } from '@/analytics/leak-rate/contract';
import { getApplianceLeaks } from '@/analytics/leak-rate/places-query';
import { readCompany } from '@/db/client';
import { idOf } from '@/lib/api/id-of';
import { json, withViewer } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';

type Context = RouteContext<'/api/appliances/[id]/leaks'>;

/** What one appliance took in, lost and is suspected of. */
export const GET = withViewer('leaks:read', async (_request, viewer, context: Context) => {
  const id = await idOf(context, 'This appliance');
  return json(applianceLeaksSchema.parse(await readCompany(scopeOf(viewer), (tx) => getApplianceLeaks(tx, id))));
});
