import type { MonthlyTrends } from '@/analytics/monthly-trends/contract';

type Row = [month: string, key: string, kg: number];

/** An answer of the trends route made of rows, for what only reads masses: one recovery a row, yields plain. */
export const trendsOf = (rows: readonly Row[], rest: Partial<MonthlyTrends> = {}): MonthlyTrends => {
  const plain = { recoveries: 1, medianYield: 0.9, flagged: 0, co2e: 0 };
  const byMonth = new Map<string, number>();
  for (const [month, , kg] of rows) byMonth.set(month, (byMonth.get(month) ?? 0) + kg);
  const yearEarlier = (month: string) => `${Number(month.slice(0, 4)) - 1}${month.slice(4)}`;
  return {
    by: 'refrigerant',
    rows: rows.map(([month, key, recoveredMass]) => ({ ...plain, month, key, recoveredMass })),
    months: [...byMonth].sort().map(([month, recoveredMass]) => ({
      ...plain,
      month,
      recoveredMass,
      holdStated: 0,
      held: 0,
      vacuumStated: 0,
      downToLevel: 0,
      totalYield: 0.85,
      yearBefore: byMonth.get(yearEarlier(month)) ?? null,
    })),
    totals: { ...plain, recoveredMass: 0, totalYield: 0.85 },
    otherKeys: null,
    earlier: [],
    partialMonth: null,
    cutMonths: [],
    excluded: 0,
    ...rest,
  };
};
