import { assignableList } from '@/analytics/flags/contract';
import { readCompany } from '@/db/client';
import { getRoute } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';
import { getAssignable } from '@/lib/flags/assign';

/** Who may be asked to look at a flag. */
export const GET = getRoute(assignableList, async (_query, viewer) => ({
  items: await readCompany(scopeOf(viewer), (tx) => getAssignable(tx, viewer.companyId)),
}));
