import 'server-only';
import { and, asc, eq } from 'drizzle-orm';
import { type Tx, withCompany } from '@/db/client';
import { flags } from '@/db/schema/flags';
import { memberships, people } from '@/db/schema/people';
import { recoveries } from '@/db/schema/recoveries';
import { may } from '@/lib/auth/permissions';
import { scopeOf, type Viewer } from '@/lib/auth/viewer';
import { badInput, notFound } from '@/lib/errors';
import type { AssignmentBody } from './body';

const getMembers = (tx: Tx, companyId: string) =>
  tx
    .select({
      id: memberships.personId,
      name: people.name,
      role: memberships.role,
      technicianId: memberships.technicianId,
    })
    .from(memberships)
    .innerJoin(people, eq(people.id, memberships.personId))
    .where(eq(memberships.companyId, companyId))
    .orderBy(asc(people.name));

/** Who may be asked to look at a flag: members who read flags. */
export const getAssignable = async (tx: Tx, companyId: string) =>
  (await getMembers(tx, companyId))
    .filter(({ role }) => may(role, 'flags:read'))
    .map(({ id, name, role }) => ({ id, name, role }));

/** A technician sees his own records only, and can look at no other. */
const requireWhoSees = async (tx: Tx, viewer: Viewer, personId: string, recoveryId: string): Promise<void> => {
  const member = (await getMembers(tx, viewer.companyId)).find((one) => one.id === personId);
  if (!member || !may(member.role, 'flags:read'))
    throw badInput([{ path: 'assignedTo', message: 'Nobody of the company who may look at flags has this id' }]);
  if (member.role !== 'technician') return;
  const [record] = await tx
    .select({ technicianId: recoveries.technicianId })
    .from(recoveries)
    .where(and(eq(recoveries.companyId, viewer.companyId), eq(recoveries.id, recoveryId)));
  if (record?.technicianId !== member.technicianId)
    throw badInput([{ path: 'assignedTo', message: `${member.name} sees only the records of his own` }]);
};

/**
 * Asks somebody to look at a flag, or writes what he ought to know. Throws 404 when there is no such flag, 400 for
 * somebody who could not see it.
 */
export const assignFlag = (viewer: Viewer, id: string, { assignedTo, note }: AssignmentBody): Promise<void> =>
  withCompany(scopeOf(viewer), async (tx) => {
    const own = and(eq(flags.companyId, viewer.companyId), eq(flags.id, id));
    const [flag] = await tx.select({ recoveryId: flags.recoveryId }).from(flags).where(own).for('update');
    if (!flag) throw notFound('This flag');
    if (assignedTo) await requireWhoSees(tx, viewer, assignedTo, flag.recoveryId);
    await tx
      .update(flags)
      .set({ ...(assignedTo !== undefined ? { assignedTo } : {}), ...(note !== undefined ? { note } : {}) })
      .where(own);
  });
