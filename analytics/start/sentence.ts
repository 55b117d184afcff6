import type { FigureScope } from '@/analytics/figures/figure';
import type { Piece } from '@/analytics/figures/pieces';
import { flagsAnswer } from '@/analytics/flags/sentence';
import { changeWords } from '@/analytics/monthly-trends/sentence';
import { EVERY_RECORD, monthsBefore } from '@/analytics/scope-address';
import { formatCount, formatDay, formatMassWithUnit, formatMonth, formatPercent, plural } from '@/lib/format';
import type { DisplayUnit, Role } from '@/lib/vocabulary';
import type { Start } from './contract';

/** A sentence whose figures open, the records they are about, and what is said under it. */
export type StartAnswer = { pieces: Piece[]; scope: FigureScope; sub: Piece[] };

/** Everything the viewer sees between two days or months, both included; null is open. */
export const wholeScope = (from: string | null, to: string | null): FigureScope => ({ ...EVERY_RECORD, from, to });

type Latest = NonNullable<Start['latest']>;

const when = ({ month, whole }: Latest): string => (whole ? formatMonth(month) : `${formatMonth(month)} so far`);

const monthPieces = (latest: Latest, unit: DisplayUnit): Piece[] => {
  const { month, now, yearBefore } = latest;
  const told = formatMassWithUnit(now.recoveredMass, unit, 0);
  const end = yearBefore
    ? changeWords(now.recoveredMass, yearBefore.recoveredMass, `in ${formatMonth(monthsBefore(month, 12))}`)
    : '.';
  return [`${when(latest)} brought in `, { measure: 'recoveredMass', figure: told }, end];
};

const ownPieces = ({ month, whole, now }: Latest, unit: DisplayUnit): Piece[] => [
  whole ? `In ${formatMonth(month)} you recovered ` : `In ${formatMonth(month)} you have recovered `,
  { measure: 'recoveredMass', figure: formatMassWithUnit(now.recoveredMass, unit, 0) },
  ' in ',
  { measure: 'recoveries', figure: plural(now.recoveries, 'recovery', 'recoveries') },
  ...(now.totalYield === null
    ? ['.']
    : [', ', { measure: 'totalYield' as const, figure: formatPercent(now.totalYield) }, ' of what the systems hold.']),
];

const logPieces = ({ recoveries, firstOn, lastOn }: Start): Piece[] => [
  'The records hold ',
  { measure: 'recoveries', figure: plural(recoveries, 'recovery', 'recoveries') },
  firstOn && lastOn ? ` from ${formatDay(firstOn)} to ${formatDay(lastOn)}.` : '.',
];

const shortfallWords = ({ shortfall }: Start, unit: DisplayUnit): Piece[] =>
  shortfall?.recoveries
    ? [
        { measure: 'farBelow', figure: plural(shortfall.recoveries, 'recovery', 'recoveries') },
        ` far below like jobs came to ${formatMassWithUnit(shortfall.mass, unit, 0)} less than the middle of like jobs would have been, whatever the reason.`,
      ]
    : [];

const leftOutWords = ({ excluded }: Start): string =>
  excluded ? `${formatCount(excluded)} more ${excluded === 1 ? 'is' : 'are'} left out of figures as entry errors.` : '';

const latelyAnswer = ({ lately }: Start): StartAnswer | null =>
  lately && lately.flagged > 0
    ? {
        pieces: flagsAnswer({ flagged: lately.flagged, records: lately.flagged }),
        scope: wholeScope(lately.from, lately.to),
        sub: ['In the last 30 days. A reason to look, not a finding.'],
      }
    : null;

const fileWords = ({ lastFile }: Start): string => {
  if (!lastFile) return '';
  const taken = lastFile.added + lastFile.updated;
  const refused = lastFile.rejected ? ` and left out ${plural(lastFile.rejected, 'row', 'rows')}` : '';
  return `The last file, ${lastFile.fileName}, brought in ${plural(taken, 'record', 'records')}${refused}.`;
};

/** The answer that a role looks for first; null while there is no record to say anything of. */
export const startAnswer = (start: Start, role: Role, unit: DisplayUnit): StartAnswer | null => {
  const { latest, firstOn, lastOn } = start;
  if (!latest) return null;
  const monthScope = wholeScope(latest.month, latest.month);
  const everything = wholeScope(firstOn, lastOn);
  const month = { pieces: monthPieces(latest, unit), scope: monthScope, sub: [] };
  switch (role) {
    case 'technician':
      return {
        pieces: ownPieces(latest, unit),
        scope: monthScope,
        sub: ['Your own records; nobody else’s stand here.'],
      };
    case 'trainer':
      return latelyAnswer(start) ?? month;
    case 'auditor':
      return { pieces: logPieces(start), scope: everything, sub: [leftOutWords(start)] };
    case 'office':
      return { pieces: logPieces(start), scope: everything, sub: [fileWords(start)] };
    case 'owner':
      return { ...month, sub: shortfallWords(start, unit) };
    case 'operations':
      return month;
  }
};
