import { cylinderContentContract } from '@/analytics/records/cylinder-content-contract';
import { getCylinderContent } from '@/analytics/records/cylinder-content-query';
import { withCompany } from '@/db/client';
import { getRoute } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';

/** What a cylinder holds, as far as the records tell. */
export const GET = getRoute(cylinderContentContract, ({ name }, viewer) =>
  withCompany(scopeOf(viewer), (tx) => getCylinderContent(tx, name)),
);
