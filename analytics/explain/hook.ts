import { queryOptions, useQuery } from '@tanstack/react-query';
import type { Figure } from '@/analytics/figures/figure';
import { scopeQuery } from '@/analytics/scope-address';
import { apiFetch, searchString } from '@/lib/api/client';
import type { Explained } from './contract';

// The contract's path as text: importing the contract would bring zod into the browser.
const PATH = '/api/explain';

export const explainOptions = ({ measure, scope }: Figure) =>
  queryOptions({
    queryKey: ['explain', measure, scopeQuery(scope)] as const,
    queryFn: ({ signal }) =>
      apiFetch<Explained>(`${PATH}${searchString({ ...scopeQuery(scope), measure })}`, { signal }),
  });

/** How a figure was computed, and how many records make it. */
export const useExplained = (figure: Figure) => useQuery(explainOptions(figure));
