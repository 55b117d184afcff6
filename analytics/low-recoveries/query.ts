import 'server-only';
import { and, eq, isNull, type SQL, sql } from 'drizzle-orm';
import { toGram } from '@/analytics/fact-figures';
import { type Scope, UNSTATED } from '@/analytics/scope';
import { inScope } from '@/analytics/scope-query';
import type { Tx } from '@/db/client';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { yieldLimits as limits, lowRecoveries as low } from '@/db/views/yield-limits';
import { LEAST_LIKE_JOBS } from '@/lib/like-jobs';
import type { ApplianceCategory } from '@/lib/vocabulary';
import type { LowRecoveries, LowRecoveriesQuery } from './contract';
import { readCursor, writeCursor } from './cursor';
import type { LowOrder } from './orders';

/** How far below the fence, in quartile ranges; like jobs that are all alike have no range, and nothing is further out. */
const depth = sql`coalesce((${low.lowerFence} - ${low.recoveryYield}) / nullif(${low.upperQuartile} - ${low.lowerQuartile}, 0), 'Infinity')`;

const ORDERED_BY: Record<LowOrder, { value: SQL; type: SQL }> = {
  extreme: { value: depth, type: sql`double precision` },
  newest: { value: sql`${f.recoveredOn}`, type: sql`date` },
};

const afterCursor = (order: LowOrder, cursor: string | undefined): SQL | undefined => {
  if (!cursor) return undefined;
  const { value, type } = ORDERED_BY[order];
  const last = readCursor(order, cursor);
  const lastValue = sql`cast(${last.value} as ${type})`;
  return sql`(${value} < ${lastValue} or (${value} = ${lastValue} and ${f.id} > ${last.id}::uuid))`;
};

const lowInScope = (tx: Tx, { order, limit, cursor, ...scope }: LowRecoveriesQuery) =>
  tx
    .select({
      place: sql<string>`(${ORDERED_BY[order].value})::text`,
      recordRef: f.recordRef,
      recoveryId: f.id,
      recoveredOn: f.recoveredOn,
      technician: f.technician,
      site: f.site,
      appliance: f.appliance,
      refrigerant: f.refrigerant,
      category: sql<ApplianceCategory | typeof UNSTATED>`coalesce(${f.category}, ${UNSTATED})`,
      recoveredMass: toGram(f.recoveredMassKg),
      fullCharge: toGram(f.fullChargeKg),
      yield: low.recoveryYield,
      medianYield: low.medianYield,
      lowerQuartile: low.lowerQuartile,
      upperQuartile: low.upperQuartile,
      lowerFence: low.lowerFence,
      likeJobs: low.likeJobs,
    })
    .from(low)
    .innerJoin(f, and(eq(f.companyId, low.companyId), eq(f.id, low.recoveryId)))
    .where(and(inScope(scope), afterCursor(order, cursor)))
    .orderBy(sql`${ORDERED_BY[order].value} desc`, f.id)
    .limit(limit + 1);

/** Records in scope by group of like jobs: a company has some dozens of groups, and they are added up here. */
export const getJudged = async (tx: Tx, scope: Scope): Promise<LowRecoveries['judged']> => {
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
  const judged = { records: 0, groups: 0, tooFewLikeJobs: 0, low: 0 };
  for (const { likeJobs, records, low: lowOnes } of groups) {
    if (likeJobs < LEAST_LIKE_JOBS) judged.tooFewLikeJobs += records;
    else {
      judged.groups += 1;
      judged.records += records;
      judged.low += lowOnes;
    }
  }
  return judged;
};

/** One page of low recoveries in scope and how many records were judged at all. Throws 400 for a cursor it did not give. */
export const getLowRecoveries = async (tx: Tx, query: LowRecoveriesQuery): Promise<LowRecoveries> => {
  const rows = await lowInScope(tx, query);
  const { order, limit, cursor: _, ...scope } = query;
  const page = rows.slice(0, limit);
  const last = page.at(-1);
  return {
    items: page.map(({ place: _place, ...item }) => item),
    nextCursor: rows.length > limit && last ? writeCursor(order, { value: last.place, id: last.recoveryId }) : null,
    judged: await getJudged(tx, scope),
  };
};
