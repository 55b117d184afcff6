import { eq, sql } from 'drizzle-orm';
import { renewFlags } from '@/analytics/flag-renewal/renew';
import { withCompany } from '@/db/client';
import { flagsDue } from '@/db/schema/flag-renewal';
import { flags } from '@/db/schema/flags';
import { recoveries } from '@/db/schema/recoveries';

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
