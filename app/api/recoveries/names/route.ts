import { knownNamesContract } from '@/analytics/records/known-names-contract';
import { getKnownNames } from '@/analytics/records/known-names-query';
import { withCompany } from '@/db/client';
import { getRoute } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';

/** Names to choose from while a record is written. */
export const GET = getRoute(knownNamesContract, ({ site }, viewer) =>
  withCompany(scopeOf(viewer), (tx) => getKnownNames(tx, site)),
);
