import { measureSimulated } from './simulated';
import { measureSpeed } from './speed';

/** Seeds on which the settings were chosen, and seeds on which nothing was: only the latter prove anything. */
const TUNING = 'tuning';
const PROOF = 'proof';

/** `npx tsx tests/bench/technicians/people.ts [companies]`: who is called what, on simulated companies. */
const main = async (): Promise<void> => {
  const companies = Number(process.argv[2] ?? 40);
  await measureSimulated(TUNING, companies);
  await measureSimulated(PROOF, companies);
  await measureSpeed();
};

main().catch((error: unknown) => {
  console.error(error);
  process.exitCode = 1;
});
