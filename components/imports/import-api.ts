import { infiniteQueryOptions, queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { apiFetch, searchString } from '@/lib/api/client';
import type { ImportList, ImportView, Mapping } from '@/lib/imports/contract';

const PATH = '/api/imports';
const LOOK_AGAIN_MS = 700;
const LIST_LOOK_AGAIN_MS = 3_000;
const PAGE = 20;

type ListItem = ImportList['items'][number];

/** Whether the server still works on an import. */
export const isAtWork = ({ status }: Pick<ListItem, 'status'>): boolean => status === 'queued' || status === 'running';

/** One import; asked again and again while the server works on it. */
export const importOptions = (id: string) =>
  queryOptions({
    queryKey: ['imports', id] as const,
    queryFn: ({ signal }) => apiFetch<ImportView>(`${PATH}/${id}`, { signal }),
    refetchInterval: ({ state }) => (state.data && isAtWork(state.data) ? LOOK_AGAIN_MS : false),
  });

/** The company's imports, newest first, a page at a time. */
export const importListOptions = infiniteQueryOptions({
  queryKey: ['imports'] as const,
  queryFn: ({ pageParam, signal }) =>
    apiFetch<ImportList>(`${PATH}${searchString({ limit: PAGE, cursor: pageParam })}`, { signal }),
  initialPageParam: undefined as string | undefined,
  getNextPageParam: ({ nextCursor }) => nextCursor ?? undefined,
  refetchInterval: ({ state }) =>
    state.data?.pages.some(({ items }) => items.some(isAtWork)) ? LIST_LOOK_AGAIN_MS : false,
});

/** Sends a file for a preview: it is read as a whole, and no record changes. */
export const useUpload = () =>
  useMutation({
    mutationFn: (file: File) => {
      const form = new FormData();
      // Fields go before the file, so that the server knows them when its bytes come.
      form.set('dryRun', 'true');
      form.set('file', file);
      return apiFetch<{ id: string }>(PATH, { method: 'POST', body: form });
    },
  });

const post = <Answer>(path: string, body: unknown) =>
  apiFetch<Answer>(path, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify(body),
  });

/** The verbs of one import; each asks for its new state at once. */
export const useImportVerbs = (id: string) => {
  const queryClient = useQueryClient();
  const onSettled = () => queryClient.invalidateQueries({ queryKey: ['imports'] });
  return {
    preview: useMutation({
      mutationFn: (mapping: Mapping) => post<{ id: string }>(`${PATH}/${id}/preview`, { mapping }),
      onSettled,
    }),
    apply: useMutation({ mutationFn: () => post<{ id: string }>(`${PATH}/${id}/apply`, {}), onSettled }),
    undo: useMutation({
      mutationFn: () => post<ImportView>(`${PATH}/${id}/undo`, {}),
      // All figures may have changed.
      onSettled: () => queryClient.invalidateQueries(),
    }),
  };
};

/** Where the refused rows of an import can be fetched as a file. */
export const refusedRowsPath = (id: string): string => `${PATH}/${id}/rejected.csv`;
