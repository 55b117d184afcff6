import { useMutation, useQueryClient } from '@tanstack/react-query';
import { apiFetch, searchString } from '@/lib/api/client';
import type { AdditionReason, MassUnit } from '@/lib/vocabulary';
import type { Addition } from './contract';

const PATH = '/api/charge-additions';

/** An addition as somebody types it; '' is what is not stated. */
export type AdditionDraft = {
  addedOn: string;
  addedCharge: string;
  massUnit: MassUnit;
  reason: AdditionReason;
  leaksVerifiedOn: string;
  notes: string;
};

const sent = (method: string, body: unknown, headers: Record<string, string> = {}): RequestInit => ({
  method,
  headers: { 'content-type': 'application/json', ...headers },
  body: JSON.stringify(body),
});

const useRenew = () => {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: ['leaks'] });
};

/** Writes an addition down, or corrects the one given and says why. `key` makes a repeated try write once. */
export const useSaveAddition = (applianceId: string) => {
  const renew = useRenew();
  return useMutation({
    mutationFn: ({
      draft,
      correct,
      key,
    }: {
      draft: AdditionDraft;
      correct: { addition: Addition; why: string } | null;
      key: string;
    }) =>
      correct
        ? apiFetch<Addition>(
            `${PATH}/${correct.addition.id}`,
            sent('PATCH', { ...draft, version: correct.addition.version, why: correct.why }),
          )
        : apiFetch<Addition>(PATH, sent('POST', { ...draft, applianceId }, { 'idempotency-key': key })),
    onSuccess: renew,
  });
};

/** Takes an addition out of the figures and says why. */
export const useRemoveAddition = () => {
  const renew = useRenew();
  return useMutation({
    mutationFn: ({ addition: { id, version }, why }: { addition: Addition; why: string }) =>
      apiFetch<{ id: string }>(`${PATH}/${id}${searchString({ version, why })}`, { method: 'DELETE' }),
    onSuccess: renew,
  });
};
