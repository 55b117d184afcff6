import { rmSync } from 'node:fs';
import { resolve } from 'node:path';
import { startCluster } from '@/db/cluster/postgres';
import { prepareDatabase } from '@/db/cluster/prepare';
import { databaseUrls } from '@/db/cluster/urls';

const SECRET = 'a secret for tests only';

let teardownCluster = () => {};

/** A throw-away cluster for the run; each suite makes companies of its own in it. */
export const setup = async (): Promise<void> => {
  const folder = resolve('.local', 'test', `unit-${process.pid}`);
  const cluster = await startCluster(folder, SECRET, { say: () => undefined, throwAway: true });
  const urls = databaseUrls(cluster.adminUrl, SECRET);
  await prepareDatabase(urls, SECRET);
  process.env.SERVER_DATABASE_URL = urls.server;
  process.env.JOB_DATABASE_URL = urls.job;
  process.env.OWNER_DATABASE_URL = urls.owner;
  process.env.ADMIN_DATABASE_URL = urls.admin;
  process.env.NEXTAUTH_SECRET = SECRET;
  process.env.NEXTAUTH_URL = 'http://127.0.0.1:3000';
  teardownCluster = () => {
    cluster.stop();
    rmSync(folder, { recursive: true, force: true });
  };
};

export const teardown = (): void => teardownCluster();
