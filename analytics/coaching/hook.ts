import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { apiFetch, searchString } from '@/lib/api/client';
import type { Coaching, CoachingList } from './contract';

// The contract's path as text: importing the contract would bring zod into the browser.
const PATH = '/api/coaching';

/** What a person writes about a coaching. An outcome stands beside the day it was looked at; empty while it runs. */
export type CoachingDraft = { startedOn: string; plan: string; endedOn: string; outcome: string };

export const coachingOptions = (technicianId: string) =>
  queryOptions({
    queryKey: ['coaching', technicianId] as const,
    queryFn: ({ signal }) => apiFetch<CoachingList>(`${PATH}${searchString({ technicianId })}`, { signal }),
  });

/** The coachings of a technician, the latest first. */
export const useCoachings = (technicianId: string) => useQuery(coachingOptions(technicianId));

const sent = (method: string, body: unknown): RequestInit => ({
  method,
  headers: { 'content-type': 'application/json' },
  body: JSON.stringify(body),
});

const changeOf = ({ startedOn, plan, endedOn, outcome }: CoachingDraft) => ({
  startedOn,
  plan,
  endedOn: endedOn || null,
  outcome: outcome.trim() || null,
});

/** Figures of people may say what changed since a coaching, so they are read anew with the coachings. */
const useRenew = () => {
  const client = useQueryClient();
  return () => Promise.all(['coaching', 'technicians'].map((key) => client.invalidateQueries({ queryKey: [key] })));
};

/** Writes a coaching, or changes the one given. */
export const useSaveCoaching = (technicianId: string) => {
  const renew = useRenew();
  return useMutation({
    mutationFn: ({ draft, coaching }: { draft: CoachingDraft; coaching: Coaching | null }) =>
      coaching
        ? apiFetch<Coaching>(`${PATH}/${coaching.id}`, sent('PATCH', { ...changeOf(draft), version: coaching.version }))
        : apiFetch<Coaching>(PATH, sent('POST', { technicianId, startedOn: draft.startedOn, plan: draft.plan })),
    onSuccess: renew,
  });
};

/** Takes a coaching away. */
export const useDeleteCoaching = () => {
  const renew = useRenew();
  return useMutation({
    mutationFn: ({ id, version }: Coaching) =>
      apiFetch<{ id: string }>(`${PATH}/${id}${searchString({ version })}`, { method: 'DELETE' }),
    onSuccess: renew,
  });
};
