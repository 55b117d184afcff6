import type { FlagDecision } from '@/lib/vocabulary';
import type { Flag, FlagReason } from './contract';

/** A record with its reasons: `lead` is the surest of those that the list asked for. */
export type FlaggedRecord = { lead: Flag; reasons: readonly FlagReason[] };

/** Flags as a list gives them, put together by record where its first flag stands. */
export const byRecord = (flags: readonly Flag[]): FlaggedRecord[] => {
  const seen = new Set<string>();
  return flags.flatMap((lead) => {
    if (seen.has(lead.recoveryId)) return [];
    seen.add(lead.recoveryId);
    const reasons = [lead, ...lead.others].sort((a, b) => b.certainty - a.certainty);
    return [{ lead, reasons }];
  });
};

/** What was decided about a record as a whole: that of its lead. */
export const decisionOf = ({
  lead,
}: FlaggedRecord): { decision: FlagDecision; by: string; at: string; note: string | null } | null => {
  const [last] = lead.decisions;
  return lead.decision && last ? { decision: lead.decision, by: last.by, at: last.at, note: last.note } : null;
};
