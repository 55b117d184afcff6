import 'server-only';
import type { TaskList } from 'graphile-worker';
import { renewalPayload } from '@/analytics/flag-renewal/renew';
import { renewApart } from '@/analytics/flag-renewal/renew-apart';
import { requestDueFlags } from '@/analytics/flag-renewal/request-due';
import { digestApart, digestPayload } from '@/analytics/record-digest/digest';
import { requestDueDigests } from '@/analytics/record-digest/request-due';
import { jobHandler } from '@/lib/jobs/task';
import { TASKS } from '@/lib/jobs/tasks';
import { type RunningWorker, startWorker } from '@/lib/jobs/worker';
import { log } from '@/lib/log';

/** All background work, by the name under which `work.enqueue` takes it: imports, and what is computed from records. */
export const ALL_TASKS: TaskList = {
  ...TASKS,
  'renew-flags': jobHandler({
    payload: renewalPayload,
    run: renewApart,
    // What is due stays noted, so the next change or start takes it up again.
    giveUp: async ({ companyId }) => log.error({ companyId }, 'the flags were not renewed'),
  }),
  'digest-records': jobHandler({
    payload: digestPayload,
    run: digestApart,
    // Answers say on which records the last one stands; the next change asks again.
    giveUp: async ({ companyId }) => log.error({ companyId }, 'the records were not digested'),
  }),
};

const requestDue = async (): Promise<void> => {
  await requestDueFlags();
  await requestDueDigests();
};

/** Works the queue, all of it, and asks for the work that a new version of the product makes due. */
export const startAllWork = (): RunningWorker => {
  requestDue().catch((error: unknown) => log.warn({ err: error }, 'could not ask for the work that is due'));
  return startWorker(ALL_TASKS);
};
