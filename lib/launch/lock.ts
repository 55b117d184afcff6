import { mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { isAlive } from '@/lib/processes';

/** A lock that is being written or has just been let go of counts as held: the next look tells. */
const isHeld = (file: string): boolean => {
  try {
    const holder = Number(readFileSync(file, 'utf8'));
    return holder === 0 || isAlive(holder);
  } catch {
    return true;
  }
};

const take = (file: string): boolean => {
  try {
    writeFileSync(file, String(process.pid), { flag: 'wx' });
    return true;
  } catch {
    if (!isHeld(file)) rmSync(file, { force: true });
    return false;
  }
};

/** Does `work` while no other process of this checkout does it; a lock whose holder has died is taken over. */
export const alone = async <T>(file: string, work: () => Promise<T>): Promise<T> => {
  mkdirSync(dirname(file), { recursive: true });
  while (!take(file)) await sleep(200);
  const release = () => rmSync(file, { force: true });
  process.on('exit', release);
  try {
    return await work();
  } finally {
    process.off('exit', release);
    release();
  }
};
