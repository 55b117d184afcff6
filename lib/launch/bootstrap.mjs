// Runs before anything is installed, so it is plain JavaScript without dependencies: it brings node_modules to what the
// lock file says and then hands over to the TypeScript command named on the command line.
import { spawn, spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';

const root = new URL('../../', import.meta.url).pathname;
process.chdir(root);

const [major, minor] = process.versions.node.split('.').map(Number);
if (major < 20 || (major === 20 && minor < 19)) {
  console.error(`Node 20.19 or newer is needed; this is ${process.versions.node}.`);
  process.exit(1);
}

const stampFile = 'node_modules/.installed-lock';
const lock = createHash('sha256')
  .update(readFileSync('package-lock.json'))
  .update(process.versions.modules)
  .digest('hex');
if (!existsSync(stampFile) || readFileSync(stampFile, 'utf8') !== lock) {
  console.error('installing packages by the lock file');
  const env = { ...process.env, PLAYWRIGHT_SKIP_BROWSER_DOWNLOAD: '1', NODE_ENV: 'development' };
  const done = spawnSync('npm', ['ci', '--no-audit', '--no-fund', '--loglevel=error'], { stdio: 'inherit', env });
  if (done.status !== 0) process.exit(done.status ?? 1);
  mkdirSync('node_modules', { recursive: true });
  writeFileSync(stampFile, lock);
}

const [command, ...args] = process.argv.slice(2);
// The react-server condition lets `server-only` modules load outside of Next.
const child = spawn(
  process.execPath,
  ['--conditions=react-server', '--import', 'tsx', `lib/launch/${command}.ts`, ...args],
  { stdio: 'inherit' },
);
// The child hears Ctrl-C from the terminal itself; a signal sent to this process alone is passed on.
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => child.kill(signal));
// npm that is ended leaves this process to itself; nobody would know that it still runs.
const parent = process.ppid;
const watch = setInterval(() => process.ppid !== parent && child.kill('SIGTERM'), 500);
watch.unref();
child.on('exit', (code, signal) => process.exit(code ?? (signal ? 1 : 0)));
