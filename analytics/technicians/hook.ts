import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import type { ScopeQuery } from '@/analytics/scope-address';
import { apiFetch, searchString } from '@/lib/api/client';
import type { TechnicianRecoveries } from './contract';

// The contract's path as text: importing the contract would bring zod into the browser.
const PATH = '/api/technicians';

export const technicianRecoveriesOptions = (scope: ScopeQuery) =>
  queryOptions({
    queryKey: ['technicians', scope] as const,
    queryFn: ({ signal }) => apiFetch<TechnicianRecoveries>(`${PATH}${searchString(scope)}`, { signal }),
    placeholderData: keepPreviousData,
  });

/** What each technician recovered in the scope. */
export const useTechnicianRecoveries = (scope: ScopeQuery) => useQuery(technicianRecoveriesOptions(scope));
