import 'server-only';
import { and, eq, isNull, sql } from 'drizzle-orm';
import type { Scope } from '@/analytics/scope';
import { inScope } from '@/analytics/scope-query';
import type { Tx } from '@/db/client';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { yieldLimits as limits } from '@/db/views/yield-limits';
import { LEAST_LIKE_JOBS } from '@/lib/like-jobs';

/** Records with enough like jobs, in how many groups, and how many of them lie below their lower fence. */
export type Judged = { records: number; groups: number; low: number };

/** Records in scope by group of like jobs: a company has some dozens of groups, and they are added up here. */
export const getJudged = async (tx: Tx, scope: Scope): Promise<Judged> => {
  const groups = await tx
    .select({
      likeJobs: limits.likeJobs,
      records: sql<number>`count(*)`.mapWith(Number),
      low: sql<number>`count(*) filter (where ${f.recoveryYield} < ${limits.lowerFence})`.mapWith(Number),
    })
    .from(f)
    .innerJoin(
      limits,
      and(
        eq(limits.companyId, f.companyId),
        eq(limits.refrigerant, f.refrigerant),
        sql`${limits.kind} = coalesce(${f.category}, '')`,
      ),
    )
    .where(and(inScope(scope), isNull(f.exclusion)))
    .groupBy(limits.refrigerant, limits.kind, limits.likeJobs);
  const judged: Judged = { records: 0, groups: 0, low: 0 };
  for (const { likeJobs, records, low: lowOnes } of groups) {
    if (likeJobs >= LEAST_LIKE_JOBS) {
      judged.groups += 1;
      judged.records += records;
      judged.low += lowOnes;
    }
  }
  return judged;
};
