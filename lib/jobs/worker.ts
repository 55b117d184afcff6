import 'server-only';
import { setTimeout as sleep } from 'node:timers/promises';
import { Logger, type Runner, run, type TaskList } from 'graphile-worker';
import { jobPool } from '@/db/client';
import { log } from '@/lib/log';
import { freeJobsOfDeadWorkers, type Liveness, openLiveness, shortenWaits } from './liveness';
import { TASKS, URGENT_TASKS } from './tasks';

const CONCURRENCY = 2;
const SWEEP_EVERY_MS = 3_000;
const RETRY_WITHIN_SECONDS = 3;
const TRY_AGAIN_AFTER_MS = 500;
/** After a lost database a job notices by itself that its connection is gone; one that does not is left behind. */
const STOP_WITHIN_MS = 3_000;

const queueLogger = new Logger(() => (level, message) => {
  if (level === 'error' || level === 'warning') log.warn({ queue: message }, 'queue');
  else log.debug({ queue: message }, 'queue');
});

/** A worker that goes on until it is told to stop. */
export type RunningWorker = { stop: () => Promise<void> };

const startRunner = (liveness: Liveness, taskList: TaskList): Promise<Runner> =>
  run({
    pgPool: jobPool(),
    taskList,
    concurrency: CONCURRENCY,
    pollInterval: 1_000,
    noHandleSignals: true,
    logger: queueLogger,
    parsedCronItems: [],
    preset: {
      // Without batches graphile-worker 0.17 reports a job's end and does not wait: when the database is away just then,
      // the rejected promise would end the process.
      worker: { completeJobBatchDelay: 0, failJobBatchDelay: 0 },
      plugins: [
        {
          name: 'liveness',
          version: '1.0.0',
          // Called, and waited for, before a worker asks for its first job. Jobs are locked in the pool's name.
          worker: { hooks: { startWorker: (_context, { worker }) => liveness.hold(worker.workerPool.id) } },
        },
      ],
    },
  });

const sweepUntil = async (ended: Promise<unknown>) => {
  let over = false;
  void ended.then(() => {
    over = true;
  });
  while (!over) {
    const freed = await freeJobsOfDeadWorkers(jobPool());
    if (freed) log.warn({ workers: freed }, 'took over the jobs of workers that ended without a word');
    await shortenWaits(jobPool(), URGENT_TASKS, RETRY_WITHIN_SECONDS);
    await Promise.race([ended, sleep(SWEEP_EVERY_MS, undefined, { ref: false })]);
  }
};

/** One life of a runner: from a database that answers to one that is gone, or to the wish to stop. */
const workUntil = async (stopWanted: Promise<void>, taskList: TaskList) => {
  const liveness = await openLiveness();
  try {
    const runner = await startRunner(liveness, taskList);
    const broken = runner.promise.catch(() => undefined);
    try {
      await sweepUntil(Promise.race([stopWanted, liveness.lost, broken]));
    } finally {
      await Promise.race([runner.stop().catch(() => undefined), sleep(STOP_WITHIN_MS)]);
    }
  } finally {
    await liveness.release();
  }
};

/**
 * Works the queue until stopped: the given tasks, and leaves others lie. A restarted database ends the runner; a new one begins as soon as the database
 * answers again, and frees what the old one (or a killed process) had locked.
 */
export const startWorker = (taskList: TaskList = TASKS): RunningWorker => {
  let stopping = false;
  let wantStop = () => {};
  const stopWanted = new Promise<void>((resolve) => {
    wantStop = resolve;
  });
  const work = async () => {
    while (!stopping) {
      await workUntil(stopWanted, taskList).catch((error: unknown) =>
        log.warn({ err: error }, 'the queue is out of reach'),
      );
      if (!stopping) await sleep(TRY_AGAIN_AFTER_MS);
    }
  };
  const ended = work();
  return {
    stop: () => {
      stopping = true;
      wantStop();
      return ended;
    },
  };
};
