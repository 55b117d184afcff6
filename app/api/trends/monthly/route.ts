import { monthlyTrends } from '@/analytics/monthly-trends/contract';
import { getMonthlyTrends } from '@/analytics/monthly-trends/query';
import { readCompany } from '@/db/client';
import { getKeptRoute } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';

/** Recovered mass by month, split by one dimension. */
export const GET = getKeptRoute(monthlyTrends, (query, viewer) =>
  readCompany(scopeOf(viewer), (tx) => getMonthlyTrends(tx, query, { now: new Date(), timeZone: viewer.timeZone })),
);
