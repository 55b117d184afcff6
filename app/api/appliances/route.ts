import { applianceRecoveries } from '@/analytics/appliances/contract';
import { getApplianceRecoveries } from '@/analytics/appliances/query';
import { keptSuspicion } from '@/analytics/leak-suspicion/kept';
import { readCompany } from '@/db/client';
import { getKeptRoute } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';

/** What was recovered from each appliance. */
export const GET = getKeptRoute(applianceRecoveries, async (scope, viewer) => {
  const suspicion = await keptSuspicion(viewer);
  return readCompany(scopeOf(viewer), (tx) => getApplianceRecoveries(tx, scope, suspicion));
});
