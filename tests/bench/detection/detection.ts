import { readFileSync } from 'node:fs';
import { judgeRecords } from '@/analytics/judging/judge-records';
import { defaultSettings } from '@/analytics/judging/settings';
import { FLAG_RULES } from '@/lib/vocabulary';
import { judgedRecordsOf } from '@/seed/simulation/judged-records';
import { SIMULATED_FAULTS } from '@/seed/simulation/options';
import { simulateCompany } from '@/seed/simulation/simulate-company';
import { calibration, earlyStops, entrySlips, type JudgedCompany, ratio, type Share, surestTrue } from './score';
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
  const before = performance.now();
  const { flags } = judgeRecords(records, [], defaultSettings(TODAY));
  return {
    flags,
    refused,
    planted: plantedFaults(truth),
    records: records.length,
    ms: performance.now() - before,
  };
};

/** The company simulated outside of this project, with what was planted in it. */
export const sampleCompany = () => ({
  file: readFileSync('tests/fixtures/sample-company/recoveries.csv', 'utf8'),
  truth: JSON.parse(readFileSync('tests/fixtures/sample-company/truth.json', 'utf8')) as Parameters<
    typeof plantedFaults
  >[0],
});

const shown = (share: Share): string => `${(100 * ratio(share)).toFixed(1)} % (${share.hits}/${share.of})`;

/** Prints what was found of what was planted. */
export const printScores = (title: string, companies: readonly JudgedCompany[]): void => {
  console.log(`\n## ${title}`);
  const stops = earlyStops(companies);
  console.log(`stopped early: precision ${shown(stops.precision)}, recall ${shown(stops.recall)}`);
  const slips = entrySlips(companies);
  console.log(`entry slips: precision ${shown(slips.precision)}, recall ${shown(slips.recall)}`);
  for (const kind of SIMULATED_FAULTS.filter((fault) => fault !== 'stopped_early')) {
    const { recall } = entrySlips(companies, kind);
    if (recall.of) console.log(`  ${kind}: found ${shown(recall)}`);
  }
  console.log(`true among the 50 surest: ${surestTrue(companies).join(' ')}`);
  for (const rule of [null, ...FLAG_RULES]) {
    const bins = calibration(companies, rule);
    const raised = companies.flatMap(({ flags }) => flags.filter((flag) => !rule || flag.rule === rule)).length;
    if (!raised) continue;
    const cells = bins.map(
      ({ flags, certainty, trueShare }) => `${Math.round(100 * certainty)}→${Math.round(100 * trueShare)} (${flags})`,
    );
    console.log(`${rule ?? 'all'}: ${raised} flags; certainty→true ${cells.join('  ')}`);
  }
};

/** `npx tsx tests/bench/detection/run.ts [tuning|proof|sample] [companies] [size]`. */
export const measureDetection = async (which: string, count: number, size: number): Promise<void> => {
  if (which === 'sample') {
    const { file, truth } = sampleCompany();
    printScores('the sample company', [await judgeFile(file, truth)]);
    return;
  }
  const seeds = (which === 'proof' ? PROOF_SEEDS : TUNING_SEEDS).slice(0, count);
  const companies: Awaited<ReturnType<typeof judgeFile>>[] = [];
  for (const seed of seeds) {
    const { file, truth } = simulateCompany(seed, { size });
    companies.push(await judgeFile(file, truth));
  }
  const slowest = Math.max(...companies.map(({ ms }) => ms));
  printScores(
    `${companies.length} companies of about ${size} records (${which}), slowest ${Math.round(slowest)} ms`,
    companies,
  );
};
