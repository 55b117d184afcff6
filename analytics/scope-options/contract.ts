import { z } from 'zod';
import { defineContract } from '@/lib/api/contract';

const choice = z.object({
  /** As the scope parameter takes it; `unstated` for records that do not state the dimension. */
  value: z.string(),
  recoveries: z.number().int(),
});
const choices = z.array(choice);

/** What a scope can be narrowed to: every value that occurs in the records the viewer may see, with their number. */
export const scopeOptions = defineContract({
  path: '/api/scope-options',
  action: 'records:read',
  query: z.object({}),
  response: z.object({
    recoveries: z.number().int(),
    /** First and last local month with a record, `YYYY-MM`; null without records. */
    firstMonth: z.string().nullable(),
    lastMonth: z.string().nullable(),
    branch: choices,
    refrigerant: choices,
    technician: choices,
    site: choices,
    category: choices,
    jobType: choices,
  }),
});
export type ScopeOptions = z.output<typeof scopeOptions.response>;
export type ScopeChoice = z.output<typeof choice>;
