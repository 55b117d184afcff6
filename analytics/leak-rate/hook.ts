import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { apiFetch } from '@/lib/api/client';
import type { LeakRateMethod } from '@/lib/vocabulary';
import type { ApplianceLeaks, SiteLeaks, SiteMethod } from './contract';

// Paths as text: importing the contracts would bring zod into the browser.
const sent = (method: string, body: unknown): RequestInit => ({
  method,
  headers: { 'content-type': 'application/json' },
  body: JSON.stringify(body),
});

/** What one appliance took in, lost and is suspected of. */
export const useApplianceLeaks = (id: string) =>
  useQuery({
    queryKey: ['leaks', 'appliance', id] as const,
    queryFn: ({ signal }) => apiFetch<ApplianceLeaks>(`/api/appliances/${id}/leaks`, { signal }),
  });

/** The method of a site and what is known of each of its appliances. */
export const useSiteLeaks = (id: string) =>
  useQuery({
    queryKey: ['leaks', 'site', id] as const,
    queryFn: ({ signal }) => apiFetch<SiteLeaks>(`/api/sites/${id}/leaks`, { signal }),
  });

const useRenewLeaks = () => {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: ['leaks'] });
};

/** What a person chooses for a site. */
export type MethodDraft = { method: LeakRateMethod; version: number; why: string };

/** Chooses the method of a site; every leak rate is read anew afterwards. */
export const useChooseMethod = (siteId: string) => {
  const renew = useRenewLeaks();
  return useMutation({
    mutationFn: ({ why, ...draft }: MethodDraft) =>
      apiFetch<SiteMethod>(`/api/sites/${siteId}/leak-method`, sent('PUT', { ...draft, ...(why ? { why } : {}) })),
    onSuccess: renew,
  });
};

/** Says whether an appliance is of the residential and light commercial subsector. */
export const useStateSubsector = (applianceId: string) => {
  const renew = useRenewLeaks();
  return useMutation({
    mutationFn: (lightCommercial: boolean | null) =>
      apiFetch<{ id: string }>(`/api/appliances/${applianceId}/subsector`, sent('PUT', { lightCommercial })),
    onSuccess: renew,
  });
};
