import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { runNode } from './children';
import { LOCAL_FOLDER, say } from './local';
import { alone } from './lock';

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

const isBuilt = (now: string): boolean =>
  existsSync(STAMP) && existsSync('.next/BUILD_ID') && readFileSync(STAMP, 'utf8') === now;

/** Builds the application when its sources are not the ones of the last build; throws when the build fails. */
export const buildIfChanged = (environment: NodeJS.ProcessEnv): Promise<void> =>
  alone(join(LOCAL_FOLDER, 'build.lock'), async () => {
    const now = fingerprint();
    if (isBuilt(now)) return;
    say('building');
    const built = await runNode(['node_modules/next/dist/bin/next', 'build'], {
      environment: { ...environment, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' },
    });
    if (built.code !== 0) throw new Error(`The build failed:\n${built.output}`);
    writeFileSync(STAMP, now);
  });
