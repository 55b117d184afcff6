import { resolve } from 'node:path';
import { jobPool, serverPool } from '@/db/client';
import { prepareDatabase } from '@/db/cluster/prepare';
import { withConnection } from '@/db/cluster/roles';
import { env } from '@/lib/env';
import { runningAddress } from './address';
import { enter, LOCAL_FOLDER, type OpenDatabase, openDatabase } from './local';
import { alone } from './lock';

/** A mistake of whoever typed the command: the sentence is all there is to say. */
export class UsageError extends Error {}

const USUAL_ADDRESS = 'http://127.0.0.1:3000';

/** Whether somebody else is connected, so that a cluster must not be stopped under him. */
const othersConnected = ({ urls }: OpenDatabase): Promise<boolean> =>
  withConnection(urls.admin, async (admin) => {
    const { rowCount } = await admin.query(
      `select from pg_stat_activity where backend_type = 'client backend' and pid <> pg_backend_pid()`,
    );
    return Boolean(rowCount);
  });

const letGo = async (database: OpenDatabase): Promise<void> => {
  await Promise.all([serverPool().end(), jobPool().end()]);
  if (database.cluster && !database.cluster.wasRunning && !(await othersConnected(database))) database.cluster.stop();
};

/**
 * Runs a command of the command line against the database that `npm start` uses, whether that runs or not, and ends the
 * process: code 0, or 1 with a sentence on standard error. `read` reads the arguments, before anything is started;
 * `address` is where the product is reached.
 */
export const runCommand = async <Arguments>(
  read: () => Arguments,
  work: (given: Arguments, at: { database: OpenDatabase; address: string }) => Promise<void>,
): Promise<never> => {
  const run = async (given: Arguments): Promise<void> => {
    const database = await openDatabase();
    try {
      await prepareDatabase(database.urls, database.secret);
      enter(database, (await runningAddress()) ?? USUAL_ADDRESS);
      await work(given, { database, address: env().NEXTAUTH_URL });
    } finally {
      await letGo(database);
    }
  };
  try {
    const given = read();
    await alone(resolve(LOCAL_FOLDER, 'command.lock'), () => run(given));
    process.exit(0);
  } catch (error) {
    console.error(error instanceof Error ? error.message : error);
    process.exit(1);
  }
};
