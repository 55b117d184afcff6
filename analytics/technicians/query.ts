import 'server-only';
import { byName, countedInScope, groupFigures, readyFigures } from '@/analytics/grouped-figures/query';
import { isWhole, type Scope } from '@/analytics/scope';
import type { Tx } from '@/db/client';
import { recoveredByTechnician as ready } from '@/db/views/recovered-by-group';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import type { TechnicianRecoveries } from './contract';

const ofEveryRecord = (tx: Tx) =>
  tx
    .select({ technician: ready.name, technicianId: ready.groupId, ...readyFigures(ready) })
    .from(ready)
    .orderBy(byName(ready.name), ready.groupId);

const inScope = (tx: Tx, scope: Scope) =>
  tx
    .select({ technician: f.technician, technicianId: f.technicianId, ...groupFigures })
    .from(f)
    .where(countedInScope(scope))
    .groupBy(f.technicianId, f.technician)
    .orderBy(byName(f.technician), f.technicianId);

/** Each technician with a record that counts in scope, by name. */
export const getTechnicianRecoveries = async (tx: Tx, scope: Scope): Promise<TechnicianRecoveries> => ({
  items: await (isWhole(scope) ? ofEveryRecord(tx) : inScope(tx, scope)),
});
