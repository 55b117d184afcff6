import 'server-only';
import { randomUUID } from 'node:crypto';
import { and, eq } from 'drizzle-orm';
import { DatabaseError } from 'pg';
import { v5 as uuidFromName } from 'uuid';
import { type Tx, withCompany } from '@/db/client';
import { chargeAdditions as a } from '@/db/schema/charge-additions';
import { appliances } from '@/db/schema/places';
import { scopeOf, type Viewer } from '@/lib/auth/viewer';
import { AppError, badInput, conflict, notFound } from '@/lib/errors';
import { todayIn } from '@/lib/recoveries/local-time';
import type { AdditionBody, AdditionChange, AdditionRemoval } from './body';
import { type AdditionFacts, checkAddition } from './checked';

const ofId = (viewer: Viewer, id: string) => and(eq(a.companyId, viewer.companyId), eq(a.id, id));

const checkedKg = (facts: AdditionFacts, viewer: Viewer): string => {
  const checked = checkAddition(facts, todayIn(viewer.timeZone));
  if (!checked.ok) throw badInput(checked.errors);
  return checked.addedChargeKg;
};

const refusingTakenRef = <T>(additionRef: string | null, write: () => Promise<T>): Promise<T> =>
  write().catch((error: unknown) => {
    const cause = error instanceof Error ? error.cause : undefined;
    if (!(cause instanceof DatabaseError && cause.constraint === 'charge_additions_ref')) throw error;
    const message = `${additionRef} is already on record. Correct that addition, or use another ref`;
    throw new AppError(409, 'Already on record', message, [{ path: 'additionRef', message }], { cause: error });
  });

const requireAppliance = async (tx: Tx, id: string): Promise<void> => {
  const [known] = await tx.select({ id: appliances.id }).from(appliances).where(eq(appliances.id, id));
  if (!known) throw badInput([{ path: 'applianceId', message: 'The company has no such appliance' }]);
};

// The same key of the same writer is the same addition: its id follows from the two.
const idFor = (viewer: Viewer, idempotencyKey: string | null): string =>
  idempotencyKey === null
    ? randomUUID()
    : uuidFromName(JSON.stringify(['addition', viewer.companyId, viewer.actor, idempotencyKey]), uuidFromName.URL);

/** Throws 409 when an addition that nobody has corrected since says something else than is sent under its key. */
const refuseOther = async (tx: Tx, viewer: Viewer, id: string, sent: AdditionFacts & { applianceId: string }) => {
  const [stored] = await tx.select().from(a).where(ofId(viewer, id));
  const same =
    stored?.applianceId === sent.applianceId &&
    stored.addedOn === sent.addedOn &&
    stored.enteredMass === sent.enteredMass &&
    stored.massUnit === sent.massUnit &&
    stored.leaksVerifiedOn === sent.leaksVerifiedOn;
  if (stored && stored.version === 1 && !same)
    throw new AppError(409, 'Key used before', 'This Idempotency-Key was used for another addition. Send a new key.');
};

/**
 * Writes an addition down and gives its id; the same idempotency key gives the addition that it wrote before. Throws 400
 * for faults by field and 409 for a ref that is taken.
 */
export const createAddition = (
  viewer: Viewer,
  body: AdditionBody,
  idempotencyKey: string | null,
): Promise<{ id: string; replayed: boolean }> =>
  withCompany(scopeOf(viewer), async (tx) => {
    const { companyId, actor: createdBy } = viewer;
    const { applianceId, addedOn, addedCharge: enteredMass, massUnit, reason } = body;
    const { leaksVerifiedOn = null, additionRef = null, notes = null } = body;
    const addedChargeKg = checkedKg({ addedOn, enteredMass, massUnit, leaksVerifiedOn }, viewer);
    await requireAppliance(tx, applianceId);
    const id = idFor(viewer, idempotencyKey);
    const written = await refusingTakenRef(additionRef, () =>
      tx
        .insert(a)
        .values({
          ...{ companyId, id, additionRef, applianceId, addedOn, addedChargeKg, massUnit, enteredMass },
          ...{ reason, leaksVerifiedOn, notes, createdBy },
        })
        .onConflictDoNothing({ target: [a.companyId, a.id] })
        .returning({ id: a.id }),
    );
    const replayed = written.length === 0;
    if (replayed) await refuseOther(tx, viewer, id, { applianceId, addedOn, enteredMass, massUnit, leaksVerifiedOn });
    return { id, replayed };
  });

/** The addition as it stands, held until the transaction ends; throws 404 when there is none, 409 when it is newer. */
const holdAddition = async (tx: Tx, viewer: Viewer, id: string, version: number) => {
  const [stored] = await tx.select().from(a).where(ofId(viewer, id)).for('update');
  if (!stored) throw notFound('This addition');
  if (stored.version !== version)
    throw conflict('Somebody changed this addition since you opened it. Look at it as it is now, then try again.');
  return stored;
};

/**
 * Corrects an addition and keeps why in the history. Throws 404 when there is none, 409 when somebody changed it since
 * `version` or its ref is taken, 400 for faults by field.
 */
export const correctAddition = (viewer: Viewer, id: string, change: AdditionChange): Promise<void> =>
  withCompany(scopeOf(viewer, change.why), async (tx) => {
    const stored = await holdAddition(tx, viewer, id, change.version);
    const { addedOn = stored.addedOn, massUnit = stored.massUnit, reason = stored.reason } = change;
    const { addedCharge: enteredMass = stored.enteredMass, leaksVerifiedOn = stored.leaksVerifiedOn } = change;
    const { additionRef = stored.additionRef, notes = stored.notes } = change;
    const addedChargeKg = checkedKg({ addedOn, enteredMass, massUnit, leaksVerifiedOn }, viewer);
    await refusingTakenRef(additionRef, () =>
      tx
        .update(a)
        .set({ addedOn, addedChargeKg, massUnit, enteredMass, reason, leaksVerifiedOn, additionRef, notes })
        .where(ofId(viewer, id)),
    );
  });

/** Takes an addition out of the figures; what it said stays in the history. Throws 404 and 409 as a correction does. */
export const removeAddition = (viewer: Viewer, id: string, { version, why }: AdditionRemoval): Promise<void> =>
  withCompany(scopeOf(viewer, why), async (tx) => {
    await holdAddition(tx, viewer, id, version);
    await tx.delete(a).where(ofId(viewer, id));
  });
