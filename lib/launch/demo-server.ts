import { closeSync, existsSync, openSync } from 'node:fs';
import { join } from 'node:path';
import { openThrowAway, type ThrowAway } from '@/db/cluster/throw-away';
import { installDebianPackages } from '@/lib/debian';
import { freePort } from '@/lib/ports';
import { DEMO_SIGN_INS, seedDemoIfEmpty } from '@/seed/demo';
import { addEmptyCompany } from '@/tests/support/browser-company';
import { buildIfChanged } from './build';
import { CHROMIUM } from './chromium';
import { enter, say, serverEnvironment } from './local';
import { serve } from './serve';

/** The built application on a database of its own, for a browser to visit. */
export type DemoServer = { address: string; signIns: { role: string; email: string; password: string }[] };

const onDatabase = async <T>(database: ThrowAway, visit: (server: DemoServer) => Promise<T>): Promise<T> => {
  const opened = { ...database, cluster: null };
  enter(opened);
  await seedDemoIfEmpty(database.urls, say);
  const signIns = [...DEMO_SIGN_INS, await addEmptyCompany()];
  const port = await freePort();
  await buildIfChanged(serverEnvironment(opened, `http://127.0.0.1:${port}`));
  const log = openSync(join(database.folder, 'server.log'), 'w');
  const served = await serve(opened, port, log);
  const end = () => served.process.kill('SIGTERM');
  process.on('exit', end);
  try {
    return await visit({ address: served.address, signIns });
  } finally {
    process.off('exit', end);
    end();
    closeSync(log);
  }
};

/**
 * Serves the demo company and one without a record from a throw-away database for as long as `visit` takes; installs
 * Chromium where it is missing. `name` is the database folder's.
 */
export const withDemoServer = async <T>(name: string, visit: (server: DemoServer) => Promise<T>): Promise<T> => {
  if (!existsSync(CHROMIUM)) installDebianPackages(['chromium'], { say });
  const database = await openThrowAway(name, say);
  try {
    return await onDatabase(database, visit);
  } finally {
    database.destroy();
  }
};
