import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { findPostgres } from '@/db/cluster/binaries';
import { run } from '@/db/cluster/commands';
import { withConnection } from '@/db/cluster/roles';
import { openThrowAway } from '@/db/cluster/throw-away';
import { isAlive } from '@/lib/processes';

/** The fourth field of /proc/<pid>/stat, after the name in parentheses, is the parent (proc(5)). */
const parentOf = (pid: number): number | null => {
  try {
    return Number(readFileSync(`/proc/${pid}/stat`, 'utf8').split(') ')[1]?.split(' ')[1]);
  } catch {
    return null;
  }
};

const childrenOf = (parent: number): number[] =>
  readdirSync('/proc')
    .map(Number)
    .filter((pid) => pid > 0 && parentOf(pid) === parent);

const end = (pid: number) => {
  try {
    process.kill(pid, 'SIGKILL');
  } catch {
    // It ended by itself in between.
  }
};

/** A database of the test's own whose processes can be killed and started again at the same address. */
export const openKillableDatabase = async () => {
  const database = await openThrowAway('kills');
  const bin = findPostgres();
  if (!bin) throw new Error('PostgreSQL is not installed.');
  const data = await withConnection(database.urls.admin, async (admin) => {
    // Throw-away databases do not wait for the log to be written; what was confirmed must be in it here.
    await admin.query('alter database tarebook set synchronous_commit = on');
    const { rows } = await admin.query<{ data_directory: string }>('show data_directory');
    return rows[0]?.data_directory ?? '';
  });
  return {
    ...database,
    /** Kills the postmaster and every child of it, and starts the database again: it recovers from its log. */
    killAndStart: async () => {
      const postmaster = Number(readFileSync(join(data, 'postmaster.pid'), 'utf8').split('\n')[0]);
      const pids = [postmaster, ...childrenOf(postmaster)];
      for (const pid of pids) end(pid);
      while (pids.some(isAlive)) await sleep(10);
      // `restart` takes the options, and so the port, of the last start.
      run(join(bin, 'pg_ctl'), ['restart', '-w', '-t', '60', '-D', data, '-l', join(data, '..', 'postgres.log')]);
    },
  };
};
