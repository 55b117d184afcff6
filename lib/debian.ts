import { spawnSync } from 'node:child_process';

/** How to run a line of shell as root: directly, by sudo without a password, or not at all. */
const rootShell = (): string[] | null => {
  if (process.getuid?.() === 0) return ['sh', '-c'];
  return spawnSync('sudo', ['-n', 'true']).status === 0 ? ['sudo', '-n', 'sh', '-c'] : null;
};

/**
 * Installs Debian packages by apt, as root or by sudo. `first` is a line of shell to run as root before. Throws a
 * sentence with the one line to run where neither is possible, and with apt's own words where apt fails.
 */
export const installDebianPackages = (
  packages: readonly string[],
  { say, first = ':' }: { say: (line: string) => void; first?: string },
): void => {
  const shell = rootShell();
  const names = packages.join(' ');
  if (!shell) {
    const line = `apt-get update && apt-get install -y ${names}`;
    throw new Error(`Missing here: ${names}. Run this once as root, then start again:\n  ${line}`);
  }
  say(`installing ${names} from Debian packages`);
  // Another installation may hold apt's lock for a while, and a mirror may stumble.
  const apt = 'apt-get -qq -o DPkg::Lock::Timeout=300 -o Acquire::Retries=3';
  const script = [
    'set -e',
    'export DEBIAN_FRONTEND=noninteractive',
    first,
    `${apt} update`,
    `${apt} install -y --no-install-recommends ${names}`,
  ].join('\n');
  const [command = 'sh', ...rest] = shell;
  const done = spawnSync(command, [...rest, script], { encoding: 'utf8', stdio: ['ignore', 'pipe', 'pipe'] });
  if (done.status !== 0) throw new Error(`apt could not install ${names}:\n${done.stderr || done.stdout}`);
};
