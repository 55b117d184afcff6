import { execFileSync, spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { mkdirSync } from 'node:fs';
import { join } from 'node:path';

const AS_ROOT = process.getuid?.() === 0;

/** PostgreSQL refuses to run as root, so root hands its commands to the postgres account. */
const asPostgres = (command: string, args: string[]): [string, string[]] =>
  AS_ROOT ? ['runuser', ['-u', 'postgres', '--', command, ...args]] : [command, args];

/** Runs a program as the cluster's account; throws with what it said when it fails. */
export const run = (command: string, args: string[]): void => {
  const [file, all] = asPostgres(command, args);
  execFileSync(file, all, { cwd: '/', encoding: 'utf8', stdio: ['ignore', 'pipe', 'pipe'] });
};

/** Whether a program ends well when run as the cluster's account. */
export const succeeds = (command: string, args: string[]): boolean => {
  const [file, all] = asPostgres(command, args);
  return spawnSync(file, all, { cwd: '/', stdio: 'ignore' }).status === 0;
};

/** Gives a file or folder to the cluster's account. */
export const handOver = (path: string): void => {
  if (AS_ROOT) execFileSync('chown', ['postgres:', path]);
};

/** Where a cluster lies whose account cannot reach the wanted folder (a checkout under /root): among the system's data. */
const besideSystemData = (wanted: string): string =>
  join('/var/tmp', `tarebook-${createHash('sha256').update(wanted).digest('hex').slice(0, 12)}`);

/** The two folders in one of which the cluster wanted at `wanted` lies. */
export const possibleFolders = (wanted: string): string[] => [wanted, besideSystemData(wanted)];

/** Makes the folder of a cluster, in the checkout if the cluster's account can get there; gives where it is. */
export const reachableFolder = (wanted: string): string => {
  mkdirSync(wanted, { recursive: true });
  if (!AS_ROOT) return wanted;
  const folder = succeeds('test', ['-x', wanted]) ? wanted : besideSystemData(wanted);
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  handOver(folder);
  return folder;
};
