import 'server-only';
import { and, desc, eq, gte, isNull, lt, sql } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { flagDecisions, flags } from '@/db/schema/flags';
import { recoveries as r } from '@/db/schema/recoveries';
import type { FlagDecision } from '@/lib/vocabulary';
import { VISIT_MONTHS } from './limits';
import type { PulledRecord } from './visits';

/** A pull with the site it was made at. */
export type PulledAtSite = PulledRecord & { siteId: string };

type Judged = Pick<PulledRecord, 'decision' | 'judgedShort' | 'judgedStopped'>;
const NOT_JUDGED: Judged = { decision: null, judgedShort: null, judgedStopped: null };

const lastDecision = sql<FlagDecision | null>`(
  select d.decision from ${flagDecisions} d where d.company_id = ${flags.companyId} and d.flag_id = ${flags.id}
  order by d.decided_at desc limit 1)`;

/** What flags and people say of records, by record. */
const getJudged = async (tx: Tx, since: string): Promise<ReadonlyMap<string, Judged>> => {
  const rows = await tx
    .select({ recoveryId: flags.recoveryId, rule: flags.rule, certainty: flags.certainty, decision: lastDecision })
    .from(flags)
    .innerJoin(r, and(eq(r.companyId, flags.companyId), eq(r.id, flags.recoveryId)))
    .where(gte(r.recoveredOn, since));
  const judged = new Map<string, Judged>();
  for (const { recoveryId, rule, certainty, decision } of rows) {
    const before = judged.get(recoveryId) ?? NOT_JUDGED;
    judged.set(recoveryId, {
      decision: decision ?? before.decision,
      judgedShort: rule === 'short_on_arrival' ? certainty : before.judgedShort,
      judgedStopped: rule === 'stopped_early' ? certainty : before.judgedStopped,
    });
  }
  return judged;
};

/** The first day of the months that speak: VISIT_MONTHS before the company's last recovery. Null without a record. */
const firstDayOf = async (tx: Tx): Promise<string | null> => {
  const [last] = await tx
    .select({ since: sql<string>`(${r.recoveredOn} - ${sql.raw(`interval '${VISIT_MONTHS} months'`)})::date` })
    .from(r)
    .where(isNull(r.exclusion))
    .orderBy(desc(r.recoveredOn))
    .limit(1);
  return last?.since ?? null;
};

/** The recoveries of the last VISIT_MONTHS, with what flags say of them; entry errors are left out. */
export const getPulledRecords = async (tx: Tx): Promise<PulledAtSite[]> => {
  const since = await firstDayOf(tx);
  if (since === null) return [];
  const judged = await getJudged(tx, since);
  const rows = await tx
    .select({
      id: r.id,
      applianceId: r.applianceId,
      siteId: r.siteId,
      recoveredOn: r.recoveredOn,
      recoveredMassKg: sql<number>`${r.recoveredMassKg}`.mapWith(Number),
      fullChargeKg: sql<number>`${r.fullChargeKg}`.mapWith(Number),
      category: sql<string>`coalesce(${r.category}, '')`,
      jobType: sql<string>`coalesce(${r.jobType}, '')`,
      refrigerant: r.refrigerant,
      finalVacuumKpaAbs: sql<number | null>`${r.finalVacuumKpaAbs}::double precision`,
    })
    .from(r)
    .where(and(isNull(r.exclusion), gte(r.recoveredOn, since), lt(sql`0`, r.fullChargeKg)));
  return rows.map(({ id, ...row }) => ({ ...row, ...(judged.get(id) ?? NOT_JUDGED) }));
};
