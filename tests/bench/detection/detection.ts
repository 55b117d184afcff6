import { readFileSync } from 'node:fs';
import { judgeRecords } from '@/analytics/judging/judge-records';
import { defaultSettings } from '@/analytics/judging/settings';
import { judgedRecordsOf } from '@/seed/simulation/judged-records';
import { simulateCompany } from '@/seed/simulation/simulate-company';
import type { SimulatedTruth } from '@/seed/simulation/truth';
import { detectionFigures, printDetection } from './figures';
import type { JudgedCompany } from './score';
import { PROOF_SEEDS, TUNING_SEEDS } from './seeds';
import { plantedFaults } from './truth-of-flags';

/** The day on which every company of the bench is judged. */
export const TODAY = '2026-12-01';

/** Reads a file with the import's reader and judges it; rows that an import refuses are refused. */
export const judgeFile = async (
  file: string,
  truth: Parameters<typeof plantedFaults>[0],
): Promise<JudgedCompany & { records: number; ms: number }> => {
  const { records, refused } = await judgedRecordsOf(file, TODAY);
  const masses = new Map(records.map(({ id, recoveredMassKg }) => [id, recoveredMassKg]));
  const before = performance.now();
  const { flags } = judgeRecords(records, [], defaultSettings(TODAY));
  return {
    flags: flags
      .toSorted((a, b) => b.certainty - a.certainty)
      .map(({ recordId, rule, certainty }) => ({
        recordId,
        rule,
        certainty,
        recoveredMassKg: masses.get(recordId) ?? Number.NaN,
      })),
    refused,
    planted: plantedFaults(truth),
    records: records.length,
    ms: performance.now() - before,
  };
};

/** The company simulated outside of this project, with what was planted in it. */
export const sampleCompany = () => ({
  file: readFileSync('tests/fixtures/sample-company/recoveries.csv', 'utf8'),
  truth: JSON.parse(readFileSync('tests/fixtures/sample-company/truth.json', 'utf8')) as SimulatedTruth,
});

/** `npx tsx tests/bench/detection/run.ts [tuning|proof|sample] [companies] [size]`. */
export const measureDetection = async (which: string, count: number, size: number): Promise<void> => {
  if (which === 'sample') {
    const { file, truth } = sampleCompany();
    printDetection('the sample company', detectionFigures([await judgeFile(file, truth)]));
    return;
  }
  const seeds = (which === 'proof' ? PROOF_SEEDS : TUNING_SEEDS).slice(0, count);
  const companies: Awaited<ReturnType<typeof judgeFile>>[] = [];
  for (const seed of seeds) {
    const { file, truth } = simulateCompany(seed, { size });
    companies.push(await judgeFile(file, truth));
  }
  const slowest = Math.max(...companies.map(({ ms }) => ms));
  printDetection(
    `${companies.length} companies of about ${size} records (${which}), slowest ${Math.round(slowest)} ms`,
    detectionFigures(companies),
  );
};
