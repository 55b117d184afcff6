import 'server-only';
import { and, eq } from 'drizzle-orm';
import { type Tx, withCompany } from '@/db/client';
import { coaching } from '@/db/schema/coaching';
import { technicians } from '@/db/schema/places';
import { scopeOf, type Viewer } from '@/lib/auth/viewer';
import { badInput, conflict, notFound } from '@/lib/errors';
import type { CoachingBody, CoachingChange } from './body';

/** Writes down what was agreed with a technician; gives its id. Throws 400 when the company has no such technician. */
export const createCoaching = (viewer: Viewer, body: CoachingBody): Promise<string> =>
  withCompany(scopeOf(viewer), async (tx) => {
    const { companyId, actor } = viewer;
    const who = and(eq(technicians.companyId, companyId), eq(technicians.id, body.technicianId));
    const [known] = await tx.select({ id: technicians.id }).from(technicians).where(who);
    if (!known) throw badInput([{ path: 'technicianId', message: 'The company has no such technician' }]);
    const [row] = await tx
      .insert(coaching)
      .values({ companyId, ...body, writtenBy: actor })
      .returning({ id: coaching.id });
    if (!row) throw new Error('A coaching that was written has no id');
    return row.id;
  });

const ofId = (viewer: Viewer, id: string) => and(eq(coaching.companyId, viewer.companyId), eq(coaching.id, id));

/** The coaching as it stands, held until the transaction ends; throws 404 when there is none, 409 when it is newer. */
const hold = async (tx: Tx, viewer: Viewer, id: string, version: number) => {
  const [stored] = await tx.select().from(coaching).where(ofId(viewer, id)).for('update');
  if (!stored) throw notFound('This coaching');
  if (stored.version !== version)
    throw conflict('Somebody changed this coaching since you opened it. Look at it as it is now, then try again.');
  return stored;
};

/**
 * Changes a coaching, or writes down what came of it. Throws 404 when there is none, 409 when somebody changed it since
 * `version`, 400 when its end would come before its beginning.
 */
export const changeCoaching = (viewer: Viewer, id: string, { version, ...changes }: CoachingChange): Promise<void> =>
  withCompany(scopeOf(viewer), async (tx) => {
    const stored = await hold(tx, viewer, id, version);
    const { startedOn = stored.startedOn, plan = stored.plan } = changes;
    const { endedOn = stored.endedOn, outcome = stored.outcome } = changes;
    if (endedOn && endedOn < startedOn)
      throw badInput([
        { path: changes.startedOn ? 'startedOn' : 'endedOn', message: 'The end lies before the beginning' },
      ]);
    await tx.update(coaching).set({ startedOn, plan, endedOn, outcome }).where(ofId(viewer, id));
  });

/** Takes a coaching away; what it said stays in the history. Throws 404 when there is none, 409 when it is newer. */
export const deleteCoaching = (viewer: Viewer, id: string, version: number): Promise<void> =>
  withCompany(scopeOf(viewer), async (tx) => {
    await hold(tx, viewer, id, version);
    await tx.delete(coaching).where(ofId(viewer, id));
  });
