import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import type { MeasureRecords, StatedReading } from '@/analytics/figures/measures';
import type { ScopeQuery } from '@/analytics/scope-address';
import { apiFetch, searchString } from '@/lib/api/client';
import type { Exclusion, Sort } from './constants';
import type { RecordList } from './contract';
import type { CylinderContent } from './cylinder-content-contract';
import type { KnownNames } from './known-names-contract';

// The contracts' paths as text: importing a contract would bring zod into the browser.
const PATH = '/api/recoveries';

/** What the table of records asks for, besides the page. */
export type RecordFilters = ScopeQuery & {
  sort: Sort;
  q?: string;
  importId?: string;
  exclusion?: Exclusion;
  lacks?: StatedReading;
} & MeasureRecords;

/** One page: its size and the cursor of the list; without a cursor it is the first. */
export type RecordPage = { limit: number; cursor: string | null };

export const recordsOptions = (filters: RecordFilters, { limit, cursor }: RecordPage) =>
  queryOptions({
    queryKey: ['records', filters, limit, cursor] as const,
    queryFn: ({ signal }) =>
      apiFetch<RecordList>(`${PATH}${searchString({ ...filters, limit, ...(cursor ? { cursor } : {}) })}`, { signal }),
    placeholderData: keepPreviousData,
  });

/** One page of records; the page before stays until the new one is here. */
export const useRecords = (filters: RecordFilters, page: RecordPage) => useQuery(recordsOptions(filters, page));

/** How many records the filters mean; the first page says it, later pages ask once for it. */
export const useRecordTotal = (filters: RecordFilters, first: number | undefined) => {
  const { data } = useQuery({ ...recordsOptions(filters, { limit: 1, cursor: null }), enabled: first === undefined });
  return first ?? data?.total;
};

/** Where the whole list is as a file. */
export const exportHref = (filters: RecordFilters): string => `${PATH}${searchString({ ...filters, format: 'csv' })}`;

const FIVE_MINUTES = 5 * 60_000;

/** Names that a new record can use as they are; the appliances are those of one site. */
export const useKnownNames = (site: string) =>
  useQuery({
    queryKey: ['known-names', site] as const,
    queryFn: ({ signal }) => apiFetch<KnownNames>(`${PATH}/names${searchString({ site })}`, { signal }),
    staleTime: FIVE_MINUTES,
    placeholderData: keepPreviousData,
  });

/** What a cylinder holds, as far as the records tell; null asks nothing. */
export const useCylinderContent = (name: string | null) =>
  useQuery({
    queryKey: ['cylinder-content', name] as const,
    queryFn: ({ signal }) =>
      apiFetch<CylinderContent>(`${PATH}/cylinder${searchString({ name: name ?? '' })}`, { signal }),
    enabled: name !== null,
  });
