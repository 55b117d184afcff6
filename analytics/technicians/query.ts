import 'server-only';
import { byName, countedInScope, groupFigures, readyFigures } from '@/analytics/grouped-figures/query';
import { isWhole, type Scope } from '@/analytics/scope';
import type { Tx } from '@/db/client';
import { recoveredByTechnician as ready } from '@/db/views/recovered-by-group';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { compareCrewOf, type StandingComparison, withoutTechnicians } from './comparison';
import type { TechnicianRecoveries } from './contract';
import { judgementRow } from './judgement';

const ofEveryRecord = (tx: Tx) =>
  tx
    .select({ technician: ready.name, technicianId: ready.groupId, ...readyFigures(ready) })
    .from(ready)
    .orderBy(byName(ready.name), ready.groupId);

const ofScope = (tx: Tx, scope: Scope) =>
  tx
    .select({ technician: f.technician, technicianId: f.technicianId, ...groupFigures })
    .from(f)
    .where(countedInScope(scope))
    .groupBy(f.technicianId, f.technician)
    .orderBy(byName(f.technician), f.technicianId);

const judgedOn = ({
  comparison: { technicians, crew },
  ...standing
}: StandingComparison): TechnicianRecoveries['judgedOn'] => ({
  recoveries: technicians.reduce((sum, own) => sum + own.recoveries, 0),
  technicians: crew.judged,
  spreadKnown: crew.spreadKnown,
  centre: crew.centre,
  normalSpread: crew.normalSpread,
  ...standing,
});

/**
 * Each technician with a record that counts in scope, by name, and how he compares with all who worked in it: a scope
 * that names technicians still compares them with the others. `timeZone` is the company's.
 */
export const getTechnicianRecoveries = async (
  tx: Tx,
  scope: Scope,
  { companyId, timeZone }: { companyId: string; timeZone: string },
): Promise<TechnicianRecoveries> => {
  const rows = await (isWhole(scope) ? ofEveryRecord(tx) : ofScope(tx, scope));
  const standing = await compareCrewOf(tx, companyId, withoutTechnicians(scope), timeZone);
  const byId = new Map(standing.comparison.technicians.map((own) => [own.technicianId, own]));
  const items = rows.flatMap((row) => {
    const own = byId.get(row.technicianId);
    return own ? [{ ...row, ...judgementRow(row.technician, own) }] : [];
  });
  return { items, judgedOn: judgedOn(standing) };
};
