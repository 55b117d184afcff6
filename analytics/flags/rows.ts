import 'server-only';
import { asc, desc, inArray, type SQL, sql } from 'drizzle-orm';
import { toGram } from '@/analytics/fact-figures';
import { UNSTATED } from '@/analytics/scope';
import type { Tx } from '@/db/client';
import { flagDecisions, flags } from '@/db/schema/flags';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import type { ApplianceCategory, JobType } from '@/lib/vocabulary';
import { ofFlag } from './filters';

const reasonColumns = {
  id: flags.id,
  recoveryId: flags.recoveryId,
  rule: flags.rule,
  certainty: flags.certainty,
  evidence: flags.evidence,
  state: flags.state,
  decision: flags.decision,
};

/** Flags with the record they are about, in the order of the list: the surest first. */
export const getFlagRows = (tx: Tx, where: SQL | undefined, limit?: number) => {
  const query = tx
    .select({
      ...reasonColumns,
      place: sql<string>`${flags.certainty}::text`,
      assignedTo: flags.assignedTo,
      note: flags.note,
      recordRef: f.recordRef,
      recoveredOn: f.recoveredOn,
      technician: f.technician,
      site: f.site,
      appliance: f.appliance,
      refrigerant: f.refrigerant,
      category: sql<ApplianceCategory | typeof UNSTATED>`coalesce(${f.category}, ${UNSTATED})`,
      jobType: sql<JobType | typeof UNSTATED>`coalesce(${f.jobType}, ${UNSTATED})`,
      recoveredMass: toGram(f.recoveredMassKg),
      fullCharge: toGram(f.fullChargeKg),
      expectedMass: sql<number | null>`round(${flags.expectedMassKg}, 3)::float8`,
      yield: f.recoveryYield,
    })
    .from(flags)
    .innerJoin(f, ofFlag)
    .where(where)
    .orderBy(desc(flags.certainty), desc(flags.id));
  return limit === undefined ? query : query.limit(limit);
};
export type FlagRow = Awaited<ReturnType<typeof getFlagRows>>[number];

/** All flags of some records, the surest first. */
export const getReasons = (tx: Tx, recoveryIds: readonly string[]) =>
  tx
    .select(reasonColumns)
    .from(flags)
    .where(inArray(flags.recoveryId, [...recoveryIds]))
    .orderBy(desc(flags.certainty), asc(flags.rule));
export type ReasonRow = Awaited<ReturnType<typeof getReasons>>[number];

/** Everything that was decided on some flags, the last first. */
export const getDecisions = (tx: Tx, flagIds: readonly string[]) =>
  tx
    .select({
      flagId: flagDecisions.flagId,
      decision: flagDecisions.decision,
      note: flagDecisions.note,
      by: flagDecisions.decidedBy,
      at: flagDecisions.decidedAt,
    })
    .from(flagDecisions)
    .where(inArray(flagDecisions.flagId, [...flagIds]))
    .orderBy(desc(flagDecisions.decidedAt), desc(flagDecisions.id));
