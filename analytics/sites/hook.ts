import { useQuery } from '@tanstack/react-query';
import type { ScopeQuery } from '@/analytics/scope-address';
import { scopedAnswer } from '@/analytics/scoped-answer';
import type { SiteRecoveries } from './contract';

/** What was recovered at each site in the scope. */
export const useSiteRecoveries = (scope: ScopeQuery) => useQuery(scopedAnswer<SiteRecoveries>('/api/sites', scope));
