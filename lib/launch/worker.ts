import { openDatabase, say, serverEnvironment } from './local';

/** `npm run worker`: works the queue in a process of its own, beside servers that run with TAREBOOK_WORKER=apart. */
const main = async () => {
  const database = await openDatabase();
  Object.assign(process.env, serverEnvironment(database, 'http://127.0.0.1:3000'));
  // Loaded only now: the modules of the server read the environment when they load.
  const { startAllWork } = await import('@/analytics/tasks');
  const worker = startAllWork();
  say('working the queue');
  const stop = async () => {
    await worker.stop();
    if (database.cluster && !database.cluster.wasRunning) database.cluster.stop();
    process.exit(0);
  };
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) process.once(signal, () => void stop());
};

void main();
