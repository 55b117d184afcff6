import { describe, expect, test } from 'vitest';
import type { Comparison } from '@/analytics/trends-comparison/contract';
import {
  certaintyWords,
  comparisonAnswer,
  comparisonNote,
  likeForLikeWords,
  moverNote,
  periodWords,
} from '@/analytics/trends-comparison/sentence';

const plain = (text: string) => text.replaceAll('\u00a0', ' ');

const side = (from: string, to: string, recoveredMass: number, recoveries = 40): Comparison['now'] => ({
  from,
  to,
  recoveredMass,
  recoveries,
  massStandardError: 0,
  totalYield: null,
  medianYield: null,
  holdStated: 0,
  held: 0,
  heldShare: null,
  vacuumStated: 0,
  downToLevel: 0,
  downToLevelShare: null,
  flagged: 0,
  flaggedShare: null,
  co2e: 0,
  massWithoutGwp: 0,
  excluded: 0,
});

const comparison = (now: number, before: number, rest: Partial<Comparison> = {}): Comparison => ({
  now: side('2026-01-01', '2026-12-09', now),
  before: side('2025-01-01', '2025-12-09', before),
  sameDays: true,
  shortened: null,
  difference: { mass: now - before, low: 0, high: 0 },
  ratio: before && now ? { value: now / before, low: 0.77, high: 1.64 } : null,
  clear: false,
  movers: [],
  otherKeys: { keys: 0, difference: 0 },
  ...rest,
});

test.each([
  ['2026-11-01', '2026-11-30', 'November 2026'],
  ['2026-01-01', '2026-11-30', 'January to November 2026'],
  ['2025-12-01', '2026-11-30', 'December 2025 to November 2026'],
  ['2024-02-01', '2024-02-29', 'February 2024'],
  ['2024-02-01', '2024-02-28', 'Feb 1 to Feb 28, 2024'],
  ['2026-01-01', '2026-12-09', 'Jan 1 to Dec 9, 2026'],
  ['2025-12-10', '2026-01-09', 'Dec 10, 2025 to Jan 9, 2026'],
  ['2026-12-09', '2026-12-09', 'Dec 9, 2026'],
])('%s to %s is %s', (from, to, words) => {
  expect(periodWords({ from, to })).toBe(words);
});

test.each([
  [112, 100, 'Jan 1 to Dec 9, 2026 brought in 112 kg, 12% more than from Jan 1 to Dec 9, 2025.'],
  [88, 100, 'Jan 1 to Dec 9, 2026 brought in 88 kg, 12% less than from Jan 1 to Dec 9, 2025.'],
  [100, 100, 'Jan 1 to Dec 9, 2026 brought in 100 kg, as much as from Jan 1 to Dec 9, 2025.'],
  [300, 100, 'Jan 1 to Dec 9, 2026 brought in 300 kg, 3.0 times as much as from Jan 1 to Dec 9, 2025.'],
  [5, 0, 'Jan 1 to Dec 9, 2026 brought in 5 kg; nothing was recovered from Jan 1 to Dec 9, 2025.'],
  [0, 100, 'Jan 1 to Dec 9, 2026 brought in 0 kg, 100% less than from Jan 1 to Dec 9, 2025.'],
  [0, 0, 'Jan 1 to Dec 9, 2026 brought in 0 kg, as from Jan 1 to Dec 9, 2025.'],
])('%d kg against %d kg', (now, before, words) => {
  const { before: begins, figure, after } = comparisonAnswer(comparison(now, before), 'kg');
  expect(plain(`${begins}${figure ?? ''}${after}`)).toBe(words);
});

test.each([
  ['2025-11-01', '2025-11-30', 'than in November 2025.'],
  ['2025-01-01', '2025-11-30', 'than from January to November 2025.'],
  ['2025-12-09', '2025-12-09', 'than on Dec 9, 2025.'],
])('the other period %s to %s is spoken of as: %s', (from, to, words) => {
  const { after } = comparisonAnswer({ ...comparison(112, 100), before: side(from, to, 100) }, 'kg');
  expect(after).toBe(`, 12% more ${words}`);
});

describe('says how far a change can be believed', () => {
  test('not at all clear', () => {
    expect(certaintyWords(comparison(112, 100))).toBe(
      'Jobs differ much in size: the change may lie between 23% less and 64% more, which is no clear change.',
    );
    const few = { ...comparison(112, 100), before: side('2025-01-01', '2025-12-09', 100, 29) };
    expect(certaintyWords(few)).toMatch(/^So few jobs say little: /);
  });

  test('clear', () => {
    const clear = comparison(150, 100, { ratio: { value: 1.5, low: 1.2, high: 1.9 }, clear: true });
    expect(certaintyWords(clear)).toBe(
      'Jobs of such sizes would not differ so much by chance: the change lies between 20% more and 90% more.',
    );
    expect(plain(comparisonNote(clear, 'kg'))).toContain('150 kg, 50% more than from');
  });

  test('nothing to doubt where there is no ratio', () => {
    expect(certaintyWords(comparison(5, 0))).toBe('');
    expect(comparisonNote(comparison(5, 0), 'kg')).toMatch(/nothing was recovered from .* 2025\.$/);
  });
});

test('says what was left out so that like stands against like', () => {
  expect(likeForLikeWords(comparison(1, 1, { sameDays: false }))).toBe('');
  expect(likeForLikeWords(comparison(1, 1))).toMatch(/same days/);
  expect(likeForLikeWords(comparison(1, 1, { shortened: 'to twelve months' }))).toMatch(
    /last twelve months.*same days/,
  );
  expect(likeForLikeWords(comparison(1, 1, { shortened: 'to where records begin', sameDays: false }))).toMatch(
    /left out on both sides/,
  );
  expect(likeForLikeWords(comparison(1, 1, { shortened: 'to the shorter one', sameDays: false }))).toBe(
    'The two differ in length: Jan 1 to Dec 9, 2026 is laid beside Jan 1 to Dec 9, 2025.',
  );
});

test('names the key that makes more than half of the difference, and only then', () => {
  const mover = (key: string, now: number, before: number) => ({ key, now, before, difference: now - before });
  const said = (movers: Comparison['movers'], by: 'refrigerant' | 'technician' = 'refrigerant') => {
    const sum = (of: 'now' | 'before') => movers.reduce((total, one) => total + one[of], 0);
    return plain(moverNote(comparison(sum('now'), sum('before'), { movers }), by, 'kg', (key) => key));
  };
  expect(said([mover('R-22', 10, 60), mover('R-32', 30, 20)])).toBe('Most of the difference is R-22: 50 kg less.');
  expect(said([mover('R-22', 60, 10), mover('R-32', 30, 20)])).toBe('Most of the difference is R-22: 50 kg more.');
  expect(said([mover('R-22', 60, 10), mover('R-32', 10, 90)])).toBe('');
  expect(said([mover('R-22', 20, 10), mover('R-32', 30, 20)])).toBe('');
  expect(said([mover('R-22', 60, 10), mover('R-32', 10, 60)])).toBe('');
  expect(said([mover('R-22', 60, 10)])).toBe('');
  expect(said([mover('Ada', 60, 10), mover('Ben', 20, 20)], 'technician')).toBe('');
  expect(said([])).toBe('');
});
