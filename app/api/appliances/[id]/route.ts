import { applianceHistorySchema } from '@/analytics/visits/contract';
import { getApplianceHistory } from '@/analytics/visits/query';
import { readCompany } from '@/db/client';
import { idOf } from '@/lib/api/id-of';
import { json, withViewer } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';
import { notFound } from '@/lib/errors';

/** One appliance and its recoveries of all time. */
export const GET = withViewer(
  'appliances:read',
  async (_request, viewer, context: RouteContext<'/api/appliances/[id]'>) => {
    const id = await idOf(context, 'This appliance');
    const found = await readCompany(scopeOf(viewer), (tx) => getApplianceHistory(tx, id));
    if (!found) throw notFound('This appliance');
    return json(applianceHistorySchema.parse(found));
  },
);
