import { useQuery } from '@tanstack/react-query';
import type { ScopeQuery } from '@/analytics/scope-address';
import { scopedAnswer } from '@/analytics/scoped-answer';
import type { TechnicianRecoveries } from './contract';

/** A new comparison takes some seconds to be made. */
const ASK_AGAIN_MS = 4_000;

/** What each technician recovered in the scope; asked again while the comparison is not of the latest records. */
export const useTechnicianRecoveries = (scope: ScopeQuery) =>
  useQuery({
    ...scopedAnswer<TechnicianRecoveries>('/api/technicians', scope),
    refetchInterval: ({ state }) => (state.data?.judgedOn.current === false ? ASK_AGAIN_MS : false),
  });
