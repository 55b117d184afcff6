import 'server-only';
import { and, eq } from 'drizzle-orm';
import { z } from 'zod';
import { type Tx, withCompany } from '@/db/client';
import { siteLeakMethods as m } from '@/db/schema/charge-additions';
import { appliances, sites } from '@/db/schema/places';
import { scopeOf, type Viewer } from '@/lib/auth/viewer';
import { badInput, conflict, notFound } from '@/lib/errors';
import { LEAK_RATE_METHODS } from '@/lib/vocabulary';
import { ADDITION_NOTE_LENGTH } from './limits';

const why = z
  .string('Say in a few words why')
  .trim()
  .max(ADDITION_NOTE_LENGTH, `Longer than ${ADDITION_NOTE_LENGTH} characters`)
  .refine((value) => !value.includes('\0'), 'Contains a character that is no text');

/** The choice of a site's method: the version that was seen (0 for the first choice), and why it changes. */
export const methodBody = z.strictObject({
  method: z.enum(LEAK_RATE_METHODS, `Expected one of ${LEAK_RATE_METHODS.join(', ')}`),
  version: z.number().int().nonnegative(),
  why: why.optional(),
});
export type MethodBody = z.output<typeof methodBody>;

/** Whether an appliance is of the residential and light commercial subsector; null: it is not known. */
export const subsectorBody = z.strictObject({ lightCommercial: z.boolean('Expected true, false or null').nullable() });

const LEAST_WHY = 3;

const requireSite = async (tx: Tx, siteId: string): Promise<void> => {
  const [site] = await tx.select({ id: sites.id }).from(sites).where(eq(sites.id, siteId));
  if (!site) throw notFound('This site');
};

/**
 * Chooses the method of a site; the choices before stay in the history. Throws 404 for no such site, 409 when somebody
 * chose since, 400 when the method changes and nobody says why: one method is kept for a whole facility (40 CFR 82.152).
 */
export const chooseMethod = (viewer: Viewer, siteId: string, body: MethodBody): Promise<void> =>
  withCompany(scopeOf(viewer, body.why), async (tx) => {
    const { companyId, actor: chosenBy } = viewer;
    await requireSite(tx, siteId);
    const [stored] = await tx.select().from(m).where(eq(m.siteId, siteId)).for('update');
    if ((stored?.version ?? 0) !== body.version)
      throw conflict('Somebody chose a method since you opened this. Look at it as it is now, then try again.');
    if (stored?.method === body.method) return;
    if (stored && (body.why ?? '').length < LEAST_WHY)
      throw badInput([{ path: 'why', message: 'Say in a few words why the method of this site changes' }]);
    const { method } = body;
    const written = stored
      ? await tx
          .update(m)
          .set({ method, chosenBy })
          .where(and(eq(m.companyId, companyId), eq(m.id, stored.id)))
          .returning({ id: m.id })
      : await tx
          .insert(m)
          .values({ companyId, siteId, method, chosenBy })
          .onConflictDoNothing()
          .returning({ id: m.id });
    if (written.length === 0)
      throw conflict('Somebody chose a method since you opened this. Look at it as it is now, then try again.');
  });

/** Says whether an appliance is of the subsector that 40 CFR 84.106 leaves out. Throws 404 for no such appliance. */
export const stateSubsector = (viewer: Viewer, applianceId: string, lightCommercial: boolean | null): Promise<void> =>
  withCompany(scopeOf(viewer), async (tx) => {
    const written = await tx
      .update(appliances)
      .set({ lightCommercial })
      .where(and(eq(appliances.companyId, viewer.companyId), eq(appliances.id, applianceId)))
      .returning({ id: appliances.id });
    if (written.length === 0) throw notFound('This appliance');
  });
