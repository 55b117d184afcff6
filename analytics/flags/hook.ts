import {
  infiniteQueryOptions,
  keepPreviousData,
  queryOptions,
  useInfiniteQuery,
  useMutation,
  useQuery,
  useQueryClient,
} from '@tanstack/react-query';
import type { ScopeQuery } from '@/analytics/scope-address';
import { apiFetch, searchString } from '@/lib/api/client';
import type { DisplayUnit, FlagDecision, FlagRule } from '@/lib/vocabulary';
import type { AssignableList, Flag, FlagsList } from './contract';
import type { FlagState } from './states';

// The contract's path as text: importing the contract would bring zod into the browser.
const PATH = '/api/flags';
const PAGE = 50;
const MOST_A_PAGE = 500;
const LOOK_AGAIN_MS = 3000;

/** Which flags are asked for. */
export type FlagsAsked = { scope: ScopeQuery; state: FlagState; rules: readonly FlagRule[]; unit: DisplayUnit };

const searchOf = ({ scope, state, rules, unit }: FlagsAsked, limit: number, cursor: string) =>
  searchString({ ...scope, state, rule: [...rules], unit, limit, cursor });

/** Flags, the surest first, page after page. */
export const useFlags = (asked: FlagsAsked) =>
  useInfiniteQuery(
    infiniteQueryOptions({
      queryKey: ['flags', asked] as const,
      queryFn: ({ pageParam, signal }) => apiFetch<FlagsList>(`${PATH}${searchOf(asked, PAGE, pageParam)}`, { signal }),
      initialPageParam: '',
      getNextPageParam: (page) => page.nextCursor,
      placeholderData: keepPreviousData,
      refetchInterval: ({ state: { data } }) => (data?.pages[0]?.renewing ? LOOK_AGAIN_MS : false),
    }),
  );

/** Every flag asked for: for a file, which leaves nothing out. */
export const fetchAllFlags = async (asked: FlagsAsked): Promise<Flag[]> => {
  const flags: Flag[] = [];
  let cursor: string | null = '';
  while (cursor !== null) {
    const page: FlagsList = await apiFetch<FlagsList>(`${PATH}${searchOf(asked, MOST_A_PAGE, cursor)}`);
    flags.push(...page.items);
    cursor = page.nextCursor;
  }
  return flags;
};

/** All flags of one record, whatever their state. */
export const useRecordFlags = (recovery: string, unit: DisplayUnit) =>
  useQuery(
    queryOptions({
      queryKey: ['flags', 'of record', recovery, unit] as const,
      queryFn: ({ signal }) =>
        apiFetch<FlagsList>(`${PATH}${searchString({ recovery, state: 'all', unit })}`, { signal }),
    }),
  );

/** Who may be asked to look; read when somebody asks. */
export const useAssignable = (wanted: boolean) =>
  useQuery(
    queryOptions({
      queryKey: ['flags', 'people'] as const,
      queryFn: ({ signal }) => apiFetch<AssignableList>(`${PATH}/people`, { signal }),
      enabled: wanted,
    }),
  );

const post = (path: string, body: unknown): Promise<Flag> =>
  apiFetch<Flag>(`${PATH}/${path}`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify(body),
  });

/** Everything that a decision may change is read anew. */
const useFlagWrite = <Given>(write: (given: Given) => Promise<Flag>) => {
  const client = useQueryClient();
  return useMutation({ mutationFn: write, onSuccess: () => client.invalidateQueries() });
};

/** Decides a flag and, with it, the other open reasons of its record. */
export const useDecide = () =>
  useFlagWrite(({ id, ...said }: { id: string; decision: FlagDecision; note: string }) =>
    post(`${id}/decision`, { ...said, wholeRecord: true }),
  );

/** Takes a decision back with all that followed from it. */
export const useReopen = () => useFlagWrite(({ id }: { id: string }) => post(`${id}/reopen`, {}));

/** Asks somebody to look, with what he ought to know. */
export const useAssign = () =>
  useFlagWrite(({ id, ...said }: { id: string; assignedTo: string | null; note: string }) =>
    post(`${id}/assign`, said),
  );
