import { queryOptions, useQuery } from '@tanstack/react-query';
import { apiFetch } from '@/lib/api/client';
import type { ScopeOptions } from './contract';

// The contract's path as text: importing the contract would bring zod into the browser.
const PATH = '/api/scope-options';

const FIVE_MINUTES = 5 * 60_000;

export const scopeOptionsOptions = () =>
  queryOptions({
    queryKey: ['scope-options'] as const,
    queryFn: ({ signal }) => apiFetch<ScopeOptions>(PATH, { signal }),
    staleTime: FIVE_MINUTES,
  });

/** What the viewer can narrow a scope to. */
export const useScopeOptions = () => useQuery(scopeOptionsOptions());
