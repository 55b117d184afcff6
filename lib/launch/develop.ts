import { spawn } from 'node:child_process';
import { prepareDatabase } from '@/db/cluster/prepare';
import { firstFreePort } from '@/lib/ports';
import { seedDemoIfEmpty } from '@/seed/demo';
import { enter, openDatabase, say, serverEnvironment } from './local';

// What `npm start` does, with Next's development server in place of a build.
const main = async (): Promise<void> => {
  const database = await openDatabase();
  await prepareDatabase(database.urls, database.secret);
  enter(database);
  if (process.env.TAREBOOK_DEMO !== 'off') await seedDemoIfEmpty(database.urls, say);
  const port = await firstFreePort(Number(process.env.PORT ?? 3000));
  const next = ['node_modules/next/dist/bin/next', 'dev', '-H', '127.0.0.1', '-p', String(port)];
  const child = spawn(process.execPath, next, {
    stdio: 'inherit',
    env: {
      ...serverEnvironment(database, `http://127.0.0.1:${port}`),
      NODE_ENV: 'development',
      NEXT_TELEMETRY_DISABLED: '1',
    },
  });
  const stop = (code: number) => {
    child.kill('SIGTERM');
    if (database.cluster && !database.cluster.wasRunning) database.cluster.stop();
    process.exit(code);
  };
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) process.on(signal, () => stop(0));
  child.on('exit', (code) => stop(code ?? 1));
};

main().catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : error);
  process.exit(1);
});
