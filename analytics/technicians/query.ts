import 'server-only';
import { byName, countedInScope, groupFigures } from '@/analytics/grouped-figures/query';
import type { Scope } from '@/analytics/scope';
import type { Tx } from '@/db/client';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import type { TechnicianRecoveries } from './contract';

/** Each technician with a record that counts in scope, by name. */
export const getTechnicianRecoveries = async (tx: Tx, scope: Scope): Promise<TechnicianRecoveries> => ({
  items: await tx
    .select({ technician: f.technician, technicianId: f.technicianId, ...groupFigures })
    .from(f)
    .where(countedInScope(scope))
    .groupBy(f.technicianId, f.technician)
    .orderBy(byName(f.technician), f.technicianId),
});
