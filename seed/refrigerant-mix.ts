import type { Random } from './random';

type Shares = Record<string, number>;
/** From this year of manufacture on, these shares. */
type Era = readonly [from: number, shares: Shares];

const AIR: readonly Era[] = [
  [0, { 'R-22': 1 }],
  [2006, { 'R-22': 0.6, 'R-410A': 0.4 }],
  [2010, { 'R-410A': 0.96, 'R-407C': 0.04 }],
  [2023, { 'R-410A': 0.75, 'R-32': 0.1, 'R-454B': 0.15 }],
  [2025, { 'R-410A': 0.08, 'R-32': 0.34, 'R-454B': 0.58 }],
];
const COLD: readonly Era[] = [
  [0, { 'R-22': 0.55, 'R-404A': 0.45 }],
  [2010, { 'R-404A': 0.86, 'R-134a': 0.14 }],
  [2018, { 'R-448A': 0.42, 'R-449A': 0.34, 'R-404A': 0.14, 'R-134a': 0.1 }],
  [2022, { 'R-448A': 0.52, 'R-449A': 0.42, 'R-513A': 0.06 }],
];
const ERAS: Record<string, readonly Era[]> = {
  rack: [
    [0, { 'R-22': 0.6, 'R-404A': 0.3, 'R-507A': 0.1 }],
    [2010, { 'R-404A': 0.75, 'R-407A': 0.25 }],
    [2018, { 'R-448A': 0.5, 'R-449A': 0.5 }],
  ],
  chiller: [
    [0, { 'R-123': 0.4, 'R-134a': 0.6 }],
    [2016, { 'R-134a': 0.45, 'R-513A': 0.35, 'R-1233zd(E)': 0.2 }],
  ],
  process: [
    [0, { 'R-22': 0.45, 'R-507A': 0.3, 'R-134a': 0.25 }],
    [2012, { 'R-507A': 0.4, 'R-134a': 0.4, 'R-404A': 0.2 }],
    [2020, { 'R-448A': 0.5, 'R-513A': 0.5 }],
  ],
  cabinet: [
    [0, { 'R-134a': 0.6, 'R-22': 0.4 }],
    [2010, { 'R-134a': 0.55, 'R-410A': 0.45 }],
    [2022, { 'R-134a': 0.5, 'R-32': 0.5 }],
  ],
  walkIn: COLD,
  reachIn: COLD,
};

/** The refrigerant a unit of this kind and year of manufacture came with. */
export const refrigerantOfNewUnit = (kind: string, year: number, random: Random): string => {
  const shares = (ERAS[kind] ?? AIR).findLast(([from]) => year >= from)?.[1] ?? {};
  return random.pick(Object.entries(shares), ([, share]) => share)[0];
};

/** What an old unit is converted to; null where nobody converts. */
export const conversionOf = (refrigerant: string, kind: string, random: Random): string | null => {
  if (refrigerant === 'R-22' && kind !== 'cabinet') return random.pick(['R-407C', 'R-427A', 'R-438A']);
  if (refrigerant === 'R-404A' || refrigerant === 'R-507A') return random.pick(['R-448A', 'R-449A']);
  return null;
};
