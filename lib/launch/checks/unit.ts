import { z } from 'zod';
import { runNode } from '../children';
import { readReport, reportFile } from './report';
import { counted, notRun, type Tally } from './tally';

const reportSchema = z.object({
  numPassedTests: z.number(),
  numFailedTests: z.number(),
  numPendingTests: z.number(),
  numTodoTests: z.number(),
  testResults: z.array(z.object({ status: z.string(), assertionResults: z.array(z.unknown()) })),
});

/** Everything that needs no browser, by vitest against a database of its own; `args` narrow it to files or names. */
export const unit = async (args: string[]): Promise<Tally> => {
  const file = reportFile('unit');
  const { code } = await runNode(
    [
      'node_modules/vitest/vitest.mjs',
      'run',
      '--reporter=default',
      '--reporter=json',
      `--outputFile.json=${file}`,
      ...args,
    ],
    { show: true },
  );
  const report = readReport(file, reportSchema);
  if (!report) return notRun('vitest ended without a report.');
  // A file that could not even be loaded has no tests to fail.
  const unloaded = report.testResults.filter((r) => r.status === 'failed' && r.assertionResults.length === 0).length;
  const { numPassedTests, numFailedTests, numPendingTests, numTodoTests } = report;
  return counted(numPassedTests, numFailedTests + unloaded, numPendingTests + numTodoTests, code);
};
