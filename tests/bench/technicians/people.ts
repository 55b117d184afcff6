import { measureSimulated } from './simulated';
import { measureSpeed } from './speed';

/** Seeds on which the settings were chosen, and seeds on which nothing was: only the latter prove anything. */
const TUNING = 'tuning';
const PROOF = 'fresh';

/** `npx tsx tests/bench/technicians/people.ts [companies] [tuning|fresh]`: who is called what, on simulated companies. */
const main = async (): Promise<void> => {
  const [companies = '40', only] = process.argv.slice(2);
  for (const seeds of [TUNING, PROOF]) if (!only || only === seeds) await measureSimulated(seeds, Number(companies));
  await measureSpeed();
};

main().catch((error: unknown) => {
  console.error(error);
  process.exitCode = 1;
});
