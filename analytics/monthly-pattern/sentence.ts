import { formatList, formatMassWithUnit, formatMonth, formatPercent, plural } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';
import type { MonthlyPattern, ShownPattern, ShownPatternMonth } from './contract';

/** A note that may be the cause of a month. */
type NotedDays = { from: string; to: string; text: string };

/** Months whose band they fall out of are told of for a year; older ones stand in the figure. */
const TOLD_MONTHS = 12;

/** Whether a month falls out of its band. */
export const isUnusual = ({ signals }: Pick<ShownPatternMonth, 'signals'>): boolean => signals.includes('beyondLimits');

/** Whether any day of a note lies in the month. */
export const touchesMonth = ({ from, to }: Pick<NotedDays, 'from' | 'to'>, month: string): boolean =>
  from.slice(0, 7) <= month && month <= to.slice(0, 7);

/** How a month stands to what is usual: `unusually high`, `unusually low`. */
export const unusualWord = ({ recoveredMass, expected }: ShownPatternMonth): string =>
  recoveredMass > expected ? 'unusually high' : 'unusually low';

/**
 * The latest unusual month of the last twelve, with what is usual and its cause where a note tells one; null when there
 * is none. `months` are in order.
 */
export const unusualNote = (
  months: readonly ShownPatternMonth[],
  notes: readonly NotedDays[],
  unit: DisplayUnit,
): string | null => {
  const unusual = months.slice(-TOLD_MONTHS).filter(isUnusual);
  const latest = unusual.at(-1);
  if (!latest) return null;
  const inUnit = (kg: number) => formatMassWithUnit(kg, unit, 0);
  const causes = notes.filter((note) => touchesMonth(note, latest.month)).map(({ text }) => `“${text}”`);
  const cause = causes.length ? `noted: ${formatList(causes, 2)}` : 'no cause is noted yet';
  const told = `In routine jobs ${formatMonth(latest.month)} was ${unusualWord(latest)}: ${inUnit(latest.recoveredMass)} where ${inUnit(latest.low)} to ${inUnit(latest.high)} is usual (${cause}).`;
  const others = unusual.slice(0, -1).map(({ month }) => formatMonth(month));
  return others.length ? `${told} So ${others.length === 1 ? 'was' : 'were'} ${formatList(others)}.` : told;
};

/** What the band means, how strong the season is, and what moved away from it. */
export const patternSentences = ({ baseline, steady, seasonStrength, months }: ShownPattern): string[] => {
  const season = steady
    ? `Season explains ${formatPercent(seasonStrength)} of what moves around the trend.`
    : 'There is no steady season in these months: what moves is mostly the jobs.';
  const band = `The band is where a usual month falls, by the spread of ${formatMonth(baseline.from)} to ${formatMonth(baseline.to)}: a month outside of it has a cause worth looking for, one inside needs no explanation.`;
  const shift = months.findLast(({ signals }) => signals.includes('eightOneSide'));
  const shifted = shift
    ? ` By ${formatMonth(shift.month)}, eight months in a row lay ${shift.recoveredMass > shift.expected ? 'above' : 'below'} what was expected: something changed for good.`
    : '';
  const few = months.filter(({ counts }) => !counts).length;
  const uncounted = few
    ? ` ${plural(few, 'month', 'months')} of fewer than five recoveries ${few === 1 ? 'is' : 'are'} drawn hollow and not judged.`
    : '';
  return [`${season}${shifted}`, `${band}${uncounted}`];
};

/** What the figure is about, and how much of all mass is not in it. */
export const routineSentence = (
  { fromFullCharge, recoveries, recoveredMass, allMass }: MonthlyPattern['large'],
  unit: DisplayUnit,
): string => {
  const large = `${formatMassWithUnit(fromFullCharge, unit, 0)} full charge and more`;
  return recoveries > 0
    ? `Routine jobs only: large plant (${large}) is ${formatPercent(allMass > 0 ? recoveredMass / allMass : 0)} of all mass in ${plural(recoveries, 'job', 'jobs')}, and when a chiller comes up is no season.`
    : `No large plant (${large}) is among these jobs.`;
};

/** Why there is no season to show yet. */
export const missingSentence = ({ needs, has, of }: NonNullable<MonthlyPattern['missing']>): string =>
  of === 'months with mass'
    ? 'Nothing was weighed in these months, so nothing can be usual or unusual.'
    : `Season and trend are told apart from ${needs} ${of} on; there ${has === 1 ? 'is' : 'are'} ${has}. Until then each month stands against the same one a year before.`;
