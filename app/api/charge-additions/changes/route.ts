import { getAdditionChanges } from '@/analytics/charge-additions/changes';
import { additionChanges } from '@/analytics/charge-additions/contract';
import { readCompany } from '@/db/client';
import { getRoute } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';

/** Every change of the additions of an appliance, removals included. */
export const GET = getRoute(additionChanges, ({ appliance }, viewer) =>
  readCompany(scopeOf(viewer), (tx) => getAdditionChanges(tx, appliance)),
);
