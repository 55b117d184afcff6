import 'server-only';
import { readRevision } from '@/analytics/record-digest/revision';
import { isWhole, type Scope } from '@/analytics/scope';
import { compareTechnicians, type TechnicianComparison } from '@/analytics/technician-comparison/compare-technicians';
import type { Tx } from '@/db/client';
import { readComparedRecoveries, readEarlierJobs } from './compared-rows';
import { keptComparison } from './kept-comparison';

/** A comparison with the records it stands on: where history ended in them, and whether nothing has changed since. */
export type StandingComparison = {
  comparison: TechnicianComparison;
  revision: number;
  madeAt: string;
  current: boolean;
};

/** So many records are compared while somebody waits; of more, the comparison of the last digest is given. */
const COMPARED_AT_ONCE = 5_000;

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

const recordsOf = ({ technicians }: TechnicianComparison): number =>
  technicians.reduce((sum, own) => sum + own.recoveries, 0);

/**
 * How everybody who worked in a scope compares. Over all records it stands ready as the last digest left it; when a
 * change is not in that one yet, few records are compared anew, and of many the answer says that it is not current.
 */
export const compareCrewOf = async (
  tx: Tx,
  companyId: string,
  crewScope: Scope,
  timeZone: string,
): Promise<StandingComparison> => {
  const kept = isWhole(crewScope) ? await keptComparison(tx) : null;
  if (kept && (kept.current || recordsOf(kept.comparison) > COMPARED_AT_ONCE)) return kept;
  const { recoveries, earlierJobs } = await readCrew(tx, crewScope, timeZone);
  const comparison = compareTechnicians(recoveries, { earlierJobs });
  return { comparison, revision: await readRevision(tx, companyId), madeAt: new Date().toISOString(), current: true };
};
