import { expect, test } from 'vitest';
import type { ShownPatternMonth } from '@/analytics/monthly-pattern/contract';
import {
  missingSentence,
  patternSentences,
  routineSentence,
  touchesMonth,
  unusualNote,
} from '@/analytics/monthly-pattern/sentence';
import { everyMonth } from '@/analytics/monthly-trends/series';

const plain = (text: string | null) => text?.replaceAll('\u00a0', ' ') ?? null;

/** Two years of 100 kg a month, 80 to 120 usual, with some months changed. */
const months = (changes: Record<string, Partial<ShownPatternMonth>> = {}): ShownPatternMonth[] =>
  everyMonth('2024-12', '2026-11').map((month) => ({
    month,
    recoveredMass: 100,
    recoveries: 20,
    trend: 100,
    seasonFactor: 1,
    remainderFactor: 1,
    expected: 100,
    low: 80,
    high: 120,
    counts: true,
    signals: [],
    ...changes[month],
  }));
const HIGH = { recoveredMass: 160, signals: ['beyondLimits'] };
const LOW = { recoveredMass: 40, signals: ['beyondLimits'] };
const strike = { from: '2026-06-28', to: '2026-07-10', text: 'Strike at the reclaimer' };

test('a usual year has nothing to tell', () => {
  expect(unusualNote(months(), [strike], 'kg')).toBeNull();
  expect(unusualNote([], [], 'kg')).toBeNull();
});

test('what was unusual more than a year ago is no news', () => {
  expect(unusualNote(months({ '2025-11': HIGH }), [], 'kg')).toBeNull();
});

test('the latest unusual month is told with what is usual and its cause', () => {
  expect(plain(unusualNote(months({ '2026-07': LOW }), [strike], 'kg'))).toBe(
    'In routine jobs July 2026 was unusually low: 40 kg where 80 kg to 120 kg is usual (noted: “Strike at the reclaimer”).',
  );
  expect(plain(unusualNote(months({ '2026-08': HIGH }), [strike], 'kg'))).toBe(
    'In routine jobs August 2026 was unusually high: 160 kg where 80 kg to 120 kg is usual (no cause is noted yet).',
  );
  expect(plain(unusualNote(months({ '2026-03': LOW, '2026-08': HIGH }), [], 'kg'))).toMatch(/So was March 2026\.$/);
  expect(plain(unusualNote(months({ '2026-03': LOW, '2026-04': LOW, '2026-08': HIGH }), [], 'kg'))).toMatch(
    /So were March 2026 and April 2026\.$/,
  );
});

test('a note touches each month that one of its days lies in', () => {
  expect(['2026-05', '2026-06', '2026-07', '2026-08'].filter((month) => touchesMonth(strike, month))).toEqual([
    '2026-06',
    '2026-07',
  ]);
});

test('the band is explained, and a lasting change and thin months are named', () => {
  const baseline = {
    from: '2024-12',
    to: '2026-11',
    months: 24,
    form: 'mean' as const,
    lower: 0.8,
    upper: 1.2,
  };
  const said = (changes: Record<string, Partial<ShownPatternMonth>>, steady = true) =>
    patternSentences({ months: months(changes), baseline, steady, seasonStrength: 0.62 });
  expect(said({})).toEqual([
    'Season explains 62% of what moves around the trend.',
    'The band is where a usual month falls, by the spread of December 2024 to November 2026: a month outside of it has a cause worth looking for, one inside needs no explanation.',
  ]);
  expect(said({}, false)[0]).toMatch(/^There is no steady season/);
  expect(said({ '2026-10': { recoveredMass: 110, signals: ['eightOneSide'] } })[0]).toMatch(
    /By October 2026, eight months in a row lay above what was expected/,
  );
  expect(plain(said({ '2026-10': { counts: false } })[1] ?? '')).toMatch(
    /1 month of fewer than five recoveries is drawn hollow/,
  );
});

test('says what is missing for a season', () => {
  expect(missingSentence({ needs: 24, has: 7, of: 'full months' })).toBe(
    'Season and trend are told apart from 24 full months on; there are 7. Until then each month stands against the same one a year before.',
  );
  expect(missingSentence({ needs: 24, has: 1, of: 'full months' })).toMatch(/there is 1\./);
  expect(missingSentence({ needs: 1, has: 0, of: 'months with mass' })).toMatch(/^Nothing was weighed/);
});

test('says that large plant is left out, and how much that is', () => {
  const large = { fromFullCharge: 45.359237, recoveries: 12, recoveredMass: 610, allMass: 1000 };
  expect(plain(routineSentence(large, 'lb'))).toBe(
    'Routine jobs only: large plant (100 lb full charge and more) is 61% of all mass in 12 jobs, and when a chiller comes up is no season.',
  );
  expect(plain(routineSentence({ ...large, recoveries: 0, recoveredMass: 0 }, 'lb'))).toBe(
    'No large plant (100 lb full charge and more) is among these jobs.',
  );
});
