import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { say } from './local';

const SOURCES = [
  'app',
  'components',
  'db',
  'lib',
  'analytics',
  'public',
  'next.config.ts',
  'postcss.config.mjs',
  'proxy.ts',
  'instrumentation.ts',
  'package.json',
  'package-lock.json',
  'tsconfig.json',
];
const STAMP = '.next/built-from';

const files = (path: string): string[] => {
  if (!existsSync(path)) return [];
  if (!statSync(path).isDirectory()) return [path];
  return readdirSync(path)
    .sort()
    .flatMap((name) => files(join(path, name)));
};

const fingerprint = (): string => {
  const hash = createHash('sha256');
  for (const file of SOURCES.flatMap(files)) hash.update(file).update('\0').update(readFileSync(file)).update('\0');
  return hash.digest('hex');
};

/** Builds the application when its sources are not the ones of the last build; throws when the build fails. */
export const buildIfChanged = (environment: NodeJS.ProcessEnv): void => {
  const now = fingerprint();
  if (existsSync(STAMP) && existsSync('.next/BUILD_ID') && readFileSync(STAMP, 'utf8') === now) return;
  say('building');
  const built = spawnSync(process.execPath, ['node_modules/next/dist/bin/next', 'build'], {
    encoding: 'utf8',
    env: { ...environment, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' },
  });
  if (built.status !== 0) throw new Error(`The build failed:\n${built.stdout}${built.stderr}`);
  writeFileSync(STAMP, now);
};
