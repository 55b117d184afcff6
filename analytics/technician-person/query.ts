import 'server-only';
import { asc, eq } from 'drizzle-orm';
import type { Scope } from '@/analytics/scope';
import { compareTechnician } from '@/analytics/technician-comparison/compare-technicians';
import { readCrew, withoutTechnicians } from '@/analytics/technicians/comparison';
import { judgementRow } from '@/analytics/technicians/judgement';
import type { Tx } from '@/db/client';
import { coaching } from '@/db/schema/coaching';
import { technicians } from '@/db/schema/places';
import type { TechnicianPerson } from './contract';

/**
 * One technician against like jobs of everybody who worked in the scope; undefined when the company has none with this
 * id. `tx` must see the whole crew. `timeZone` is the company's.
 */
export const getTechnicianPerson = async (
  tx: Tx,
  technicianId: string,
  scope: Scope,
  timeZone: string,
): Promise<TechnicianPerson | undefined> => {
  const [known] = await tx.select({ name: technicians.name }).from(technicians).where(eq(technicians.id, technicianId));
  if (!known) return undefined;
  const coached = await tx
    .selectDistinct({ startedOn: coaching.startedOn })
    .from(coaching)
    .where(eq(coaching.technicianId, technicianId))
    .orderBy(asc(coaching.startedOn));
  const { recoveries, earlierJobs } = await readCrew(tx, withoutTechnicians(scope), timeZone);
  const days = coached.map(({ startedOn }) => startedOn);
  const { own, course } = compareTechnician(recoveries, technicianId, days, { earlierJobs });
  return {
    technician: known.name,
    technicianId,
    recoveries: own?.recoveries ?? 0,
    judgement: own ? judgementRow(known.name, own) : null,
    course,
  };
};
