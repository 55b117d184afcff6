import { keepPreviousData, queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { apiFetch, searchString } from '@/lib/api/client';
import type { Note, NotesList } from './contract';

// The contract's path as text: importing the contract would bring zod into the browser.
const PATH = '/api/notes';

/** What a person says about a day or a range of days. */
export type NoteDraft = { from: string; to: string; text: string };

const period = (from: string | null, to: string | null) => ({ ...(from ? { from } : {}), ...(to ? { to } : {}) });

export const notesOptions = (from: string | null, to: string | null) =>
  queryOptions({
    queryKey: ['notes', from, to] as const,
    queryFn: ({ signal }) => apiFetch<NotesList>(`${PATH}${searchString(period(from, to))}`, { signal }),
    placeholderData: keepPreviousData,
  });

/** Notes that touch a period; those of the period before stay until the new ones are here. */
export const useNotes = (from: string | null, to: string | null) => useQuery(notesOptions(from, to));

const sent = (method: string, body: unknown): RequestInit => ({
  method,
  headers: { 'content-type': 'application/json' },
  body: JSON.stringify(body),
});

/** Writes a note, or changes the one given; every list of notes is read anew afterwards. */
export const useSaveNote = () => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ draft, note }: { draft: NoteDraft; note: Note | null }) =>
      note
        ? apiFetch<Note>(`${PATH}/${note.id}`, sent('PATCH', { ...draft, version: note.version }))
        : apiFetch<Note>(PATH, sent('POST', draft)),
    onSuccess: () => client.invalidateQueries({ queryKey: ['notes'] }),
  });
};

/** Takes a note away. */
export const useDeleteNote = () => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ id, version }: Note) =>
      apiFetch<{ id: string }>(`${PATH}/${id}${searchString({ version })}`, { method: 'DELETE' }),
    onSuccess: () => client.invalidateQueries({ queryKey: ['notes'] }),
  });
};
