import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import type { ScopeQuery } from '@/analytics/scope-address';
import { apiFetch, searchString } from '@/lib/api/client';
import type { SiteRecoveries } from './contract';

// The contract's path as text: importing the contract would bring zod into the browser.
const PATH = '/api/sites';

export const siteRecoveriesOptions = (scope: ScopeQuery) =>
  queryOptions({
    queryKey: ['sites', scope] as const,
    queryFn: ({ signal }) => apiFetch<SiteRecoveries>(`${PATH}${searchString(scope)}`, { signal }),
    placeholderData: keepPreviousData,
  });

/** What was recovered at each site in the scope. */
export const useSiteRecoveries = (scope: ScopeQuery) => useQuery(siteRecoveriesOptions(scope));
