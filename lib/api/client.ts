import type { z } from 'zod';
import type { Contract } from './contract';

/** What the server said when it refused: the sentence for the person, the status, the faults by field. */
export class ApiError extends Error {
  constructor(
    readonly status: number,
    detail: string,
    readonly errors: { path: string; message: string }[] = [],
  ) {
    super(detail);
  }
}

type Problem = { detail?: string; errors?: { path: string; message: string }[] };

/** Fetches and gives the parsed JSON; throws ApiError with the server's own sentence. */
export const apiFetch = async <T>(path: string, init?: RequestInit): Promise<T> => {
  const response = await fetch(path, init).catch(() => {
    throw new ApiError(0, 'The server could not be reached. Check the connection and try again.');
  });
  if (!response.ok) {
    const problem = (await response.json().catch(() => ({}))) as Problem;
    throw new ApiError(response.status, problem.detail ?? 'The server refused without a reason.', problem.errors);
  }
  return (await response.json()) as T;
};

/** Repeats a key for each value of a list; leaves out what is empty. */
export const searchString = (query: Record<string, string | readonly string[] | number | undefined>): string => {
  const params = new URLSearchParams();
  for (const [key, value] of Object.entries(query)) {
    for (const one of Array.isArray(value) ? value : [value]) {
      if (one !== undefined && one !== '') params.append(key, String(one));
    }
  }
  const text = params.toString();
  return text ? `?${text}` : '';
};

/** Asks a contract's route. Types come from its schemas; the server has checked the answer against the same ones. */
export const apiGet = <Query extends z.ZodType, Answer extends z.ZodType>(
  contract: Contract<Query, Answer>,
  query: Record<string, string | readonly string[] | number | undefined>,
  signal?: AbortSignal,
): Promise<z.output<Answer>> => apiFetch(`${contract.path}${searchString(query)}`, signal ? { signal } : undefined);
