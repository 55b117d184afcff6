import { formatList, formatMassWithUnit, formatMonth, formatPercent, plural } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';
import type { MonthlyTrends } from './contract';
import { lastWholeMonth, monthsAfter, type StackedMonth, type StackLayer, type Stacks } from './series';

/** A sentence in pieces: text, and one figure that opens the records of its month, or of the whole scope. */
export type Answer = { before: string; figure: string | null; after: string; month: string | null };

const text = (before: string): Answer => ({ before, figure: null, after: '', month: null });

/** Below half a per cent two months are the same: the scales do not tell them apart. */
const SAME = 0.005;
/** From here on "so many times" is plainer than per cent. */
const TIMES = 3;

/**
 * How a mass stands to another one, as the end of a sentence: `, 26% more than in November 2025.` Masses in kg; `then`
 * says when the other one was, with its preposition.
 */
export const changeWords = (mass: number, before: number, then: string): string => {
  if (before === 0) return mass === 0 ? `, as ${then}.` : `; nothing was recovered ${then}.`;
  const change = mass / before - 1;
  if (Math.abs(change) < SAME) return `, as much as ${then}.`;
  if (change >= TIMES - 1) return `, ${(mass / before).toFixed(1)} times as much as ${then}.`;
  return `, ${formatPercent(Math.abs(change))} ${change > 0 ? 'more' : 'less'} than ${then}.`;
};

/** What all months of a scope without a whole month come to. */
const sumAnswer = (months: readonly StackedMonth[], unit: DisplayUnit): Answer => {
  const mass = months.reduce((sum, { recoveredMass }) => sum + recoveredMass, 0);
  const recoveries = months.reduce((sum, month) => sum + month.recoveries, 0);
  return {
    before: 'The chosen days brought in ',
    figure: formatMassWithUnit(mass, unit, 0),
    after: ` in ${plural(recoveries, 'recovery', 'recoveries')}.`,
    month: null,
  };
};

/**
 * What the latest whole month brought in against the same month a year before, in plain words. A month that is running
 * or cut by the scope is never compared.
 */
export const trendAnswer = ({ months }: Stacks, unit: DisplayUnit): Answer => {
  const latest = lastWholeMonth(months);
  const only = months[0];
  if (latest) {
    const { month, recoveredMass, recoveries, yearBefore } = latest;
    if (recoveries === 0) return text(`Nothing was recovered in ${formatMonth(month)}.`);
    return {
      before: `${formatMonth(month)} brought in `,
      figure: formatMassWithUnit(recoveredMass, unit, 0),
      after:
        yearBefore === null
          ? '.'
          : changeWords(recoveredMass, yearBefore, `in ${formatMonth(monthsAfter(month, -12))}`),
      month,
    };
  }
  if (!only) return text('No recoveries in this scope.');
  if (months.length > 1 || only.state === 'cut') return sumAnswer(months, unit);
  return {
    before: `${formatMonth(only.month)} has brought in `,
    figure: formatMassWithUnit(only.recoveredMass, unit, 0),
    after: ' so far.',
    month: only.month,
  };
};

/** The layer that makes more than half of the change between two months, with its own change; null when none does. */
const mainPart = (layers: readonly StackLayer[], now: StackedMonth, then: StackedMonth) => {
  const change = now.recoveredMass - then.recoveredMass;
  for (const layer of layers) {
    const own = (now.layers[layer.id] ?? 0) - (then.layers[layer.id] ?? 0);
    if (layer.key !== null && own * Math.sign(change) > Math.abs(change) / 2) return { key: layer.key, own };
  }
  return null;
};

/** A series with more empty months than this is a thin one: gaps are its nature. */
const MOST_GAPS = 0.25;

/** Whole months inside of the period in which nothing is recorded, the latest one aside: the answer speaks of it. */
const gapNote = (months: readonly StackedMonth[]): string | null => {
  const latest = lastWholeMonth(months);
  const gaps = months.filter((month) => month.state === 'whole' && month.recoveries === 0 && month !== latest);
  if (!gaps.length || gaps.length > months.length * MOST_GAPS) return null;
  const names = formatList(
    gaps.map(({ month }) => formatMonth(month)),
    3,
  );
  return `Nothing is recorded in ${names}.`;
};

/**
 * What stands behind the answer, each a whole sentence: which part makes most of the change, a month without a year
 * before, gaps, records that stopped coming, records left out.
 */
export const trendNotes = (
  { layers, months }: Stacks,
  { by, partialMonth, excluded }: Pick<MonthlyTrends, 'by' | 'partialMonth' | 'excluded'>,
  unit: DisplayUnit,
  nameOf: (key: string) => string,
): string[] => {
  const notes: string[] = [];
  const latest = lastWholeMonth(months);
  const before = latest && months.find((month) => month.month === monthsAfter(latest.month, -12));
  if (latest && latest.yearBefore === null) notes.push('There is no year before to compare with yet.');
  const changed = latest?.yearBefore ? Math.abs(latest.recoveredMass / latest.yearBefore - 1) : 0;
  // A person is not the reason for a month: jobs are handed out, and holidays taken.
  if (latest && before?.state === 'whole' && changed >= SAME && layers.length > 1 && by !== 'technician') {
    const part = mainPart(layers, latest, before);
    const direction = part && part.own > 0 ? 'more' : 'less';
    if (part)
      notes.push(
        `Most of the difference is ${nameOf(part.key)}: ${formatMassWithUnit(Math.abs(part.own), unit, 0)} ${direction}.`,
      );
  }
  const gaps = gapNote(months);
  if (gaps) notes.push(gaps);
  const last = months.at(-1)?.month;
  if (partialMonth && last && last < monthsAfter(partialMonth, -1))
    notes.push(`Nothing is recorded after ${formatMonth(last)}.`);
  if (excluded > 0)
    notes.push(
      `${plural(excluded, 'record is', 'records are')} left out as ${excluded === 1 ? 'an entry error' : 'entry errors'}.`,
    );
  return notes;
};
