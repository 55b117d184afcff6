import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import type { Dimension } from '@/analytics/dimensions';
import type { ScopeQuery } from '@/analytics/scope-address';
import { apiFetch, searchString } from '@/lib/api/client';
import type { TrendsComparison } from './contract';

// The contract's path as text: importing the contract would bring zod into the browser.
const PATH = '/api/trends/comparison';

export type ComparisonChoice = { by: Dimension; versus: string | null; gwp: TrendsComparison['gwp'] };

export const trendsComparisonOptions = (scope: ScopeQuery, { by, versus, gwp }: ComparisonChoice) =>
  queryOptions({
    queryKey: ['trends-comparison', by, versus, gwp, scope] as const,
    queryFn: ({ signal }) =>
      apiFetch<TrendsComparison>(`${PATH}${searchString({ ...scope, by, gwp, ...(versus ? { versus } : {}) })}`, {
        signal,
      }),
    placeholderData: keepPreviousData,
  });

/** A period against another one; the figures before stay until the new ones are here. */
export const useTrendsComparison = (scope: ScopeQuery, choice: ComparisonChoice) =>
  useQuery(trendsComparisonOptions(scope, choice));
