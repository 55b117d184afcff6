import Papa from 'papaparse';
import { historyOfMonths, type MonthMass, monthAfter } from '@/analytics/credit-forecast/model/calendar-months';
import { LARGE_PLANT_KG, type MassHistory } from '@/analytics/credit-forecast/model/history';
import { KG_PER_UNIT } from '@/lib/units';
import { simulateCompany } from '@/seed/simulation/simulate-company';

type Row = MonthMass & { fullChargeKg: number };

/** Rows of a recovery file in pounds; `without` are rows (from 1) to leave out. */
const rowsOf = (file: string, without: ReadonlySet<number>): Row[] =>
  Papa.parse<Record<string, string>>(file, { header: true, skipEmptyLines: true }).data.flatMap((row, index) => {
    const recoveredKg = Number(row.recovered_mass) * KG_PER_UNIT.lb;
    if (without.has(index + 1) || !(recoveredKg >= 0)) return [];
    const fullChargeKg = Number(row.nameplate_charge) * KG_PER_UNIT.lb;
    return [
      { month: (row.recovered_at ?? '').slice(0, 7), refrigerant: row.refrigerant ?? '', fullChargeKg, recoveredKg },
    ];
  });

/** A month without any row is lost. */
const historyOf = (rows: readonly Row[], span: { from: string; to: string }): MassHistory => {
  const seen = new Set(rows.map(({ month }) => month));
  const lost: string[] = [];
  for (let month = span.from; month <= span.to; month = monthAfter(month, 1)) if (!seen.has(month)) lost.push(month);
  const isLarge = ({ fullChargeKg }: Row) => fullChargeKg >= LARGE_PLANT_KG;
  return historyOfMonths(
    span,
    rows.filter((row) => !isLarge(row)),
    rows.filter(isLarge),
    lost,
  );
};

/** A simulated company's masses, entry slips left out as an office that decided them would. */
export const simulatedHistory = (seed: string, size: number, span: { from: string; to: string }): MassHistory => {
  const { file, truth } = simulateCompany(seed, { size, firstMonth: span.from, lastMonth: span.to });
  const slips = truth.bad_records.filter(({ kinds }) => kinds.some((kind) => kind !== 'stopped_early'));
  return historyOf(rowsOf(file, new Set(slips.map(({ row }) => row))), span);
};
