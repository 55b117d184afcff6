import type { Bench } from '@/lib/launch/bench';
import { simulateCompany } from '@/seed/simulation/simulate-company';
import type { SimulatedTruth } from '@/seed/simulation/truth';
import { quantile, tenth } from '../machine';
import { crewFigures, printCrews } from '../technicians/figures';
import { calledInFile, plantsPeople } from '../technicians/simulated';
import { disagreement } from './agreement';
import { judgeFile, sampleCompany } from './detection';
import { detectionFigures, printDetection } from './figures';
import { type ImportedCompany, judgeThroughImport } from './imported-company';
import { keepResults } from './results';

/** Results of fewer companies are printed, but not kept. */
const LEAST_KEPT = 20;

type Made = { name: string; file: string; truth: SimulatedTruth };
type Pair = { imported: ImportedCompany; pure: Awaited<ReturnType<typeof alongside>> };

/** The same company judged from its file, without database and API. */
const alongside = async ({ file, truth }: Made) => ({
  ...(await judgeFile(file, truth)),
  called: await calledInFile(file),
});

const judgeBoth = async (address: string, made: Made): Promise<Pair> => {
  const imported = await judgeThroughImport(address, made.name, made);
  const { records, flags, refused, seconds } = imported;
  console.log(
    `${made.name}: ${records} records, ${refused.length} rows refused, ${flags.length} flags; import ${tenth(seconds.import)} s, flags ${tenth(seconds.renewal)} s`,
  );
  return { imported, pure: await alongside(made) };
};

const timesOf = (companies: readonly ImportedCompany[], of: keyof ImportedCompany['seconds']) => {
  const times = companies.map(({ seconds }) => seconds[of]);
  return { median: tenth(quantile(times, 0.5)), most: tenth(Math.max(...times)) };
};

const resultsOf = (pairs: readonly Pair[]) => {
  const companies = pairs.map(({ imported }) => imported);
  return {
    companies: companies.length,
    records: companies.reduce((sum, { records }) => sum + records, 0),
    detection: detectionFigures(companies),
    technicians: crewFigures(companies.map(({ crew }) => crew)),
    disagreement: disagreement(
      pairs.map(({ imported, pure }) => ({ imported: { ...imported, called: imported.crew.called }, pure })),
    ),
    seconds: { import: timesOf(companies, 'import'), flags: timesOf(companies, 'renewal') },
  };
};

const print = (title: string, results: ReturnType<typeof resultsOf>): void => {
  printDetection(`${title}: ${results.records} records`, results.detection);
  printCrews(`${title}: technicians`, results.technicians);
  console.log('against the same files judged without database and API:', results.disagreement);
  console.log('seconds a company:', results.seconds);
};

/** How many companies and of which seeds the command line asks for; throws when it asks for no number. */
const readArguments = ([count = '20', seeds = 'proof']: readonly string[]) => {
  if (!/^[1-9]\d*$/.test(count)) throw new Error(`“${count}” is no number of companies.`);
  return { count: Number(count), seeds };
};

/**
 * What the product finds of what was planted, by the way that a contractor's file takes: import, background work, API.
 * `npm run bench:detection -- 20 proof`: twenty simulated companies of the seeds “proof 1” to “proof 20”, every fourth
 * without poor technicians, then the sample company.
 */
export const run = async ({ served, args }: Bench): Promise<void> => {
  const { count, seeds } = readArguments(args);
  const names = Array.from({ length: count }, (_, index) => `${seeds} ${index + 1}`);
  const pairs: Pair[] = [];
  for (const [index, name] of names.entries())
    pairs.push(
      await judgeBoth(served.address, { name, ...simulateCompany(name, { plantsPeople: plantsPeople(index + 1) }) }),
    );
  const results = resultsOf(pairs);
  print(`${count} companies of the seeds “${seeds}”`, results);
  const sample = resultsOf([await judgeBoth(served.address, { name: 'the sample company', ...sampleCompany() })]);
  print('the sample company', sample);
  if (count < LEAST_KEPT) return;
  keepResults(seeds, { seeds: `${names[0]} to ${names.at(-1)}`, ...results });
  keepResults('sample', sample);
};
