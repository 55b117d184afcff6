import 'server-only';
import pg from 'pg';
import { env } from '@/lib/env';

/** First half of the advisory lock keys that say "this worker lives"; the second half is a hash of the worker's name. */
const LIVENESS = 8_273;

/** Proof that a worker lives: a session of its own that holds a lock for as long as the process and its connection last. */
export type Liveness = {
  /** Takes the lock for a worker's name; must be done before that worker takes its first job. */
  hold: (workerName: string) => Promise<void>;
  /** Resolves when the session is gone, whoever ended it. */
  lost: Promise<void>;
  release: () => Promise<void>;
};

/** Opens the session; throws when the database does not answer. */
export const openLiveness = async (): Promise<Liveness> => {
  const client = new pg.Client({ connectionString: env().JOB_DATABASE_URL, keepAlive: true });
  const lost = new Promise<void>((resolve) => {
    client.on('error', () => resolve());
    client.on('end', () => resolve());
  });
  await client.connect();
  // An idle session is its purpose.
  await client.query('set idle_session_timeout = 0');
  return {
    hold: async (workerName) => {
      await client.query('select pg_advisory_lock($1, hashtext($2))', [LIVENESS, workerName]);
    },
    lost,
    release: () => client.end().catch(() => undefined),
  };
};

/**
 * Frees the jobs of workers that are dead, which graphile-worker alone would do after four hours, and lets them run at
 * once. A worker is dead when its lock can be had. Gives the number of workers found dead.
 */
export const freeJobsOfDeadWorkers = async (pool: pg.Pool): Promise<number> => {
  const client = await pool.connect();
  try {
    await client.query('begin');
    const dead = await client.query<{ name: string }>(
      `select name from (select distinct locked_by as name from graphile_worker.jobs where locked_by is not null) holder
       where pg_try_advisory_xact_lock($1, hashtext(name))`,
      [LIVENESS],
    );
    const names = dead.rows.map(({ name }) => name);
    if (names.length) {
      const jobs = await client.query<{ id: string }>('select id from graphile_worker.jobs where locked_by = any($1)', [
        names,
      ]);
      await client.query('select graphile_worker.force_unlock_workers($1)', [names]);
      const ids = jobs.rows.map(({ id }) => id);
      await client.query('select graphile_worker.reschedule_jobs($1::bigint[], run_at => now())', [ids]);
    }
    await client.query('commit');
    return names.length;
  } catch (error) {
    await client.query('rollback').catch(() => undefined);
    throw error;
  } finally {
    client.release();
  }
};

/**
 * graphile-worker lets each retry wait longer, up to six hours. Retries of these tasks wait a few seconds at most: what
 * is tried again at all failed because something was away.
 */
export const shortenWaits = async (pool: pg.Pool, tasks: string[], seconds: number): Promise<void> => {
  await pool.query(
    `select graphile_worker.reschedule_jobs(array_agg(id), run_at => now() + make_interval(secs => $2))
     from graphile_worker.jobs
     where task_identifier = any($1) and locked_by is null and attempts > 0
       and run_at > now() + make_interval(secs => $2)
     having count(*) > 0`,
    [tasks, seconds],
  );
};
