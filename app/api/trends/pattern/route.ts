import { monthlyPattern } from '@/analytics/monthly-pattern/contract';
import { getMonthlyPattern } from '@/analytics/monthly-pattern/query';
import { readCompany } from '@/db/client';
import { getKeptRoute } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';

/** Season, trend and unusual months. */
export const GET = getKeptRoute(monthlyPattern, (query, viewer) =>
  readCompany(scopeOf(viewer), (tx) => getMonthlyPattern(tx, query, { now: new Date(), timeZone: viewer.timeZone })),
);
