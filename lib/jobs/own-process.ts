import 'server-only';
import { spawn } from 'node:child_process';
import { setPriority } from 'node:os';

/** Pages go first. */
const NICE = 5;
const MOST_SAID = 4_000;

/**
 * Works for one company in a process of its own, for what would keep this one from answering. `file` as it lies in the
 * checkout, which is where every server of the product starts; it calls `workAlone`. Throws what went wrong there.
 */
export const inProcessOfItsOwn = (file: string, companyId: string): Promise<void> =>
  new Promise((resolve, reject) => {
    const child = spawn(process.execPath, ['--conditions=react-server', '--import', 'tsx', file, companyId], {
      stdio: ['pipe', 'ignore', 'pipe'],
    });
    let said = '';
    child.stderr.on('data', (text: Buffer) => {
      said = `${said}${text}`.slice(-MOST_SAID);
    });
    child.on('spawn', () => {
      if (child.pid) setPriority(child.pid, NICE);
    });
    child.on('error', reject);
    child.on('exit', (code, signal) =>
      code === 0 ? resolve() : reject(new Error(`${file} ended with ${code ?? signal}: ${said}`)),
    );
  });

/** The other end of it: does the work, and is gone with it or with whoever started the process. */
export const workAlone = (work: (companyId: string | undefined) => Promise<void>): void => {
  process.stdin.resume().on('end', () => process.exit(1));
  work(process.argv[2]).then(
    () => process.exit(0),
    (error: unknown) => {
      console.error(error);
      process.exit(1);
    },
  );
};
