import { eq, sql } from 'drizzle-orm';
import { renewFlags } from '@/analytics/flag-renewal/renew';
import { withCompany } from '@/db/client';
import { flagBaselines, flagsDue } from '@/db/schema/flag-renewal';
import { flags } from '@/db/schema/flags';
import { recoveries } from '@/db/schema/recoveries';
import type { FlagRule } from '@/lib/vocabulary';
import { asRole } from './as-role';

const EVERYTHING = '00000000-0000-0000-0000-000000000000';

/** Every flag of a company as judging made it, in an order of its own. */
export const flagsOf = (companyId: string) =>
  withCompany({ companyId, actor: 'test' }, (tx) =>
    tx
      .select({
        id: flags.id,
        recordRef: recoveries.recordRef,
        rule: flags.rule,
        certainty: flags.certainty,
        evidence: flags.evidence,
        state: flags.state,
        decision: flags.decision,
        assignedTo: flags.assignedTo,
        note: flags.note,
      })
      .from(flags)
      .innerJoin(recoveries, eq(recoveries.id, flags.recoveryId))
      .orderBy(recoveries.recordRef, flags.rule),
  );

/** Renews what is due. */
export const renewDue = (companyId: string): Promise<void> => renewFlags({ companyId });

/** Judges everything anew, whatever is due. */
export const renewEverything = async (companyId: string): Promise<void> => {
  await withCompany({ companyId, actor: 'test' }, (tx) =>
    tx
      .insert(flagsDue)
      .values({ companyId, recoveryId: EVERYTHING })
      .onConflictDoUpdate({
        target: [flagsDue.companyId, flagsDue.recoveryId],
        set: { touches: sql`flags_due.touches + 1` },
      }),
  );
  await renewFlags({ companyId });
};

/** An open flag as a test wants it: on which record, by which rule, how sure. */
export type TestFlag = { recoveryId: string; rule: FlagRule; certainty: number };

/** A worker of another suite that renews flags would judge them by their records, and these ones follow from none. */
const keepFromWorkers = (companyId: string): Promise<unknown> =>
  asRole('job', {}, (client) =>
    client.query(
      `insert into graphile_worker._private_job_queues (queue_name, locked_at, locked_by)
       values ($1 || ' renew-flags', now(), 'a test') on conflict (queue_name) do update set locked_at = now(), locked_by = 'a test'`,
      [companyId],
    ),
  );

/** Puts flags on records, as judging would. */
export const putFlags = async (companyId: string, rows: readonly TestFlag[]): Promise<void> => {
  await keepFromWorkers(companyId);
  await withCompany({ companyId, actor: 'test' }, async (tx) => {
    const [baseline] = await tx.insert(flagBaselines).values({ companyId, judging: 'test', content: {} }).returning();
    if (!baseline) throw new Error('A baseline that was written has no id');
    await tx.insert(flags).values(rows.map((row) => ({ companyId, ...row, evidence: {}, baselineId: baseline.id })));
  });
};
