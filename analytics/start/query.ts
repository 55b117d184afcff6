import 'server-only';
import { countFlagged } from '@/analytics/flags/counts';
import { getLatestNotes } from '@/analytics/notes/query';
import { getTrendsComparison } from '@/analytics/trends-comparison/query';
import type { Tx } from '@/db/client';
import { type Action, may } from '@/lib/auth/permissions';
import type { Role } from '@/lib/vocabulary';
import type { Start } from './contract';
import { getLastFile } from './last-file';
import { getLatest, getReach, getShortfall } from './latest-month';
import { latelyFrom } from './period';
import { getWaiting } from './waiting';

const MOST_NOTES = 3;

/**
 * What changed and what waits, for a role. `today` is the company's local date. The transaction decides which records
 * are seen: a technician's knows his own only.
 */
export const getStart = async (tx: Tx, role: Role, today: string): Promise<Start> => {
  const allowed = (action: Action) => may(role, action);
  const { lastMonthBefore, ...reach } = await getReach(tx, today);
  const running = today.slice(0, 7);
  const month = lastMonthBefore ?? (reach.firstOn?.startsWith(running) ? running : null);
  const latest = month ? await getLatest(tx, month, month < running) : null;
  const compared = latest?.whole && latest.yearBefore && allowed('trends:read') ? latest.month : null;
  const lately = { from: latelyFrom(today), to: today };
  return {
    today,
    ...reach,
    latest,
    comparison: compared
      ? (
          await getTrendsComparison(
            tx,
            { from: compared, to: compared, by: 'refrigerant', versus: undefined, gwp: 'ar4' },
            today,
          )
        ).comparison
      : null,
    shortfall: latest && allowed('flags:decide') ? await getShortfall(tx, latest.month) : null,
    lately: latest && allowed('flags:read') ? { ...lately, flagged: await countFlagged(tx, lately) } : null,
    lastFile: allowed('imports:manage') ? await getLastFile(tx) : null,
    waiting: latest ? await getWaiting(tx, { role, today }) : [],
    notes: allowed('notes:read') ? await getLatestNotes(tx, latelyFrom(today), MOST_NOTES) : [],
  };
};
