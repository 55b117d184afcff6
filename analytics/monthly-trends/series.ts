import { monthsBefore } from '@/analytics/scope-address';
import type { EarlierMonth, MonthFigures, MonthlyTrends } from './contract';

/** As many keys as a stack tells apart; the smaller ones are asked for together. */
export const MOST_KEYS = 7;

/** One layer of the stacks: a key of the split, or all the smaller ones together (`key` null); `keys` is how many it holds. */
export type StackLayer = { id: string; key: string | null; keys: number };

/** A running month is not over yet; a cut one is narrowed by the scope's own days. Neither may be compared. */
export type MonthState = 'whole' | 'running' | 'cut';

/** One bar: kilograms of each layer by its id, and the month's figures over all keys. */
export type StackedMonth = Omit<MonthFigures, 'medianYield' | 'totalYield'> & {
  medianYield: number | null;
  totalYield: number | null;
  state: MonthState;
  layers: Record<string, number>;
};

export type Stacks = { layers: StackLayer[]; months: StackedMonth[] };

const gram = (kg: number): number => Math.round(kg * 1000) / 1000;

/** The month `count` months after `month` (`YYYY-MM`); before it when negative. */
export const monthsAfter = (month: string, count: number): string => monthsBefore(month, -count);

/** Every month from the first to the last, both included; none when the first comes later. */
export const everyMonth = (first: string, last: string): string[] => {
  const months: string[] = [];
  for (let month = first; month <= last; month = monthsAfter(month, 1)) months.push(month);
  return months;
};

const REST = 'rest';

const toLayers = ({ rows, otherKeys }: Pick<MonthlyTrends, 'rows' | 'otherKeys'>): StackLayer[] => {
  const totals = new Map<string, number>();
  for (const { key, recoveredMass } of rows) totals.set(key, (totals.get(key) ?? 0) + recoveredMass);
  const keys = [...totals].sort(([a, massA], [b, massB]) => massB - massA || (a < b ? -1 : 1)).map(([key]) => key);
  return [
    ...keys.map((key, index) => ({ id: `layer-${index}`, key, keys: 1 })),
    ...(otherKeys ? [{ id: REST, key: null, keys: otherKeys.keys }] : []),
  ];
};

const NOTHING = {
  recoveredMass: 0,
  recoveries: 0,
  medianYield: null,
  totalYield: null,
  flagged: 0,
  co2e: 0,
  holdStated: 0,
  held: 0,
  vacuumStated: 0,
  downToLevel: 0,
};

/**
 * Bars by month out of the route's answer: every month between the first and the last one with records, every layer in
 * every month, zeros included. Layers are ordered by their mass over the whole scope, the largest first.
 */
export const toStacks = ({ rows, otherKeys, months, partialMonth, cutMonths }: MonthlyTrends): Stacks => {
  const layers = toLayers({ rows, otherKeys });
  const layerOf = new Map(layers.map(({ key, id }) => [key, id]));
  const masses = new Map<string, Record<string, number>>();
  const others = otherKeys?.rows.map((row) => ({ ...row, key: null })) ?? [];
  for (const { month, key, recoveredMass } of [...rows, ...others]) {
    const id = layerOf.get(key) ?? REST;
    const ofMonth = masses.get(month) ?? {};
    ofMonth[id] = gram((ofMonth[id] ?? 0) + recoveredMass);
    masses.set(month, ofMonth);
  }
  const known = new Map(months.map((figures) => [figures.month, figures]));
  const first = months[0]?.month;
  const last = months.at(-1)?.month;
  const stateOf = (month: string): MonthState =>
    month === partialMonth ? 'running' : cutMonths.includes(month) ? 'cut' : 'whole';
  return {
    layers,
    months: (first && last ? everyMonth(first, last) : []).map((month) => ({
      ...NOTHING,
      yearBefore: known.get(monthsAfter(month, -12))?.recoveredMass ?? null,
      ...known.get(month),
      month,
      state: stateOf(month),
      layers: Object.fromEntries(layers.map(({ id }) => [id, masses.get(month)?.[id] ?? 0])),
    })),
  };
};

/** What a month can be compared with. */
export type ComparedMonth = Omit<EarlierMonth, 'medianYield' | 'totalYield'> & {
  medianYield: number | null;
  totalYield: number | null;
};

/** The whole month a year before another one, of the scope or of before it; undefined where nothing is recorded of it. */
export const yearBeforeOf = (
  month: string,
  { months, earlier }: { months: readonly StackedMonth[]; earlier: readonly EarlierMonth[] },
): ComparedMonth | undefined => {
  const then = monthsAfter(month, -12);
  const outside = earlier.find((other) => other.month === then);
  return outside ?? months.find((other) => other.month === then && other.state === 'whole' && other.recoveries > 0);
};

/** The latest month that is neither running nor cut; undefined when there is none. */
export const lastWholeMonth = (months: readonly StackedMonth[]): StackedMonth | undefined =>
  months.findLast((month) => month.state === 'whole');
