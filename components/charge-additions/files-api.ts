import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { apiFetch } from '@/lib/api/client';
import type { AdditionImport, AdditionImportList, AdditionUndo } from '@/lib/charge-additions/file/contract';

const PATH = '/api/charge-additions/imports';
const KEY = ['addition-imports'] as const;

const formOf = (file: File, dryRun: boolean): FormData => {
  const form = new FormData();
  // Fields go before the file, so that the server knows them when its bytes come.
  form.set('dryRun', String(dryRun));
  form.set('file', file);
  return form;
};

/** Reads a file and says what would come of it; nothing is written. */
export const usePreviewFile = () =>
  useMutation({
    mutationFn: (file: File) => apiFetch<AdditionImport>(PATH, { method: 'POST', body: formOf(file, true) }),
  });

const useRenew = () => {
  const client = useQueryClient();
  return () => Promise.all([KEY, ['leaks']].map((queryKey) => client.invalidateQueries({ queryKey })));
};

/** Takes a file in. */
export const useTakeFile = () => {
  const renew = useRenew();
  return useMutation({
    mutationFn: (file: File) => apiFetch<AdditionImport>(PATH, { method: 'POST', body: formOf(file, false) }),
    onSuccess: renew,
  });
};

/** Files that were taken in, the newest first. */
export const useTakenFiles = () =>
  useQuery({ queryKey: KEY, queryFn: ({ signal }) => apiFetch<AdditionImportList>(PATH, { signal }) });

/** Takes a file back. */
export const useUndoFile = () => {
  const renew = useRenew();
  return useMutation({
    mutationFn: (id: string) => apiFetch<AdditionUndo>(`${PATH}/${id}/undo`, { method: 'POST' }),
    onSuccess: renew,
  });
};
