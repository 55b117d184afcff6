import { compareTechnicians } from '@/analytics/technician-comparison/compare-technicians';
import { comparedRecovery } from '@/analytics/technician-comparison/compared-recovery';
import type { ComparedRecovery } from '@/analytics/technician-comparison/recovery';
import { judgedRecordsOf } from '@/seed/simulation/judged-records';
import { simulateCompany } from '@/seed/simulation/simulate-company';
import { classOf, report, Tally, trueEffect } from './tally';

/** A recovery file as the comparison takes it: in the order of time, entry errors left out. */
export const comparedRecoveriesOf = async (file: string): Promise<ComparedRecovery[]> => {
  const { records } = await judgedRecordsOf(file);
  return records
    .toSorted((a, b) => (a.recoveredOn < b.recoveredOn ? -1 : Number(a.recoveredOn > b.recoveredOn)))
    .flatMap((record) => comparedRecovery(record) ?? []);
};

/** Every fourth company has nobody planted who is worse than the others, and no drifting scale. */
const WITHOUT_PLANTED = 4;
const YEARS = 12;

/** Judges simulated companies and prints how each class of technician fared. */
export const measureSimulated = async (seeds: string, companies: number): Promise<void> => {
  const tallies = new Map<string, Tally>();
  const accused = { crews: 0, soundCrews: 0, withPlanted: 0, withoutPlanted: 0, sound: 0 };
  for (let number = 1; number <= companies; number++) {
    const plantsPeople = number % WITHOUT_PLANTED !== 0;
    const { file, truth } = simulateCompany(`${seeds} ${number}`, { plantsPeople });
    const results = compareTechnicians(await comparedRecoveriesOf(file)).technicians;
    accused.crews += 1;
    accused.soundCrews += Number(!plantsPeople);
    for (const own of truth.technicians) {
      const result = results.find(({ technicianId }) => technicianId === own.name);
      if (!result) continue;
      const name = classOf(own);
      const tally = tallies.get(name) ?? new Tally();
      tallies.set(name, tally);
      tally.add(result, trueEffect(own, truth.technicians));
      if (own.class.startsWith('bad_')) continue;
      accused.sound += 1;
      if (result.verdict !== 'below') continue;
      if (plantsPeople) accused.withPlanted += 1;
      else accused.withoutPlanted += 1;
    }
  }
  console.log(`\n${companies} companies of about 4,000 records, seeds “${seeds} 1” to “${seeds} ${companies}”`);
  report(tallies);
  const wrong = accused.withPlanted + accused.withoutPlanted;
  console.log(
    `Called below without cause: ${wrong} of ${accused.sound} technicians; ${accused.withoutPlanted} in ${accused.soundCrews} crews without a poor technician; ${(wrong / accused.crews).toFixed(3)} a crew, ${(wrong / accused.crews / YEARS).toFixed(4)} a crew and year`,
  );
};
