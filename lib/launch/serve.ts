import { type ChildProcess, spawn } from 'node:child_process';
import { createServer } from 'node:net';
import { setTimeout as sleep } from 'node:timers/promises';
import { type OpenDatabase, serverEnvironment } from './local';

const isFree = (port: number): Promise<boolean> =>
  new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', () => resolve(false));
    probe.listen(port, '127.0.0.1', () => probe.close(() => resolve(true)));
  });

/** The first free loopback port from `wanted` on; throws after a hundred taken ones. */
export const firstFreePort = async (wanted: number): Promise<number> => {
  for (let port = wanted; port < wanted + 100; port++) if (await isFree(port)) return port;
  throw new Error(`No free port between ${wanted} and ${wanted + 99}.`);
};

const answers = async (address: string): Promise<boolean> => {
  const response = await fetch(`${address}/api/health`, { signal: AbortSignal.timeout(2000) }).catch(() => null);
  return response?.status === 200;
};

/** A running server process. */
export type Served = { address: string; process: ChildProcess };

/** Starts the built application and waits until /api/health answers 200; throws when the process ends first. */
export const serve = async (
  database: OpenDatabase,
  port: number,
  output: 'inherit' | 'ignore' = 'inherit',
): Promise<Served> => {
  const address = `http://127.0.0.1:${port}`;
  const child = spawn(
    process.execPath,
    ['node_modules/next/dist/bin/next', 'start', '-H', '127.0.0.1', '-p', String(port)],
    {
      stdio: ['ignore', output === 'inherit' ? process.stderr : 'ignore', output],
      env: { ...serverEnvironment(database, address), NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' },
    },
  );
  while (!(await answers(address))) {
    if (child.exitCode !== null || child.signalCode) throw new Error('The server ended before it was ready.');
    await sleep(100);
  }
  return { address, process: child };
};
