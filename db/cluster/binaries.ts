import { existsSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { installDebianPackages } from '@/lib/debian';

/** Where Debian keeps PostgreSQL's programs, by major version, and what it reads before it makes a cluster of its own. */
const DEBIAN = { programs: '/usr/lib/postgresql', clusterDefaults: '/etc/postgresql-common/createcluster.d' };

/** Views with the rights of who asks (security_invoker) came with PostgreSQL 15. */
const LEAST_VERSION = 15;

/** The folder of the newest installed PostgreSQL's programs, or null. */
export const findPostgres = (programs = DEBIAN.programs): string | null => {
  if (!existsSync(programs)) return null;
  const [newest] = readdirSync(programs)
    .map(Number)
    .filter((version) => version >= LEAST_VERSION && existsSync(join(programs, String(version), 'bin/initdb')))
    .sort((a, b) => b - a);
  return newest === undefined ? null : join(programs, String(newest), 'bin');
};

/**
 * The folder of PostgreSQL's programs, installed from Debian's packages where they are missing. Throws with the one line
 * to run where this process may not install.
 */
export const requirePostgres = (say: (line: string) => void, places = DEBIAN): string => {
  const found = findPostgres(places.programs);
  if (found) return found;
  // Debian's package would make and start a cluster of its own on port 5432, which nobody here needs.
  const note = join(places.clusterDefaults, 'no-main-cluster.conf');
  const first = `mkdir -p ${places.clusterDefaults}\necho 'create_main_cluster = false' > ${note}\ntrap 'rm -f ${note}' EXIT`;
  installDebianPackages(['postgresql'], { say, first });
  const installed = findPostgres(places.programs);
  if (!installed) throw new Error(`Debian’s postgresql package is older than PostgreSQL ${LEAST_VERSION}.`);
  return installed;
};
