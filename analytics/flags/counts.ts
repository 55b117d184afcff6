import 'server-only';
import { and, count, countDistinct, desc, eq, gte, isNull, ne, sql } from 'drizzle-orm';
import type { Scope } from '@/analytics/scope';
import { inScope } from '@/analytics/scope-query';
import { wilson } from '@/analytics/statistics/intervals/proportion';
import type { Tx } from '@/db/client';
import { flagsDue } from '@/db/schema/flag-renewal';
import { flagDecisions, flags } from '@/db/schema/flags';
import { flaggedRecoveries } from '@/db/views/flagged-recoveries';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { SURE_ENOUGH } from '@/lib/flags/certainty';
import type { FlagsList } from './contract';
import { ofFlag } from './filters';
import { isConfirmed } from './verdict';

/** How many of the last decisions the share that was borne out is of. */
const LAST_DECIDED = 50;

const counts = and(gte(flags.certainty, SURE_ENOUGH), ne(flags.rule, 'short_on_arrival'));

/** The open flags of the records in scope, counted. */
export const countOpen = async (tx: Tx, scope: Scope): Promise<FlagsList['open']> => {
  const open = and(eq(flags.state, 'open'), inScope(scope));
  const [all] = await tx
    .select({
      flags: count(),
      records: countDistinct(flags.recoveryId),
      flagged: sql<number>`count(distinct ${flags.recoveryId}) filter (where ${counts})`.mapWith(Number),
    })
    .from(flags)
    .innerJoin(f, ofFlag)
    .where(open);
  const byRule = await tx
    .select({ rule: flags.rule, flags: count() })
    .from(flags)
    .innerJoin(f, ofFlag)
    .where(open)
    .groupBy(flags.rule)
    .orderBy(desc(count()), flags.rule);
  return { ...(all ?? { flags: 0, records: 0, flagged: 0 }), byRule };
};

/** Whether flags of the company wait to be renewed. */
export const isRenewing = async (tx: Tx): Promise<boolean> => {
  const { rows } = await tx.execute<{ due: boolean }>(sql`select exists (select from ${flagsDue}) as due`);
  return rows[0]?.due ?? false;
};

/** How many records in scope count as flagged. */
export const countFlagged = async (tx: Tx, scope: Scope): Promise<number> => {
  const [row] = await tx
    .select({ flagged: count() })
    .from(flaggedRecoveries)
    .innerJoin(f, and(eq(f.companyId, flaggedRecoveries.companyId), eq(f.id, flaggedRecoveries.recoveryId)))
    .where(inScope(scope));
  return row?.flagged ?? 0;
};

/** How many of the last flags that were decided by themselves were borne out; their range is Wilson's of 95 %. */
export const countBorneOut = async (tx: Tx): Promise<FlagsList['borneOut']> => {
  const last = await tx
    .select({ rule: flags.rule, decision: flagDecisions.decision })
    .from(flagDecisions)
    .innerJoin(
      flags,
      and(
        eq(flags.companyId, flagDecisions.companyId),
        eq(flags.id, flagDecisions.flagId),
        eq(flags.decidedAt, flagDecisions.decidedAt),
      ),
    )
    .where(isNull(flagDecisions.followsId))
    .orderBy(desc(flagDecisions.decidedAt))
    .limit(LAST_DECIDED);
  const confirmed = last.filter(({ rule, decision }) => decision !== null && isConfirmed(rule, decision)).length;
  const range = last.length ? wilson(confirmed, last.length) : null;
  return { decided: last.length, confirmed, low: range?.lower ?? null, high: range?.upper ?? null };
};
