import { runMigrations } from 'graphile-worker';
import { withConnection } from './roles';
import { DATABASE_ROLES, type DatabaseUrls } from './urls';

/**
 * Makes the queue's tables (kept by graphile-worker, owned by the job role) and the two doors through which a request
 * reaches it: put work in, and count what of one's own company waits. Both look only at the transaction's company.
 */
export const prepareQueue = async (urls: DatabaseUrls): Promise<void> => {
  await runMigrations({ connectionString: urls.job });
  await withConnection(urls.job, async (job) => {
    await job.query('create schema if not exists work');
    await job.query(`grant usage on schema work to ${DATABASE_ROLES.server}`);
    await job.query(`
      create or replace function work.enqueue(task text, payload json, key text) returns void
      language plpgsql security definer set search_path = pg_catalog, pg_temp as $$
      begin
        if payload->>'companyId' is distinct from nullif(current_setting('app.company_id', true), '') then
          raise exception 'work must belong to the company of the transaction';
        end if;
        -- One queue a company for its imports, and one more for each other kind of work: what is in one queue follows one
        -- another, and nobody waits for another company or at the screen for a renewal. Every start counts as an attempt,
        -- also one that a power cut ended; faults of the work itself give up much sooner (lib/jobs/task.ts).
        perform graphile_worker.add_job(task, payload, job_key => key, max_attempts => 25, queue_name =>
          concat_ws(' ', payload->>'companyId', case when task not in ('take-in-file', 'undo-import') then task end));
      end $$`);
    await job.query(`
      create or replace function work.pending() returns bigint
      language sql stable security definer set search_path = pg_catalog, pg_temp as $$
        select count(*) from graphile_worker.jobs
        where split_part(queue_name, ' ', 1) = nullif(current_setting('app.company_id', true), '') and attempts < max_attempts
      $$`);
    await job.query('revoke all on all functions in schema work from public');
    await job.query(`grant execute on all functions in schema work to ${DATABASE_ROLES.server}`);
  });
};
