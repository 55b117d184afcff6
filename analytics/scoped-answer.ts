import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { apiFetch, searchString } from '@/lib/api/client';
import type { ScopeQuery } from './scope-address';

/**
 * What a route that takes a scope and nothing else answers; the answer before stays until the new one is here. The path
 * is given as text, since importing a contract would bring zod into the browser.
 */
export const scopedAnswer = <Answer>(path: string, scope: ScopeQuery) =>
  queryOptions({
    queryKey: [path, scope] as const,
    queryFn: ({ signal }) => apiFetch<Answer>(`${path}${searchString(scope)}`, { signal }),
    placeholderData: keepPreviousData,
  });
