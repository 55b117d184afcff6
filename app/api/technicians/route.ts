import { technicianRecoveries } from '@/analytics/technicians/contract';
import { getTechnicianRecoveries } from '@/analytics/technicians/query';
import { readCompany } from '@/db/client';
import { getKeptRoute } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';

/** What each technician recovered, and how that compares. */
export const GET = getKeptRoute(technicianRecoveries, (scope, viewer) =>
  readCompany(scopeOf(viewer), (tx) => getTechnicianRecoveries(tx, scope, viewer)),
);
