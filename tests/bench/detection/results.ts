import { execFileSync } from 'node:child_process';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { machine } from '../machine';

const FILE = 'tests/bench/detection.json';

const git = (...args: string[]): string => execFileSync('git', args, { encoding: 'utf8' }).trim();

/** The commit that was measured, with `-dirty` where files differ from it; null outside of a checkout. */
const commit = (): string | null => {
  try {
    const differs = git('status', '--porcelain', '--untracked-files=no', '--', '.', `:!${FILE}`) !== '';
    return `${git('rev-parse', '--short', 'HEAD')}${differs ? '-dirty' : ''}`;
  } catch {
    return null;
  }
};

/** Puts the results of one set of companies into the file of results, in place of those of an earlier run of the set. */
export const keepResults = (set: string, results: object): void => {
  // Only this function writes the file.
  const before = existsSync(FILE) ? (JSON.parse(readFileSync(FILE, 'utf8')) as Record<string, unknown>) : {};
  const own = { measuredOn: new Date().toISOString(), commit: commit(), machine: machine(), ...results };
  writeFileSync(FILE, `${JSON.stringify({ ...before, [set]: own }, null, 2)}\n`);
};
