import { and, eq, gte, isNull, lt, sql } from 'drizzle-orm';
import { alias, pgView, type QueryBuilder } from 'drizzle-orm/pg-core';
import { recoveries as r } from '@/db/schema/recoveries';
import { LEAST_LIKE_JOBS } from '@/lib/like-jobs';
import type { ApplianceCategory } from '@/lib/vocabulary';

const peer = alias(r, 'peer');
const quartile = (p: number) =>
  sql`percentile_cont(${sql.raw(String(p))}) within group (order by ${peer.recoveryYield})`;
/** What the index of like jobs (recoveries_by_kind) is ordered by: an unstated category is a category of its own. */
const kind = (table: typeof r | typeof peer) => sql`coalesce(${table.category}, '')`;
const figure = (expression: ReturnType<typeof sql>, name: string) =>
  sql<number>`${expression}`.mapWith(Number).as(name);

/**
 * What is usual among like jobs (same refrigerant and appliance category): quartiles of the yield and the lower fence
 * Q1 - 1.5 (Q3 - Q1), J. W. Tukey, Exploratory Data Analysis, 1977, ch. 2. Quartiles hold still when a quarter of the
 * records is bad; a mean and a standard deviation would not.
 */
const likeJobs = (qb: QueryBuilder) =>
  qb
    .select({
      companyId: peer.companyId,
      refrigerant: peer.refrigerant,
      category: sql<ApplianceCategory | null>`nullif(${kind(peer)}, '')`.as('category'),
      kind: sql<string>`${kind(peer)}`.as('kind'),
      likeJobs: figure(sql`count(*)`, 'like_jobs'),
      lowerQuartile: figure(quartile(0.25), 'lower_quartile'),
      medianYield: figure(quartile(0.5), 'median_yield'),
      upperQuartile: figure(quartile(0.75), 'upper_quartile'),
      lowerFence: figure(sql`2.5 * ${quartile(0.25)} - 1.5 * ${quartile(0.75)}`, 'lower_fence'),
    })
    .from(peer)
    .where(isNull(peer.exclusion))
    .groupBy(peer.companyId, peer.refrigerant, kind(peer));

export const yieldLimits = pgView('yield_limits').with({ securityInvoker: true }).as(likeJobs);

/** Recoveries whose yield lies below the lower fence of their like jobs: a reason to look, not a finding. */
export const lowRecoveries = pgView('low_recoveries')
  .with({ securityInvoker: true })
  .as((qb) => {
    const limits = likeJobs(qb).as('limits');
    return qb
      .select({
        companyId: r.companyId,
        recoveryId: r.id,
        month: r.recoveredMonth,
        recoveryYield: r.recoveryYield,
        likeJobs: limits.likeJobs,
        lowerQuartile: limits.lowerQuartile,
        medianYield: limits.medianYield,
        upperQuartile: limits.upperQuartile,
        lowerFence: limits.lowerFence,
      })
      .from(r)
      .innerJoin(
        limits,
        and(eq(limits.companyId, r.companyId), eq(limits.refrigerant, r.refrigerant), eq(limits.kind, kind(r))),
      )
      .where(and(isNull(r.exclusion), gte(limits.likeJobs, LEAST_LIKE_JOBS), lt(r.recoveryYield, limits.lowerFence)));
  });
