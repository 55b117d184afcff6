import { useQuery } from '@tanstack/react-query';
import type { ScopeQuery } from '@/analytics/scope-address';
import { scopedAnswer } from '@/analytics/scoped-answer';
import type { TechnicianRecoveries } from './contract';

/** What each technician recovered in the scope. */
export const useTechnicianRecoveries = (scope: ScopeQuery) =>
  useQuery(scopedAnswer<TechnicianRecoveries>('/api/technicians', scope));
