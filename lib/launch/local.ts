import { resolve } from 'node:path';
import { type Cluster, startCluster } from '@/db/cluster/postgres';
import { keptSecret } from '@/db/cluster/secret';
import { type DatabaseUrls, databaseUrls } from '@/db/cluster/urls';

export const LOCAL_FOLDER = resolve('.local');

/** One line for the person at the terminal. */
export const say = (line: string): void => console.error(`tarebook: ${line}`);

/** The database in use and how to let go of it. */
export type OpenDatabase = { urls: DatabaseUrls; secret: string; cluster: Cluster | null };

/**
 * The database that `npm start` uses: the server of DATABASE_URL (somebody who may create roles), otherwise the private
 * cluster under .local, started if it does not run.
 */
export const openDatabase = async (): Promise<OpenDatabase> => {
  const secret = process.env.TAREBOOK_SECRET ?? keptSecret(LOCAL_FOLDER);
  if (process.env.DATABASE_URL) return { urls: databaseUrls(process.env.DATABASE_URL, secret), secret, cluster: null };
  const cluster = await startCluster(resolve(LOCAL_FOLDER, 'postgres'), secret, { say });
  return { urls: databaseUrls(cluster.adminUrl, secret), secret, cluster };
};

// Read before `enter` fills it in: only a person's own word counts as the public address.
const publicAddress = process.env.NEXTAUTH_URL;

/** Environment of the server process for a database and a public address. */
export const serverEnvironment = ({ urls, secret }: OpenDatabase, address: string): NodeJS.ProcessEnv => ({
  ...process.env,
  SERVER_DATABASE_URL: urls.server,
  JOB_DATABASE_URL: urls.job,
  NEXTAUTH_SECRET: secret,
  NEXTAUTH_URL: publicAddress ?? address,
});

/** Makes the database the one that code of this process works with. */
export const enter = (database: OpenDatabase, address = 'http://127.0.0.1:3000'): void => {
  Object.assign(process.env, serverEnvironment(database, address));
};
