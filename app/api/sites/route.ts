import { keptSuspicion } from '@/analytics/leak-suspicion/kept';
import { siteRecoveries } from '@/analytics/sites/contract';
import { getSiteRecoveries } from '@/analytics/sites/query';
import { readCompany } from '@/db/client';
import { getKeptRoute } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';

/** What was recovered at each site. */
export const GET = getKeptRoute(siteRecoveries, async (scope, viewer) => {
  const suspicion = await keptSuspicion(viewer);
  return readCompany(scopeOf(viewer), (tx) => getSiteRecoveries(tx, scope, suspicion));
});
