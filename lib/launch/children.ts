import { type ChildProcess, spawn } from 'node:child_process';

const running = new Set<ChildProcess>();

/** How a program ended. `output` is what it wrote, when it was not shown at once. */
export type Ended = { code: number; output: string };

type Options = { environment?: NodeJS.ProcessEnv; show?: boolean; limitMinutes?: number };

/** A child leads a group of its own, so that its own children end with it. */
const end = (child: ChildProcess, signal: NodeJS.Signals): void => {
  try {
    if (child.pid) process.kill(-child.pid, signal);
  } catch {
    // It has ended already.
  }
};

/** Ends every program that `runNode` has under way. */
export const endChildren = (): void => {
  for (const child of running) end(child, 'SIGTERM');
};
process.on('exit', endChildren);

/**
 * Runs a Node program without a terminal to the end and gives how it ended; one that takes longer than its limit is
 * ended and fails. `show` passes what it writes to standard error at once.
 */
export const runNode = (
  args: string[],
  { environment = process.env, show = false, limitMinutes = 20 }: Options = {},
): Promise<Ended> =>
  new Promise((resolve, reject) => {
    const output = show ? process.stderr : 'pipe';
    const child = spawn(process.execPath, args, {
      stdio: ['ignore', output, output],
      env: environment,
      detached: true,
    });
    running.add(child);
    let written = '';
    for (const stream of [child.stdout, child.stderr])
      stream?.on('data', (piece) => {
        written += String(piece);
      });
    const limit = setTimeout(() => {
      written += `\nEnded after ${limitMinutes} minutes.`;
      end(child, 'SIGKILL');
    }, limitMinutes * 60_000);
    child.once('error', reject);
    child.once('close', (code) => {
      clearTimeout(limit);
      running.delete(child);
      resolve({ code: code ?? 1, output: written });
    });
  });
