import { openThrowAway } from '@/db/cluster/throw-away';
import { firstFreePort } from '@/lib/ports';
import { buildIfChanged } from './build';
import { enter, type OpenDatabase, say, serverEnvironment } from './local';
import { type Served, serve } from './serve';

/** What a benchmark gets: a database of its own, the built server on it, and what else the command line says. */
export type Bench = { database: OpenDatabase; served: Served; args: string[] };

const BENCHES: Record<string, () => Promise<{ run: (bench: Bench) => Promise<void> }>> = {
  import: () => import('@/tests/bench/import'),
  analytics: () => import('@/tests/bench/analytics'),
  flags: () => import('@/tests/bench/flags'),
  pages: () => import('@/tests/bench/pages'),
  detection: () => import('@/tests/bench/detection/through-import'),
};

/** `npm run bench` measures everything, `npm run bench -- import` one thing. Figures go to standard output. */
const main = async (): Promise<void> => {
  const [wanted, ...args] = process.argv.slice(2);
  const names = Object.keys(BENCHES).filter((name) => !wanted || name === wanted);
  if (!names.length)
    throw new Error(`There is no bench “${wanted}”: say ${Object.keys(BENCHES).join(', ')} or nothing.`);
  const { urls, secret } = await openThrowAway('bench', say);
  const database: OpenDatabase = { urls, secret, cluster: null };
  const port = await firstFreePort(Number(process.env.PORT ?? 3000));
  enter(database, `http://127.0.0.1:${port}`);
  await buildIfChanged(serverEnvironment(database, `http://127.0.0.1:${port}`));
  const served = await serve(database, port);
  // Before the database goes: a server without one fills the terminal with its complaints.
  process.prependListener('exit', () => served.process.kill('SIGKILL'));
  for (const name of names) {
    const bench = await BENCHES[name]?.();
    await bench?.run({ database, served, args });
  }
};

// Everything opened is let go of on exit.
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) process.on(signal, () => process.exit(130));
main().then(
  () => process.exit(0),
  (error: unknown) => {
    console.error(error);
    process.exit(1);
  },
);
