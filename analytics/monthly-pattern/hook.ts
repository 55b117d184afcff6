import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import type { ScopeQuery } from '@/analytics/scope-address';
import { apiFetch, searchString } from '@/lib/api/client';
import type { MonthlyPattern } from './contract';

// The contract's path as text: importing the contract would bring zod into the browser.
const PATH = '/api/trends/pattern';

// The fit reaches back to the first record whatever the scope begins with: one answer for all of them.
const withoutBeginning = ({ from: _, ...scope }: ScopeQuery): ScopeQuery => scope;

export const monthlyPatternOptions = (scope: ScopeQuery) =>
  queryOptions({
    queryKey: ['monthly-pattern', withoutBeginning(scope)] as const,
    queryFn: ({ signal }) => apiFetch<MonthlyPattern>(`${PATH}${searchString(withoutBeginning(scope))}`, { signal }),
    placeholderData: keepPreviousData,
  });

/** Season, trend and unusual months; those of the scope before stay until the new ones are here. */
export const useMonthlyPattern = (scope: ScopeQuery) => useQuery(monthlyPatternOptions(scope));
