import { explain } from '@/analytics/explain/contract';
import { getExplained } from '@/analytics/explain/query';
import { isJudgement } from '@/analytics/figures/measures';
import { readCompany } from '@/db/client';
import { getRoute } from '@/lib/api/route';
import { may } from '@/lib/auth/permissions';
import { scopeOf } from '@/lib/auth/viewer';
import { forbidden } from '@/lib/errors';

/** How one figure was computed and which records make it; how recoveries stand among like jobs is for who reads flags. */
export const GET = getRoute(explain, (query, viewer) => {
  if (isJudgement(query.measure) && !may(viewer.role, 'flags:read')) throw forbidden();
  return readCompany(scopeOf(viewer), (tx) => getExplained(tx, query));
});
