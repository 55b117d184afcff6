import { useQuery } from '@tanstack/react-query';
import type { ScopeQuery } from '@/analytics/scope-address';
import { scopedAnswer } from '@/analytics/scoped-answer';
import type { ApplianceRecoveries } from './contract';

/** What was recovered from each appliance in the scope. */
export const useApplianceRecoveries = (scope: ScopeQuery) =>
  useQuery(scopedAnswer<ApplianceRecoveries>('/api/appliances', scope));
