import { compareTechnicians } from '@/analytics/technician-comparison/compare-technicians';
import { comparedRecovery } from '@/analytics/technician-comparison/compared-recovery';
import type { ComparedRecovery } from '@/analytics/technician-comparison/recovery';
import { judgedRecordsOf } from '@/seed/simulation/judged-records';
import { simulateCompany } from '@/seed/simulation/simulate-company';
import { crewFigures, type JudgedCrew, printCrews } from './figures';
import type { Called } from './tally';

/** A recovery file as the comparison takes it: in the order of time, entry errors left out. */
export const comparedRecoveriesOf = async (file: string): Promise<ComparedRecovery[]> => {
  const { records } = await judgedRecordsOf(file);
  return records
    .toSorted((a, b) => (a.recoveredOn < b.recoveredOn ? -1 : Number(a.recoveredOn > b.recoveredOn)))
    .flatMap((record) => comparedRecovery(record) ?? []);
};

/** Reads a file with the import's reader and compares its technicians. */
export const calledInFile = async (file: string): Promise<Called[]> =>
  compareTechnicians(await comparedRecoveriesOf(file)).technicians.map((own) => ({
    name: own.technicianId,
    verdict: own.verdict,
    look: own.look,
    hasScale: own.scale !== null,
    range: own.effect,
  }));

/** Every fourth company has nobody planted who is worse than the others, and no drifting scale. */
const WITHOUT_PLANTED = 4;
export const plantsPeople = (number: number): boolean => number % WITHOUT_PLANTED !== 0;

/** Judges simulated companies and prints how each class of technician fared. */
export const measureSimulated = async (seeds: string, companies: number): Promise<void> => {
  const crews: JudgedCrew[] = [];
  for (let number = 1; number <= companies; number++) {
    const { file, truth } = simulateCompany(`${seeds} ${number}`, { plantsPeople: plantsPeople(number) });
    crews.push({ called: await calledInFile(file), planted: truth.technicians });
  }
  printCrews(
    `${companies} companies of about 4,000 records, seeds “${seeds} 1” to “${seeds} ${companies}”`,
    crewFigures(crews),
  );
};
