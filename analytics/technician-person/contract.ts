import { z } from 'zod';
import { scopeSchema } from '@/analytics/scope';
import { judgementShape } from '@/analytics/technicians/judgement-contract';

const share = z.number();
const day = z.iso.date();

/** What became of jobs since a coaching: shares of the full charge, good however often it is looked at. */
const changeSchema = z.object({
  jobsBefore: z.int(),
  jobsAfter: z.int(),
  before: share,
  after: share,
  difference: share,
  low: share,
  high: share,
  p: share,
  found: z.enum(['better', 'worse', 'no clear change']),
});

/**
 * One technician: how he compares with like jobs of colleagues in the scope, month by month, and since each coaching.
 * Says nothing of any colleague by name. `judgement` is null where he has no recovery in the scope.
 */
export const technicianPersonSchema = z.object({
  technician: z.string(),
  technicianId: z.uuid(),
  recoveries: z.int().nonnegative(),
  judgement: z.object(judgementShape).nullable(),
  /** Shares of the full charge. */
  course: z
    .object({
      months: z.array(
        z.object({
          month: z.string(),
          jobs: z.int(),
          effect: share,
          low: share,
          high: share,
          counts: z.boolean(),
        }),
      ),
      trend: z.object({ perYear: share, low: share, high: share, p: share }).nullable(),
      coaching: z.array(z.object({ startedOn: day, change: changeSchema.nullable() })),
    })
    .nullable(),
});

/** The scope whose jobs are compared; whom it names does not matter. */
export const technicianPersonQuery = scopeSchema;
export type TechnicianPerson = z.output<typeof technicianPersonSchema>;
