import { queryOptions, useQuery } from '@tanstack/react-query';
import { apiFetch } from '@/lib/api/client';
import type { Start } from './contract';

// The contract's path as text: importing the contract would bring zod into the browser.
const PATH = '/api/start';

export const startOptions = () =>
  queryOptions({ queryKey: ['start'] as const, queryFn: ({ signal }) => apiFetch<Start>(PATH, { signal }) });

/** What changed and what waits for who is signed in. */
export const useStart = () => useQuery(startOptions());
