import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import type { Dimension } from '@/analytics/dimensions';
import type { ScopeQuery } from '@/analytics/scope-address';
import { apiFetch, searchString } from '@/lib/api/client';
import type { MonthlyTrends } from './contract';
import { MOST_KEYS } from './series';

// The contract's path as text: importing the contract would bring zod into the browser.
const PATH = '/api/trends/monthly';

export const monthlyTrendsOptions = (scope: ScopeQuery, by: Dimension) =>
  queryOptions({
    queryKey: ['monthly-trends', by, scope] as const,
    queryFn: ({ signal }) =>
      apiFetch<MonthlyTrends>(`${PATH}${searchString({ ...scope, by, keys: MOST_KEYS })}`, { signal }),
    placeholderData: keepPreviousData,
  });

/** Recovered mass by month, the smaller keys together; the figures of the scope before stay until the new ones are here. Asks once `enabled`. */
export const useMonthlyTrends = (scope: ScopeQuery, by: Dimension, { enabled = true } = {}) =>
  useQuery({ ...monthlyTrendsOptions(scope, by), enabled });
