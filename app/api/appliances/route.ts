import { applianceRecoveries } from '@/analytics/appliances/contract';
import { getApplianceRecoveries } from '@/analytics/appliances/query';
import { readCompany } from '@/db/client';
import { getKeptRoute } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';

/** What was recovered from each appliance. */
export const GET = getKeptRoute(applianceRecoveries, (scope, viewer) =>
  readCompany(scopeOf(viewer), (tx) => getApplianceRecoveries(tx, scope)),
);
