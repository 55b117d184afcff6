import type { ScopeQuery } from '@/analytics/scope-address';
import { apiFetch, searchString } from '@/lib/api/client';
import type { LowRecoveries, LowRecovery } from './contract';
import type { LowOrder } from './orders';

const PATH = '/api/low-recoveries';
const MOST_A_PAGE = 500;

/** Every low recovery in scope, page after page: for a file, which leaves nothing out. */
export const fetchAllLow = async (scope: ScopeQuery, order: LowOrder): Promise<LowRecovery[]> => {
  const items: LowRecovery[] = [];
  let cursor: string | null = '';
  while (cursor !== null) {
    const search = searchString({ ...scope, order, limit: MOST_A_PAGE, ...(cursor ? { cursor } : {}) });
    const page: LowRecoveries = await apiFetch<LowRecoveries>(`${PATH}${search}`);
    items.push(...page.items);
    cursor = page.nextCursor;
  }
  return items;
};
