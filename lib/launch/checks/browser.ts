import { z } from 'zod';
import { runNode } from '../children';
import { CHROMIUM } from '../chromium';
import { type DemoServer, withDemoServer } from '../demo-server';
import { readReport, reportFile } from './report';
import { counted, notRun, type Tally } from './tally';

const reportSchema = z.object({
  errors: z.array(z.object({ message: z.string().optional() })),
  stats: z.object({ expected: z.number(), unexpected: z.number(), flaky: z.number(), skipped: z.number() }),
});

const runPlaywright = async (address: string, signIns: DemoServer['signIns'], args: string[]): Promise<Tally> => {
  const file = reportFile('browser');
  const { code } = await runNode(['node_modules/@playwright/test/cli.js', 'test', ...args], {
    show: true,
    environment: {
      ...process.env,
      E2E_ADDRESS: address,
      E2E_CHROMIUM: CHROMIUM,
      E2E_SIGN_INS: JSON.stringify(signIns),
      PLAYWRIGHT_JSON_OUTPUT_FILE: file,
    },
  });
  const report = readReport(file, reportSchema);
  if (!report) return notRun('Playwright ended without a report.');
  if (report.errors.length) return notRun(report.errors.map(({ message }) => message ?? '').join('\n'));
  const { expected, unexpected, flaky, skipped } = report.stats;
  return counted(expected, unexpected + flaky, skipped, code);
};

/**
 * The browser tests by Playwright and Debian's Chromium, against the built application and a demo company in a database
 * of its own; `args` narrow it to files or names.
 */
export const browser = (args: string[]): Promise<Tally> =>
  withDemoServer('browser', ({ address, signIns }) => runPlaywright(address, signIns, args));
