import type { z } from 'zod';
import type { Action } from '@/lib/auth/permissions';

/** What a route promises: where it is, who may ask, what it takes and gives. Both sides read it. */
export type Contract<Query extends z.ZodType, Response extends z.ZodType> = {
  path: string;
  action: Action;
  query: Query;
  response: Response;
};

/** Names the types of a contract without widening them. */
export const defineContract = <Query extends z.ZodType, Response extends z.ZodType>(
  contract: Contract<Query, Response>,
): Contract<Query, Response> => contract;
