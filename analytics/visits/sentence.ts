import type { Piece } from '@/analytics/figures/pieces';
import { formatDay, formatList, formatMassWithUnit, formatPercent, plural } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';
import type { Visit } from './contract';

const sum = (visits: readonly Visit[], of: 'recoveredMass' | 'fullCharge'): number =>
  visits.reduce((total, visit) => total + visit[of], 0);

/** What all visits of a place came to: `RTU-1 at Mill Street gave 396 lb in 23 visits, 65.6% of what it held.` */
export const visitsAnswer = (name: string, all: readonly Visit[], unit: DisplayUnit): Piece[] => {
  const visits = all.filter(({ counts }) => counts);
  const held = sum(visits, 'fullCharge');
  if (held === 0) return [`Nothing that counts was recovered from ${name}.`];
  return [
    `${name} gave `,
    { measure: 'recoveredMass', figure: formatMassWithUnit(sum(visits, 'recoveredMass'), unit) },
    ' in ',
    { measure: 'recoveries', figure: plural(visits.length, 'visit', 'visits') },
    ', ',
    { measure: 'totalYield', figure: formatPercent(sum(visits, 'recoveredMass') / held, 1) },
    ' of the full charges.',
  ];
};

/** How many visits lie far below like jobs, and when the last of them was. */
export const lowVisitsNote = (visits: readonly Visit[]): string => {
  const low = visits.filter((visit) => visit.low);
  const last = low.at(-1);
  if (!last) return 'None of the visits lies far below like jobs.';
  const verb = low.length === 1 ? 'lies' : 'lie';
  return `${plural(low.length, 'visit', 'visits')} ${verb} far below like jobs, ${low.length === 1 ? '' : 'the last '}on ${formatDay(last.recoveredOn)}: a reason to look, not a finding.`;
};

/** One nameplate in pounds and in kilograms differs by the rounding of whoever wrote it down: less than this is no change. */
const SAME_NAMEPLATE = 0.01;

/** Visits whose nameplate differs from that of the visit before; of one unit, whose visits are in the order of time. */
export const nameplateChanges = (visits: readonly Visit[]): { visit: Visit; before: number }[] =>
  visits.flatMap((visit, index) => {
    const before = visits[index - 1]?.nameplateCharge;
    if (before === undefined) return [];
    const apart = Math.abs(visit.nameplateCharge - before) > SAME_NAMEPLATE * Math.max(visit.nameplateCharge, before);
    return apart ? [{ visit, before }] : [];
  });

/** How often the nameplate of a unit was written down otherwise than before; empty when never. */
export const nameplateNote = (visits: readonly Visit[], unit: DisplayUnit): string => {
  const changes = nameplateChanges(visits);
  if (!changes.length) return '';
  const told = changes.map(
    ({ visit, before }) =>
      `${formatMassWithUnit(before, unit)} to ${formatMassWithUnit(visit.nameplateCharge, unit)} on ${formatDay(visit.recoveredOn)}`,
  );
  return `Its nameplate charge was written down differently ${changes.length === 1 ? 'once' : plural(changes.length, 'time', 'times')}: ${formatList(told)}.`;
};
