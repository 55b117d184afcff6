'use client';

import { parseAsArrayOf, parseAsNumberLiteral, parseAsString, parseAsStringLiteral, useQueryStates } from 'nuqs';
import { useMemo } from 'react';
import { LIKE_JOBS_STANDINGS, PLANT_SIZES, STATED_READINGS } from '@/analytics/figures/measures';
import { DEFAULT_SORT, EXCLUSIONS, PAGE_SIZES, type PageSize, SORTS, type Sort } from '@/analytics/records/constants';
import type { RecordFilters, RecordPage } from '@/analytics/records/hook';
import { scopeQuery } from '@/analytics/scope-address';
import { useScope } from '@/components/scope/use-scope';
import { searchString } from '@/lib/api/client';
import { COLUMN_IDS, type ColumnId } from './column-list';

const PARSERS = {
  sort: parseAsStringLiteral(SORTS).withDefault(DEFAULT_SORT),
  q: parseAsString.withDefault(''),
  importId: parseAsString,
  exclusion: parseAsStringLiteral(EXCLUSIONS),
  flagged: parseAsStringLiteral(['yes']),
  likeJobs: parseAsStringLiteral(LIKE_JOBS_STANDINGS),
  states: parseAsStringLiteral(STATED_READINGS),
  lacks: parseAsStringLiteral(STATED_READINGS),
  plant: parseAsStringLiteral(PLANT_SIZES),
  limit: parseAsNumberLiteral(PAGE_SIZES).withDefault(PAGE_SIZES[0]),
  columns: parseAsArrayOf(parseAsStringLiteral(COLUMN_IDS)),
  /** Cursor of the page behind the mark of the list it belongs to. */
  page: parseAsString,
};

// FNV-1a: a cursor kept in the address counts only for the list it was made in, whoever changes the scope.
const markOf = (text: string): string => {
  let hash = 0x811c9dc5;
  for (const letter of text) hash = Math.imul(hash ^ (letter.codePointAt(0) ?? 0), 0x01000193);
  return (hash >>> 0).toString(36);
};

/** What the table of records shows, read from the address and written to it. */
export const useRecordList = () => {
  const { scope } = useScope();
  const [address, setAddress] = useQueryStates(PARSERS, { history: 'push' });
  const { sort, q, importId, exclusion, flagged, likeJobs, states, lacks, plant, limit, columns, page } = address;
  const filters = useMemo<RecordFilters>(
    () => ({
      ...scopeQuery(scope),
      sort,
      ...(q ? { q } : {}),
      ...(importId ? { importId } : {}),
      ...(exclusion ? { exclusion } : {}),
      ...(flagged ? { flagged } : {}),
      ...(likeJobs ? { likeJobs } : {}),
      ...(states ? { states } : {}),
      ...(lacks ? { lacks } : {}),
      ...(plant ? { plant } : {}),
    }),
    [scope, sort, q, importId, exclusion, flagged, likeJobs, states, lacks, plant],
  );
  const mark = `${markOf(searchString({ ...filters, limit }))}.`;
  const cursor = page?.startsWith(mark) ? page.slice(mark.length) : null;
  return {
    scope,
    filters,
    columns,
    page: { limit, cursor } satisfies RecordPage,
    setSort: (next: Sort) => setAddress({ sort: next, page: null }),
    setSearch: (next: string) => setAddress({ q: next || null, page: null }),
    setLimit: (next: PageSize) => setAddress({ limit: next, page: null }),
    setColumns: (next: readonly ColumnId[] | null) => setAddress({ columns: next ? [...next] : null }),
    setCursor: (next: string | null) => setAddress({ page: next === null ? null : `${mark}${next}` }),
    /** Takes back what narrows the list besides scope and search. */
    showAll: () =>
      setAddress({
        importId: null,
        exclusion: null,
        flagged: null,
        likeJobs: null,
        states: null,
        lacks: null,
        plant: null,
        page: null,
      }),
  };
};
export type RecordListState = ReturnType<typeof useRecordList>;
