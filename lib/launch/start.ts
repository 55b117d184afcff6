import { prepareDatabase } from '@/db/cluster/prepare';
import { firstFreePort } from '@/lib/ports';
import { DEMO_SIGN_INS, seedDemoIfEmpty } from '@/seed/demo';
import { noteAddress } from './address';
import { buildIfChanged } from './build';
import { enter, openDatabase, say, serverEnvironment } from './local';
import { serve } from './serve';

const main = async () => {
  const database = await openDatabase();
  let stopping = false;
  let stopServer = () => {};
  const stop = (code: number) => {
    if (stopping) return;
    stopping = true;
    stopServer();
    // Another start of the same checkout may have found the cluster running: who started it stops it.
    if (database.cluster && !database.cluster.wasRunning) database.cluster.stop();
    process.exit(code);
  };
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) process.on(signal, () => stop(0));
  try {
    await prepareDatabase(database.urls, database.secret);
    enter(database);
    const withDemo = process.env.TAREBOOK_DEMO !== 'off';
    if (withDemo) await seedDemoIfEmpty(database.urls, say);
    const port = await firstFreePort(Number(process.env.PORT ?? 3000));
    await buildIfChanged(serverEnvironment(database, `http://127.0.0.1:${port}`));
    const served = await serve(database, port);
    stopServer = () => served.process.kill('SIGTERM');
    served.process.on('exit', (code) => stop(code ?? 1));
    noteAddress(served.address);
    console.log(`ready ${served.address}`);
    if (!withDemo) return;
    console.log('demo, with passwords that everybody may know:');
    for (const { role, email, password } of DEMO_SIGN_INS)
      console.log(`  ${role.padEnd(12)} ${email.padEnd(32)} ${password}`);
  } catch (error) {
    console.error(error instanceof Error ? error.message : error);
    stop(1);
  }
};

void main();
