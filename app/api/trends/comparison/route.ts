import { trendsComparison } from '@/analytics/trends-comparison/contract';
import { getTrendsComparison } from '@/analytics/trends-comparison/query';
import { readCompany } from '@/db/client';
import { getKeptRoute } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';
import { todayIn } from '@/lib/recoveries/local-time';

/** A period against the same one a year before, or another chosen one, like for like. */
export const GET = getKeptRoute(trendsComparison, (query, viewer) =>
  readCompany(scopeOf(viewer), (tx) => getTrendsComparison(tx, query, todayIn(viewer.timeZone))),
);
