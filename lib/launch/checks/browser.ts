import { closeSync, existsSync, openSync } from 'node:fs';
import { join } from 'node:path';
import { z } from 'zod';
import { openThrowAway, type ThrowAway } from '@/db/cluster/throw-away';
import { installDebianPackages } from '@/lib/debian';
import { freePort } from '@/lib/ports';
import { DEMO_SIGN_INS, seedDemoIfEmpty } from '@/seed/demo';
import { addEmptyCompany } from '@/tests/support/browser-company';
import { buildIfChanged } from '../build';
import { runNode } from '../children';
import { enter, say, serverEnvironment } from '../local';
import { serve } from '../serve';
import { readReport, reportFile } from './report';
import { counted, notRun, type Tally } from './tally';

const CHROMIUM = '/usr/bin/chromium';

const reportSchema = z.object({
  errors: z.array(z.object({ message: z.string().optional() })),
  stats: z.object({ expected: z.number(), unexpected: z.number(), flaky: z.number(), skipped: z.number() }),
});

type SignIn = (typeof DEMO_SIGN_INS)[number];

const runPlaywright = async (address: string, signIns: SignIn[], args: string[]): Promise<Tally> => {
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

const againstServer = async (database: ThrowAway, args: string[]): Promise<Tally> => {
  const opened = { ...database, cluster: null };
  enter(opened);
  await seedDemoIfEmpty(database.urls, say);
  const signIns = [...DEMO_SIGN_INS, await addEmptyCompany()];
  const port = await freePort();
  await buildIfChanged(serverEnvironment(opened, `http://127.0.0.1:${port}`));
  const log = openSync(join(database.folder, 'server.log'), 'w');
  const served = await serve(opened, port, log);
  const end = () => served.process.kill('SIGTERM');
  process.on('exit', end);
  try {
    return await runPlaywright(served.address, signIns, args);
  } finally {
    process.off('exit', end);
    end();
    closeSync(log);
  }
};

/**
 * The browser tests by Playwright and Debian's Chromium, against the built application and a demo company in a database
 * of its own; `args` narrow it to files or names.
 */
export const browser = async (args: string[]): Promise<Tally> => {
  if (!existsSync(CHROMIUM)) installDebianPackages(['chromium'], { say });
  const database = await openThrowAway('browser', say);
  try {
    return await againstServer(database, args);
  } finally {
    database.destroy();
  }
};
