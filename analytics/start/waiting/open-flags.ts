import 'server-only';
import { countFlagged } from '@/analytics/flags/counts';
import { searchString } from '@/lib/api/client';
import { may } from '@/lib/auth/permissions';
import { latelyFrom } from '../period';
import type { WaitingKind } from './kind';

/** Records of the last thirty days that need a look. */
export const openFlags: WaitingKind = {
  kind: 'open-flags',
  concerns: (role) => may(role, 'flags:read'),
  find: async (tx, { today }) => {
    const period = { from: latelyFrom(today), to: today };
    const count = await countFlagged(tx, period);
    if (!count) return null;
    return {
      count,
      what: count === 1 ? 'record of the last 30 days needs a look.' : 'records of the last 30 days need a look.',
      why: 'A pull cut short, a slip of the pen, a full cylinder or a missed level: a reason to look, not a finding.',
      verb: 'Look at them',
      href: `/flags${searchString(period)}`,
    };
  },
};
