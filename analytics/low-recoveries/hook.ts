import { infiniteQueryOptions, keepPreviousData, useInfiniteQuery } from '@tanstack/react-query';
import type { ScopeQuery } from '@/analytics/scope-address';
import { apiFetch, searchString } from '@/lib/api/client';
import type { LowRecoveries } from './contract';
import type { LowOrder } from './orders';

// The contract's path as text: importing the contract would bring zod into the browser.
const PATH = '/api/low-recoveries';
const PAGE = 50;

export const lowRecoveriesOptions = (scope: ScopeQuery, order: LowOrder) =>
  infiniteQueryOptions({
    queryKey: ['low-recoveries', order, scope] as const,
    queryFn: ({ pageParam, signal }) =>
      apiFetch<LowRecoveries>(`${PATH}${searchString({ ...scope, order, limit: PAGE, cursor: pageParam })}`, {
        signal,
      }),
    initialPageParam: '',
    getNextPageParam: (page) => page.nextCursor,
    placeholderData: keepPreviousData,
  });

/** Recoveries far below like jobs, page after page. */
export const useLowRecoveries = (scope: ScopeQuery, order: LowOrder) =>
  useInfiniteQuery(lowRecoveriesOptions(scope, order));
