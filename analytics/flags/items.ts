import 'server-only';
import { groupBy } from '@/analytics/statistics/group-by';
import type { Tx } from '@/db/client';
import { whoTheyAre } from '@/lib/recoveries/who';
import type { DisplayUnit } from '@/lib/vocabulary';
import type { Flag, FlagReason } from './contract';
import { explainReason, likeJobsOf, vacuumOf } from './evidence';
import { type FlagRow, getDecisions, getReasons, type ReasonRow } from './rows';

const toReason = (row: ReasonRow, unit: DisplayUnit): FlagReason => ({
  id: row.id,
  rule: row.rule,
  certainty: row.certainty,
  explanation: explainReason(row, unit),
  state: row.state,
  decision: row.decision,
});

/** Rows of flags as the API gives them: with the reasons beside them, what was decided, and names for ids. */
export const toFlags = async (tx: Tx, rows: readonly FlagRow[], unit: DisplayUnit): Promise<Flag[]> => {
  if (rows.length === 0) return [];
  const reasons = groupBy(
    await getReasons(tx, [...new Set(rows.map((row) => row.recoveryId))]),
    (row) => row.recoveryId,
  );
  const log = await getDecisions(
    tx,
    rows.map((row) => row.id),
  );
  const decisions = groupBy(log, ({ flagId }) => flagId);
  const nameOf = await whoTheyAre(tx, [
    ...new Set([...log.map(({ by }) => by), ...rows.flatMap(({ assignedTo }) => assignedTo ?? [])]),
  ]);
  return rows.map(({ evidence, assignedTo, place: _place, ...row }) => ({
    ...row,
    explanation: explainReason({ rule: row.rule, evidence }, unit),
    likeJobs: likeJobsOf(evidence),
    vacuum: vacuumOf(evidence),
    assignedTo: assignedTo ? { id: assignedTo, name: nameOf(assignedTo) } : null,
    decisions: (decisions.get(row.id) ?? []).map(({ flagId: _flag, by, at, ...said }) => ({
      ...said,
      by: nameOf(by),
      at: new Date(at).toISOString(),
    })),
    others: (reasons.get(row.recoveryId) ?? []).filter(({ id }) => id !== row.id).map((other) => toReason(other, unit)),
  }));
};
