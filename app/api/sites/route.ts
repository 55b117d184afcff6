import { siteRecoveries } from '@/analytics/sites/contract';
import { getSiteRecoveries } from '@/analytics/sites/query';
import { readCompany } from '@/db/client';
import { getKeptRoute } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';

/** What was recovered at each site. */
export const GET = getKeptRoute(siteRecoveries, (scope, viewer) =>
  readCompany(scopeOf(viewer), (tx) => getSiteRecoveries(tx, scope)),
);
