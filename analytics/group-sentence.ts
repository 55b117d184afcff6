import type { Piece } from '@/analytics/figures/pieces';
import { formatCount, formatMassWithUnit, plural } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';

/** How groups are spoken of: `14 technicians brought in …`. */
export type GroupWords = { one: string; many: string; verb: string };

type Group = { recoveries: number; recoveredMass: number };

/** How few of the groups, taken from the largest down, hold half of the mass. */
export const groupsOfHalf = (groups: readonly Group[]): number => {
  const masses = groups.map(({ recoveredMass }) => recoveredMass).sort((a, b) => b - a);
  const half = masses.reduce((sum, mass) => sum + mass, 0) / 2;
  let held = 0;
  const at = masses.findIndex((mass) => {
    held += mass;
    return held >= half;
  });
  return at + 1;
};

/** What groups of recoveries come to together: `14 technicians brought in 1,214 lb in 187 recoveries.` */
export const groupAnswer = (groups: readonly Group[], { one, many, verb }: GroupWords, unit: DisplayUnit): Piece[] => {
  const mass = groups.reduce((sum, group) => sum + group.recoveredMass, 0);
  const recoveries = groups.reduce((sum, group) => sum + group.recoveries, 0);
  return [
    `${plural(groups.length, one, many)} ${verb} `,
    { measure: 'recoveredMass', figure: formatMassWithUnit(mass, unit, 0) },
    ' in ',
    { measure: 'recoveries', figure: plural(recoveries, 'recovery', 'recoveries') },
    '.',
  ];
};

/** How the mass is spread over the groups; empty where half of them hold half. */
export const spreadNote = (groups: readonly Group[], many: string): string => {
  const few = groupsOfHalf(groups);
  return groups.length >= 8 && few * 3 <= groups.length
    ? `Half of it comes from ${formatCount(few)} of the ${formatCount(groups.length)} ${many}.`
    : '';
};
