import { existsSync, readdirSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { isAlive } from '@/lib/processes';
import { destroyCluster, startCluster } from './postgres';
import { prepareDatabase } from './prepare';
import { type DatabaseUrls, databaseUrls } from './urls';

const FOLDER = resolve('.local', 'test');
const SECRET = 'a secret for tests only';

/** A prepared database that ends with the process that opened it. */
export type ThrowAway = { urls: DatabaseUrls; secret: string; folder: string; destroy: () => void };

/** Removes what a process left behind that was killed too hard to clean up itself. */
const sweep = (): void => {
  for (const name of existsSync(FOLDER) ? readdirSync(FOLDER) : []) {
    const pid = Number(name.match(/-(\d+)$/)?.[1]);
    if (pid && !isAlive(pid)) destroyCluster(join(FOLDER, name));
  }
};

/** Opens a database of this process's own in a cluster of its own. It is removed by `destroy`, or at the latest on exit. */
export const openThrowAway = async (kind: string, say: (line: string) => void = () => {}): Promise<ThrowAway> => {
  sweep();
  const folder = join(FOLDER, `${kind}-${process.pid}`);
  const destroy = () => {
    process.off('exit', destroy);
    destroyCluster(folder);
  };
  process.on('exit', destroy);
  const cluster = await startCluster(folder, SECRET, { say, throwAway: true });
  const urls = databaseUrls(cluster.adminUrl, SECRET);
  await prepareDatabase(urls, SECRET);
  return { urls, secret: SECRET, folder, destroy };
};
