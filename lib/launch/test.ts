import { browser } from './checks/browser';
import { lint, types } from './checks/static';
import { notRun, type Tally } from './checks/tally';
import { unit } from './checks/unit';
import { say } from './local';

const PARTS: Record<string, (args: string[]) => Promise<Tally>> = { lint, types, unit, e2e: browser };

const runPart = async (name: string, run: (args: string[]) => Promise<Tally>, args: string[]): Promise<Tally> => {
  say(`${name} …`);
  const tally = await run(args).catch((error: unknown) =>
    notRun(error instanceof Error ? error.message : String(error)),
  );
  if (tally.fault) console.error(tally.fault);
  say(`${name}: ${tally.passed} passed, ${tally.failed} failed`);
  return tally;
};

/**
 * `npm test` runs every part and goes on after a failure, so that the counts are whole. `npm test -- unit [files]` and
 * the like run one part.
 */
const main = async (): Promise<number> => {
  const [wanted, ...args] = process.argv.slice(2);
  if (wanted && !(wanted in PARTS)) {
    console.error(`There is no part "${wanted}": say ${Object.keys(PARTS).join(', ')} or nothing.`);
    return 2;
  }
  const total = { passed: 0, failed: 0 };
  for (const [name, run] of Object.entries(PARTS)) {
    if (wanted && name !== wanted) continue;
    const { passed, failed } = await runPart(name, run, args);
    total.passed += passed;
    total.failed += failed;
  }
  console.log(`${total.passed} passed, ${total.failed} failed`);
  return total.failed === 0 ? 0 : 1;
};

// Everything opened is let go of on exit: programs, server, databases, reports.
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) process.on(signal, () => process.exit(130));
process.exit(await main());
