import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import { resolve } from 'node:path';
import { LOCAL_FOLDER } from './local';
import { answers } from './serve';

const FILE = resolve(LOCAL_FOLDER, 'address');

/** Notes where the server of this checkout is reached, for the commands that print links; gone when the process ends. */
export const noteAddress = (address: string): void => {
  writeFileSync(FILE, address);
  process.on('exit', () => rmSync(FILE, { force: true }));
};

/** Where the server of this checkout is reached; null when none answers. */
export const runningAddress = async (): Promise<string | null> => {
  try {
    const address = readFileSync(FILE, 'utf8').trim();
    return (await answers(address)) ? address : null;
  } catch {
    return null;
  }
};
