import { type ChildProcess, spawn } from 'node:child_process';
import { setTimeout as sleep } from 'node:timers/promises';
import { type OpenDatabase, serverEnvironment } from './local';

/** Whether a server answers at the address, its database included. */
export const answers = async (address: string): Promise<boolean> => {
  const response = await fetch(`${address}/api/health`, { signal: AbortSignal.timeout(2000) }).catch(() => null);
  return response?.status === 200;
};

/** A running server process. */
export type Served = { address: string; process: ChildProcess };

/**
 * Starts the built application and waits until /api/health answers 200; throws when the process ends first. `log` is
 * where the server writes: the terminal, or an open file.
 */
export const serve = async (
  database: OpenDatabase,
  port: number,
  log: 'inherit' | number = 'inherit',
): Promise<Served> => {
  const address = `http://127.0.0.1:${port}`;
  const child = spawn(
    process.execPath,
    ['node_modules/next/dist/bin/next', 'start', '-H', '127.0.0.1', '-p', String(port)],
    {
      stdio: ['ignore', log === 'inherit' ? process.stderr : log, log],
      env: { ...serverEnvironment(database, address), NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' },
    },
  );
  while (!(await answers(address))) {
    if (child.exitCode !== null || child.signalCode) throw new Error('The server ended before it was ready.');
    await sleep(100);
  }
  return { address, process: child };
};
