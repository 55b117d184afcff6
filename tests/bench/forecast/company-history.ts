import Papa from 'papaparse';
import { LARGE_PLANT_KG, type MassHistory } from '@/analytics/credit-forecast/model/history';
import type { SimulationOptions } from '@/seed/simulation/options';
import { simulateCompany } from '@/seed/simulation/simulate-company';

const KG_PER_LB = 0.45359237;

type Row = { month: string; refrigerant: string; fullChargeKg: number; recoveredKg: number };

/** Position of a month `YYYY-MM` counted from January of year 0. */
const place = (month: string): number => {
  const [year = 0, monthNo = 1] = month.split('-').map(Number);
  return 12 * year + monthNo - 1;
};

/** Sums of rows in pounds by month and refrigerant, large jobs apart. A month without any row is lost. */
export const historyOf = (rows: readonly Row[], firstMonth: string, months: number): MassHistory => {
  const first = place(firstMonth);
  const routine = new Map<string, number[]>();
  const largeJobs: MassHistory['largeJobs'][number][] = [];
  const seen = new Set<number>();
  for (const { month, refrigerant, fullChargeKg, recoveredKg } of rows) {
    const at = place(month) - first;
    if (at < 0 || at >= months) continue;
    seen.add(at);
    if (fullChargeKg >= LARGE_PLANT_KG) {
      largeJobs.push({ at, refrigerant, recoveredKg });
      continue;
    }
    const masses = routine.get(refrigerant) ?? Array.from({ length: months }, () => 0);
    masses[at] = (masses[at] ?? 0) + recoveredKg;
    routine.set(refrigerant, masses);
  }
  const lost = Array.from({ length: months }, (_, at) => at).filter((at) => !seen.has(at));
  return { firstMonthOfYear: first % 12, months, routineKg: routine, largeJobs, lost: new Set(lost) };
};

/** Rows of a recovery file in pounds; `without` are rows (from 1) to leave out. */
export const rowsOf = (file: string, without: ReadonlySet<number>): Row[] =>
  Papa.parse<Record<string, string>>(file, { header: true, skipEmptyLines: true }).data.flatMap((row, index) => {
    const recovered = Number(row.recovered_mass);
    if (without.has(index + 1) || !(recovered >= 0)) return [];
    return [
      {
        month: (row.recovered_at ?? '').slice(0, 7),
        refrigerant: row.refrigerant ?? '',
        fullChargeKg: Number(row.nameplate_charge) * KG_PER_LB,
        recoveredKg: recovered * KG_PER_LB,
      },
    ];
  });

/** A simulated company's masses, entry slips left out as an office that decided them would. */
export const simulatedHistory = (seed: string, options: Partial<SimulationOptions>, months: number): MassHistory => {
  const { file, truth } = simulateCompany(seed, options);
  const slips = truth.bad_records.filter(({ kinds }) => kinds.some((kind) => kind !== 'stopped_early'));
  return historyOf(rowsOf(file, new Set(slips.map(({ row }) => row))), options.firstMonth ?? '2015-01', months);
};
