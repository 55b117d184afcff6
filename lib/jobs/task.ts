import 'server-only';
import type { JobHelpers } from 'graphile-worker';
import { z } from 'zod';
import { AppError } from '@/lib/errors';
import { log } from '@/lib/log';
import { isConnectionLoss } from './connection-loss';

/** A fault of the work itself is tried this often; a lost connection or a killed process only costs time. */
const MOST_FAULTS = 3;

/** A kind of background work: what its payload looks like, what is done, and how to tell the person that it failed. */
export type Task<Payload extends z.ZodType> = {
  payload: Payload;
  run: (payload: z.output<Payload>) => Promise<void>;
  /** Called once, after the last try, with a sentence for the person. */
  giveUp: (payload: z.output<Payload>, sentence: string) => Promise<void>;
};

const GENERAL_SENTENCE = 'The fault is on our side and has been logged. Nothing was changed; try it again later.';

/**
 * The handler that graphile-worker calls. A refusal meant for the person (AppError) is told and not tried again; other
 * faults are tried again by the queue until they have come MOST_FAULTS times.
 */
export const jobHandler =
  <Payload extends z.ZodType>(task: Task<Payload>) =>
  async (input: unknown, { job }: JobHelpers): Promise<void> => {
    const payload = task.payload.parse(input);
    try {
      await task.run(payload);
    } catch (error) {
      if (isConnectionLoss(error)) throw error;
      if (error instanceof AppError) return task.giveUp(payload, error.message);
      log.error({ task: job.task_identifier, jobId: job.id, attempt: job.attempts, err: error }, 'job failed');
      if (job.attempts < MOST_FAULTS) throw error;
      await task.giveUp(payload, GENERAL_SENTENCE);
    }
  };

/** What work on an import needs to know. */
export const importPayload = z.object({
  companyId: z.uuid(),
  importId: z.uuid(),
  /** Who asked for it; stands in the history. */
  actor: z.string(),
});
export type ImportPayload = z.infer<typeof importPayload>;
