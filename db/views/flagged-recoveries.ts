import { and, eq, gte, inArray, ne, sql } from 'drizzle-orm';
import { pgView } from 'drizzle-orm/pg-core';
import { flags } from '@/db/schema/flags';
import { SURE_ENOUGH } from '@/lib/flags/certainty';

/**
 * What every screen counts as flagged: a record with an open flag of certainty 0.5 or more that speaks against the
 * recovery or the record. `short_on_arrival` speaks against neither: the system had lost its charge before.
 */
export const flaggedRecoveries = pgView('flagged_recoveries')
  .with({ securityInvoker: true })
  .as((qb) =>
    qb
      .select({
        companyId: flags.companyId,
        recoveryId: flags.recoveryId,
        certainty: sql<number>`max(${flags.certainty})`.as('certainty'),
      })
      .from(flags)
      .where(and(eq(flags.state, 'open'), gte(flags.certainty, SURE_ENOUGH), ne(flags.rule, 'short_on_arrival')))
      .groupBy(flags.companyId, flags.recoveryId),
  );

/** Records that were decided to have had little to give: they do not count when people are compared. */
export const recoveryExcuses = pgView('recovery_excuses')
  .with({ securityInvoker: true })
  .as((qb) =>
    qb
      .selectDistinct({ companyId: flags.companyId, recoveryId: flags.recoveryId })
      .from(flags)
      .where(inArray(flags.decision, ['leaked_before', 'known_low_charge'])),
  );
