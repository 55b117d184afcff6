import { execFileSync, spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { join } from 'node:path';
import { withConnection } from './roles';
import { rolePassword } from './urls';

const DEBIAN_POSTGRES = '/usr/lib/postgresql';
const AS_ROOT = process.getuid?.() === 0;

/** A running private cluster. */
export type Cluster = { adminUrl: string; dataFolder: string; wasRunning: boolean; stop: () => void };

const newestBin = (): string | null => {
  if (!existsSync(DEBIAN_POSTGRES)) return null;
  const versions = readdirSync(DEBIAN_POSTGRES)
    .map(Number)
    .filter((v) => v >= 15 && existsSync(join(DEBIAN_POSTGRES, String(v), 'bin/initdb')))
    .sort((a, b) => b - a);
  return versions.length ? join(DEBIAN_POSTGRES, String(versions[0]), 'bin') : null;
};

/** Installs PostgreSQL from Debian's packages where it is missing; throws with the one line to run where it may not. */
const requirePostgres = (say: (line: string) => void): string => {
  const found = newestBin();
  if (found) return found;
  const line = 'apt-get update && apt-get install -y postgresql';
  const sudo = AS_ROOT ? [] : spawnSync('sudo', ['-n', 'true']).status === 0 ? ['sudo', '-n'] : null;
  if (!sudo) throw new Error(`PostgreSQL is missing. Run this once as root, then start again:\n  ${line}`);
  say('installing PostgreSQL from Debian packages');
  const shell = `export DEBIAN_FRONTEND=noninteractive; ${line.replaceAll('apt-get', 'apt-get -q')}`;
  execFileSync([...sudo, 'sh'][0] as string, [...sudo.slice(1), ...(sudo.length ? ['sh'] : []), '-c', shell], {
    stdio: ['ignore', 'ignore', 'inherit'],
  });
  const installed = newestBin();
  if (!installed) throw new Error('PostgreSQL 15 or newer was not found after installing Debian’s postgresql package.');
  return installed;
};

/** PostgreSQL refuses to run as root, so root hands its commands to the postgres account. */
const run = (command: string, args: string[], cwd = '/'): string => {
  const [file, all] = AS_ROOT ? ['runuser', ['-u', 'postgres', '--', command, ...args]] : [command, args];
  return execFileSync(file, all, { cwd, encoding: 'utf8', stdio: ['ignore', 'pipe', 'pipe'] });
};

/** Where the cluster lies: in the checkout if its account can get there, otherwise beside the system's other data. */
const reachableFolder = (wanted: string): string => {
  mkdirSync(wanted, { recursive: true });
  if (!AS_ROOT) return wanted;
  const reachable = spawnSync('runuser', ['-u', 'postgres', '--', 'test', '-x', wanted]).status === 0;
  const folder = reachable
    ? wanted
    : join('/var/tmp', `tarebook-${createHash('sha256').update(wanted).digest('hex').slice(0, 12)}`);
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  execFileSync('chown', ['postgres:', folder]);
  return folder;
};

const freePort = (): Promise<number> =>
  new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen(0, '127.0.0.1', () => {
      const address = probe.address();
      probe.close(() =>
        address && typeof address === 'object' ? resolve(address.port) : reject(new Error('no free port')),
      );
    });
  });

const create = (bin: string, data: string, secret: string) => {
  const passwordFile = `${data}.password`;
  writeFileSync(passwordFile, rolePassword(secret, 'admin'), { mode: 0o600 });
  if (AS_ROOT) execFileSync('chown', ['postgres:', passwordFile]);
  run(join(bin, 'initdb'), [
    '-D',
    data,
    '-U',
    'postgres',
    '-A',
    'scram-sha-256',
    '--pwfile',
    passwordFile,
    '-E',
    'UTF8',
    '--locale=C.UTF-8',
    '--no-instructions',
  ]);
  execFileSync('rm', ['-f', passwordFile]);
};

/**
 * Starts (or finds running) the private cluster under `folder` on a free loopback port and makes the database `name`.
 * `throwAway` trades safety against power loss for speed; it is for tests.
 */
export const startCluster = async (
  folder: string,
  secret: string,
  options: { say: (line: string) => void; name?: string; throwAway?: boolean },
): Promise<Cluster> => {
  const bin = requirePostgres(options.say);
  const base = reachableFolder(folder);
  const data = join(base, 'data');
  const name = options.name ?? 'tarebook';
  if (!existsSync(join(data, 'PG_VERSION'))) {
    options.say('making a private PostgreSQL cluster');
    create(bin, data, secret);
  }
  const running = () =>
    spawnSync(
      AS_ROOT ? 'runuser' : join(bin, 'pg_ctl'),
      AS_ROOT ? ['-u', 'postgres', '--', join(bin, 'pg_ctl'), 'status', '-D', data] : ['status', '-D', data],
      { cwd: '/' },
    ).status === 0;
  const wasRunning = running();
  if (!wasRunning) {
    const port = await freePort();
    const flags = [
      `-c port=${port}`,
      '-c listen_addresses=127.0.0.1',
      "-c unix_socket_directories=''",
      '-c max_connections=60',
      '-c shared_buffers=256MB',
      '-c max_wal_size=2GB',
      ...(options.throwAway ? ['-c fsync=off', '-c full_page_writes=off', '-c synchronous_commit=off'] : []),
    ];
    run(join(bin, 'pg_ctl'), [
      'start',
      '-w',
      '-t',
      '120',
      '-D',
      data,
      '-l',
      join(base, 'postgres.log'),
      '-o',
      flags.join(' '),
    ]);
  }
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

const makeDatabase = async (adminUrl: string, name: string) => {
  await withConnection(adminUrl, async (admin) => {
    const exists = await admin.query('select from pg_database where datname = $1', [name]);
    if (!exists.rowCount) await admin.query(`create database ${admin.escapeIdentifier(name)}`);
  });
};
