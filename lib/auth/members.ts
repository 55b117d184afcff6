import 'server-only';
import { randomUUID } from 'node:crypto';
import { and, asc, eq, sql } from 'drizzle-orm';
import { addSettings, type CompanyScope, type Tx, withCompany, withKnowledge } from '@/db/client';
import { memberships, people } from '@/db/schema/people';
import { technicians } from '@/db/schema/places';
import { AppError, badInput, conflict, notFound } from '@/lib/errors';
import type { Role } from '@/lib/vocabulary';

/** Somebody of the company as the owner sees him. */
export type Member = {
  personId: string;
  name: string;
  email: string;
  role: Role;
  technicianId: string | null;
  technician: string | null;
  /** False until the password link was used. */
  hasPassword: boolean;
};

/** Everybody of the company, by name. */
export const listMembers = (scope: CompanyScope): Promise<Member[]> =>
  withCompany(scope, (tx) =>
    tx
      .select({
        personId: people.id,
        name: people.name,
        email: people.email,
        role: memberships.role,
        technicianId: memberships.technicianId,
        technician: technicians.name,
        hasPassword: sql<boolean>`${people.passwordHash} is not null`,
      })
      .from(memberships)
      .innerJoin(people, eq(people.id, memberships.personId))
      .leftJoin(
        technicians,
        and(eq(technicians.companyId, memberships.companyId), eq(technicians.id, memberships.technicianId)),
      )
      .orderBy(asc(people.name)),
  );

/** Technicians that an account can be tied to, by name. */
export const listLinkableTechnicians = (scope: CompanyScope): Promise<{ id: string; name: string }[]> =>
  withCompany(scope, (tx) =>
    tx
      .select({ id: technicians.id, name: technicians.name })
      .from(technicians)
      .where(eq(technicians.active, true))
      .orderBy(asc(technicians.name)),
  );

const emailTaken = (email: string) =>
  withKnowledge({ sign_in_email: email }, async (tx) => {
    const found = await tx
      .select({ id: people.id })
      .from(people)
      .where(eq(sql`lower(${people.email})`, email.toLowerCase()));
    return found.length > 0;
  });

const linked = (role: Role, technicianId: string | null) => (role === 'technician' ? technicianId : null);

const requireTechnician = async (tx: Tx, companyId: string, role: Role, technicianId: string | null) => {
  if (role !== 'technician') return;
  const [found] = technicianId
    ? await tx
        .select({ id: technicians.id })
        .from(technicians)
        .where(and(eq(technicians.companyId, companyId), eq(technicians.id, technicianId)))
    : [];
  if (!found)
    throw badInput([{ path: 'technicianId', message: 'Choose which technician of the records this person is.' }]);
};

/**
 * Adds a new person; gives the id. An address that is known already is refused, whoever it belongs to: a link made here
 * would otherwise open what that person may see elsewhere.
 */
export const inviteMember = async (
  scope: CompanyScope,
  member: { email: string; name: string; role: Role; technicianId: string | null },
): Promise<string> => {
  if (await emailTaken(member.email))
    throw badInput([
      {
        path: 'email',
        message: 'This address signs in already. Choose another one, or change the person in the list.',
      },
    ]);
  const { companyId } = scope;
  const personId = randomUUID();
  await withCompany(scope, async (tx) => {
    await requireTechnician(tx, companyId, member.role, member.technicianId);
    await addSettings(tx, { person_id: personId });
    await tx.insert(people).values({ id: personId, email: member.email, name: member.name });
    await tx.insert(memberships).values({
      companyId,
      personId,
      role: member.role,
      technicianId: linked(member.role, member.technicianId),
    });
  });
  return personId;
};

// Locked, so that two owners cannot take each other's role at the same time.
const requireAnotherOwner = async (tx: Tx, companyId: string, personId: string) => {
  const owners = await tx
    .select({ personId: memberships.personId })
    .from(memberships)
    .where(and(eq(memberships.companyId, companyId), eq(memberships.role, 'owner')))
    .for('update');
  if (owners.length === 1 && owners[0]?.personId === personId)
    throw conflict('This is the only owner. Make somebody else owner first, so that the company keeps one.');
};

/** Gives a member another role; throws when the company would be left without an owner. */
export const changeRole = (
  scope: CompanyScope,
  personId: string,
  role: Role,
  technicianId: string | null,
): Promise<void> =>
  withCompany(scope, async (tx) => {
    const { companyId } = scope;
    if (role !== 'owner') await requireAnotherOwner(tx, companyId, personId);
    await requireTechnician(tx, companyId, role, technicianId);
    const changed = await tx
      .update(memberships)
      .set({ role, technicianId: linked(role, technicianId) })
      .where(and(eq(memberships.companyId, companyId), eq(memberships.personId, personId)))
      .returning({ personId: memberships.personId });
    if (!changed.length) throw notFound('This person');
  });

/** Takes a member out of the company; what he could open closes with his next request. */
export const removeMember = (scope: CompanyScope, personId: string): Promise<void> =>
  withCompany(scope, async (tx) => {
    const { companyId } = scope;
    await requireAnotherOwner(tx, companyId, personId);
    const removed = await tx
      .delete(memberships)
      .where(and(eq(memberships.companyId, companyId), eq(memberships.personId, personId)))
      .returning({ personId: memberships.personId });
    if (!removed.length) throw notFound('This person');
  });

/** Throws unless the person belongs to this company and to no other: a password opens all of a person's companies. */
export const requireOnlyHere = (scope: CompanyScope, personId: string): Promise<void> =>
  withCompany(scope, async (tx) => {
    const [here] = await tx
      .select({ personId: memberships.personId })
      .from(memberships)
      .where(and(eq(memberships.companyId, scope.companyId), eq(memberships.personId, personId)));
    if (!here) throw notFound('This person');
    await addSettings(tx, { person_id: personId });
    const all = await tx
      .select({ companyId: memberships.companyId })
      .from(memberships)
      .where(eq(memberships.personId, personId));
    if (all.length > 1)
      throw new AppError(
        403,
        'Belongs to another company too',
        'This person works for another company too. A new password would open that one as well, so it can only be set from the command line.',
      );
  });
