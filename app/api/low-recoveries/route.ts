import { lowRecoveriesList } from '@/analytics/low-recoveries/contract';
import { getLowRecoveries } from '@/analytics/low-recoveries/query';
import { readCompany } from '@/db/client';
import { getKeptRoute } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';

/** Recoveries below the lower fence of their like jobs. */
export const GET = getKeptRoute(lowRecoveriesList, (query, viewer) =>
  readCompany(scopeOf(viewer), (tx) => getLowRecoveries(tx, query)),
);
