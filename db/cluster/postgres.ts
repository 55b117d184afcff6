import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { freePort } from '@/lib/ports';
import { findPostgres, requirePostgres } from './binaries';
import { handOver, possibleFolders, reachableFolder, run, succeeds } from './commands';
import { withConnection } from './roles';
import { rolePassword } from './urls';

/** A running private cluster. */
export type Cluster = { adminUrl: string; dataFolder: string; wasRunning: boolean; stop: () => void };

const create = (bin: string, data: string, secret: string): void => {
  const passwordFile = `${data}.password`;
  writeFileSync(passwordFile, rolePassword(secret, 'admin'), { mode: 0o600 });
  handOver(passwordFile);
  const access = ['-U', 'postgres', '-A', 'scram-sha-256', '--pwfile', passwordFile];
  run(join(bin, 'initdb'), ['-D', data, ...access, '-E', 'UTF8', '--locale=C.UTF-8', '--no-instructions']);
  rmSync(passwordFile, { force: true });
};

const launch = async (bin: string, base: string, throwAway: boolean): Promise<void> => {
  const settings = [
    `port=${await freePort()}`,
    'listen_addresses=127.0.0.1',
    "unix_socket_directories=''",
    'max_connections=60',
    'shared_buffers=256MB',
    'max_wal_size=2GB',
    ...(throwAway ? ['fsync=off', 'full_page_writes=off', 'synchronous_commit=off'] : []),
  ];
  const options = settings.map((setting) => `-c ${setting}`).join(' ');
  const data = ['-D', join(base, 'data')];
  run(join(bin, 'pg_ctl'), ['start', '-w', '-t', '120', ...data, '-l', join(base, 'postgres.log'), '-o', options]);
};

const makeDatabase = (adminUrl: string, name: string): Promise<void> =>
  withConnection(adminUrl, async (admin) => {
    const exists = await admin.query('select from pg_database where datname = $1', [name]);
    if (!exists.rowCount) await admin.query(`create database ${admin.escapeIdentifier(name)}`);
  });

/**
 * Starts (or finds running) the private cluster under `folder` on a free loopback port and makes the database `name`.
 * `throwAway` trades safety against power loss for speed; it is for tests.
 */
export const startCluster = async (
  folder: string,
  secret: string,
  { say, name = 'tarebook', throwAway = false }: { say: (line: string) => void; name?: string; throwAway?: boolean },
): Promise<Cluster> => {
  const bin = requirePostgres(say);
  const base = reachableFolder(folder);
  const data = join(base, 'data');
  if (!existsSync(join(data, 'PG_VERSION'))) {
    say('making a private PostgreSQL cluster');
    create(bin, data, secret);
  }
  const wasRunning = succeeds(join(bin, 'pg_ctl'), ['status', '-D', data]);
  if (!wasRunning) await launch(bin, base, throwAway);
  // Line 4 of the lock file is the port the server really listens on.
  const port = readFileSync(join(data, 'postmaster.pid'), 'utf8').split('\n')[3];
  const url = (database: string) =>
    `postgresql://postgres:${rolePassword(secret, 'admin')}@127.0.0.1:${port}/${database}`;
  await makeDatabase(url('postgres'), name);
  return {
    adminUrl: url(name),
    dataFolder: data,
    wasRunning,
    stop: () => run(join(bin, 'pg_ctl'), ['stop', '-m', 'fast', '-w', '-D', data]),
  };
};

/** Stops the cluster wanted at `folder`, running or not, half made or whole, and removes it with its data. */
export const destroyCluster = (folder: string): void => {
  const bin = findPostgres();
  for (const base of possibleFolders(folder)) {
    const data = join(base, 'data');
    if (bin && existsSync(join(data, 'postmaster.pid')))
      succeeds(join(bin, 'pg_ctl'), ['stop', '-m', 'immediate', '-w', '-D', data]);
    rmSync(base, { recursive: true, force: true });
  }
};
