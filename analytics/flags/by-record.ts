import type { FlagDecision } from '@/lib/vocabulary';
import type { Flag, FlagReason } from './contract';

/** A record with its open reasons, or with its decided ones: `lead` is the surest of those that the list asked for. */
export type FlaggedRecord = { lead: Flag; reasons: readonly FlagReason[] };

/** Flags as a list gives them, put together by record where its first flag stands; what is open apart from what is decided. */
export const byRecord = (flags: readonly Flag[]): FlaggedRecord[] => {
  const seen = new Set<string>();
  return flags.flatMap((lead) => {
    const key = `${lead.recoveryId} ${lead.state}`;
    if (seen.has(key)) return [];
    seen.add(key);
    const alike = lead.others.filter(({ state }) => state === lead.state);
    return [{ lead, reasons: [lead, ...alike].sort((a, b) => b.certainty - a.certainty) }];
  });
};

/** What was decided about a record; null while it is open. */
export const decisionOf = ({
  lead,
}: FlaggedRecord): { decision: FlagDecision; by: string; at: string; note: string | null } | null => {
  const [last] = lead.decisions;
  return lead.decision && last ? { decision: lead.decision, by: last.by, at: last.at, note: last.note } : null;
};
