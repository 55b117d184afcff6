import { and, eq, gte, isNotNull, isNull, lt, type SQL, sql } from 'drizzle-orm';
import { alias, type PgColumn, pgView, type QueryBuilder } from 'drizzle-orm/pg-core';
import { setting } from '@/db/schema/columns';
import { recoveries as r } from '@/db/schema/recoveries';
import { likeJobs as kept } from '@/db/schema/summaries';
import { LEAST_LIKE_JOBS } from '@/lib/like-jobs';
import type { ApplianceCategory } from '@/lib/vocabulary';

const peer = alias(r, 'peer');
const quartile = (p: number) =>
  sql`percentile_cont(${sql.raw(String(p))}) within group (order by ${peer.recoveryYield})`;
/**
 * What the index of like jobs (recoveries_by_kind) is ordered by: an unstated category is a category of its own. CASE,
 * since PostgreSQL holds COALESCE for a thing that could leak, and would not look it up in an index behind a policy.
 */
const kind = (table: typeof r | typeof peer) =>
  sql`case when ${table.category} is null then '' else ${table.category} end`;
const figure = (expression: SQL | PgColumn, name: string) => sql<number>`${expression}`.mapWith(Number).as(name);

const limitColumns = (quartiles: [lower: SQL | PgColumn, median: SQL | PgColumn, upper: SQL | PgColumn]) => ({
  lowerQuartile: figure(quartiles[0], 'lower_quartile'),
  medianYield: figure(quartiles[1], 'median_yield'),
  upperQuartile: figure(quartiles[2], 'upper_quartile'),
  lowerFence: figure(sql`2.5 * ${quartiles[0]} - 1.5 * ${quartiles[2]}`, 'lower_fence'),
});

/** Everybody's like jobs stand ready; one technician's own are few, and made from his records when he asks. */
const likeJobs = (qb: QueryBuilder) =>
  qb
    .select({
      companyId: kept.companyId,
      refrigerant: kept.refrigerant,
      category: sql<ApplianceCategory | null>`nullif(${kept.kind}, '')`.as('category'),
      kind: sql<string>`${kept.kind}`.as('kind'),
      likeJobs: figure(kept.records, 'like_jobs'),
      ...limitColumns([kept.lowerQuartile, kept.medianYield, kept.upperQuartile]),
    })
    .from(kept)
    .unionAll(
      qb
        .select({
          companyId: peer.companyId,
          refrigerant: peer.refrigerant,
          category: sql<ApplianceCategory | null>`nullif(${kind(peer)}, '')`.as('category'),
          kind: sql<string>`${kind(peer)}`.as('kind'),
          likeJobs: figure(sql`count(*)`, 'like_jobs'),
          ...limitColumns([quartile(0.25), quartile(0.5), quartile(0.75)]),
        })
        .from(peer)
        .where(and(isNull(peer.exclusion), isNotNull(setting('technician_id'))))
        .groupBy(peer.companyId, peer.refrigerant, kind(peer)),
    );

/**
 * What is usual among like jobs (same refrigerant and appliance category): quartiles of the yield and the lower fence
 * Q1 - 1.5 (Q3 - Q1), J. W. Tukey, Exploratory Data Analysis, 1977, ch. 2. Quartiles hold still when a quarter of the
 * records is bad; a mean and a standard deviation would not.
 */
export const yieldLimits = pgView('yield_limits').with({ securityInvoker: true }).as(likeJobs);

/**
 * Recoveries whose yield lies below the lower fence of their like jobs: a reason to look, not a finding. Read kind by
 * kind from below: the order keeps PostgreSQL from joining every record first.
 */
export const lowRecoveries = pgView('low_recoveries')
  .with({ securityInvoker: true })
  .as((qb) => {
    const limits = likeJobs(qb).as('limits');
    const below = qb
      .select({ id: r.id, month: r.recoveredMonth, recoveryYield: r.recoveryYield })
      .from(r)
      .where(
        and(
          eq(r.companyId, limits.companyId),
          eq(r.refrigerant, limits.refrigerant),
          sql`${kind(r)} = ${limits.kind}`,
          isNull(r.exclusion),
          lt(r.recoveryYield, limits.lowerFence),
        ),
      )
      .orderBy(r.recoveryYield)
      .as('below');
    return qb
      .select({
        companyId: limits.companyId,
        recoveryId: below.id,
        month: below.month,
        recoveryYield: below.recoveryYield,
        likeJobs: limits.likeJobs,
        lowerQuartile: limits.lowerQuartile,
        medianYield: limits.medianYield,
        upperQuartile: limits.upperQuartile,
        lowerFence: limits.lowerFence,
      })
      .from(limits)
      .crossJoinLateral(below)
      .where(gte(limits.likeJobs, LEAST_LIKE_JOBS));
  });
