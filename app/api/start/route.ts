import { start } from '@/analytics/start/contract';
import { getStart } from '@/analytics/start/query';
import { readCompany } from '@/db/client';
import { getRoute } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';
import { todayIn } from '@/lib/recoveries/local-time';

/** What changed and what waits, as far as the viewer's role is concerned with it. */
export const GET = getRoute(start, (_query, viewer) =>
  readCompany(scopeOf(viewer), (tx) => getStart(tx, viewer.role, todayIn(viewer.timeZone))),
);
