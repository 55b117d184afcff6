import 'server-only';
import { byName, countedInScope, groupFigures, readyFigures } from '@/analytics/grouped-figures/query';
import { isWhole, type Scope } from '@/analytics/scope';
import { compareTechnicians, type TechnicianComparison } from '@/analytics/technician-comparison/compare-technicians';
import type { Tx } from '@/db/client';
import { recoveredByTechnician as ready } from '@/db/views/recovered-by-group';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { readComparedRecoveries, readEarlierJobs } from './compared-rows';
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

/** The scope with everybody in it. */
export const withoutTechnicians = ({ technician: _named, except, ...scope }: Scope): Scope => {
  const others = except?.filter((part) => part !== 'technician');
  return others?.length ? { ...scope, except: others } : scope;
};

/** The recoveries of everybody who worked in a scope, and what each did before it. `timeZone` is the company's. */
export const readCrew = async (tx: Tx, crewScope: Scope, timeZone: string) => {
  const earlierJobs = await readEarlierJobs(tx, crewScope);
  return { recoveries: await readComparedRecoveries(tx, crewScope, timeZone), earlierJobs };
};

const judgedOn = ({ technicians, crew }: TechnicianComparison): TechnicianRecoveries['judgedOn'] => ({
  recoveries: technicians.reduce((sum, own) => sum + own.recoveries, 0),
  technicians: crew.judged,
  spreadKnown: crew.spreadKnown,
  centre: crew.centre,
  normalSpread: crew.normalSpread,
});

/**
 * Each technician with a record that counts in scope, by name, and how he compares with all who worked in it: a scope
 * that names technicians still compares them with the others. `timeZone` is the company's.
 */
export const getTechnicianRecoveries = async (
  tx: Tx,
  scope: Scope,
  timeZone: string,
): Promise<TechnicianRecoveries> => {
  const rows = await (isWhole(scope) ? ofEveryRecord(tx) : ofScope(tx, scope));
  const { recoveries, earlierJobs } = await readCrew(tx, withoutTechnicians(scope), timeZone);
  const comparison = compareTechnicians(recoveries, { earlierJobs });
  const byId = new Map(comparison.technicians.map((own) => [own.technicianId, own]));
  const items = rows.flatMap((row) => {
    const own = byId.get(row.technicianId);
    return own ? [{ ...row, ...judgementRow(row.technician, own) }] : [];
  });
  return { items, judgedOn: judgedOn(comparison) };
};
