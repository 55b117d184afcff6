import { explain } from '@/analytics/explain/contract';
import { getExplained } from '@/analytics/explain/query';
import { isComparison, isFlagFigure } from '@/analytics/figures/measures';
import { readCompany } from '@/db/client';
import { getRoute } from '@/lib/api/route';
import { may } from '@/lib/auth/permissions';
import { scopeOf } from '@/lib/auth/viewer';
import { forbidden } from '@/lib/errors';

/** How one figure was computed and which records make it; what is flagged is for who reads flags, like jobs for who decides them. */
export const GET = getRoute(explain, (query, viewer) => {
  if (isFlagFigure(query.measure) && !may(viewer.role, 'flags:read')) throw forbidden();
  if (isComparison(query.measure) && !may(viewer.role, 'flags:decide')) throw forbidden();
  return readCompany(scopeOf(viewer), (tx) => getExplained(tx, query));
});
