import { expect, test } from 'vitest';
import type { MonthlyTrends } from '@/analytics/monthly-trends/contract';
import { trendAnswer, trendNotes } from '@/analytics/monthly-trends/sentence';
import { toStacks } from '@/analytics/monthly-trends/series';
import { trendsOf } from '../support/trends';

const plainSpaces = (text: string) => text.replaceAll('\u00a0', ' ');
const answer = (trends: MonthlyTrends) => {
  const { before, figure, after } = trendAnswer(toStacks(trends), 'kg');
  return plainSpaces(`${before}${figure ?? ''}${after}`);
};
const notes = (trends: MonthlyTrends) => trendNotes(toStacks(trends), trends, 'kg', (key) => key).map(plainSpaces);
const years = (before: number, now: number) =>
  trendsOf([
    ['2025-11', 'R-22', before],
    ['2026-11', 'R-22', now],
  ]);

test('the last whole month against the same one a year before', () => {
  expect(answer(years(100, 126))).toBe('November 2026 brought in 126 kg, 26% more than in November 2025.');
  expect(answer(years(100, 74))).toBe('November 2026 brought in 74 kg, 26% less than in November 2025.');
  expect(answer(years(1000, 1004))).toBe('November 2026 brought in 1,004 kg, as much as in November 2025.');
  expect(answer(years(100, 340))).toBe('November 2026 brought in 340 kg, 3.4 times as much as in November 2025.');
  expect(answer(years(0, 340))).toBe('November 2026 brought in 340 kg; nothing was recovered in November 2025.');
});

test('a running month is never compared', () => {
  const rows: [string, string, number][] = [
    ['2025-12', 'R-22', 100],
    ['2026-11', 'R-22', 50],
    ['2026-12', 'R-22', 3],
  ];
  expect(answer(trendsOf(rows, { partialMonth: '2026-12' }))).toBe('November 2026 brought in 50 kg.');
  expect(answer(trendsOf([['2026-12', 'R-22', 3]], { partialMonth: '2026-12' }))).toBe(
    'December 2026 has brought in 3 kg so far.',
  );
});

test('one month, cut days, an empty month and no records at all', () => {
  expect(answer(trendsOf([['2026-11', 'R-22', 50]]))).toBe('November 2026 brought in 50 kg.');
  expect(notes(trendsOf([['2026-11', 'R-22', 50]]))).toEqual(['There is no year before to compare with yet.']);
  expect(answer(trendsOf([['2026-11', 'R-22', 50]], { cutMonths: ['2026-11'] }))).toBe(
    'The chosen days brought in 50 kg in 1 recovery.',
  );
  const days: [string, string, number][] = [
    ['2026-10', 'R-22', 20],
    ['2026-11', 'R-22', 50],
  ];
  expect(answer(trendsOf(days, { cutMonths: ['2026-10', '2026-11'] }))).toBe(
    'The chosen days brought in 70 kg in 2 recoveries.',
  );
  const gap = trendsOf(
    [
      ['2026-10', 'R-22', 5],
      ['2026-12', 'R-22', 5],
    ],
    { partialMonth: '2026-12' },
  );
  expect(answer(gap)).toBe('Nothing was recovered in November 2026.');
  expect(answer(trendsOf([]))).toBe('No recoveries in this scope.');
});

test('names the part that makes most of the difference, and only then', () => {
  const shift = (r22: number, r410a: number) =>
    trendsOf([
      ['2025-11', 'R-22', 50],
      ['2025-11', 'R-410A', 50],
      ['2026-11', 'R-22', r22],
      ['2026-11', 'R-410A', r410a],
    ]);
  expect(notes(shift(50, 90))).toEqual(['Most of the difference is R-410A: 40 kg more.']);
  expect(notes(shift(10, 60))).toEqual(['Most of the difference is R-22: 40 kg less.']);
  expect(notes({ ...shift(50, 90), by: 'technician' })).toEqual([]);
  expect(notes(shift(70, 70))).toEqual([]);
  expect(notes(shift(50, 50))).toEqual([]);
});

test('says when records stopped coming and what was left out', () => {
  expect(notes({ ...years(100, 120), partialMonth: '2027-02', excluded: 2 })).toEqual([
    'Nothing is recorded after November 2026.',
    '2 records are left out as entry errors.',
  ]);
  expect(notes({ ...years(100, 120), partialMonth: '2026-12', excluded: 1 })).toEqual([
    '1 record is left out as an entry error.',
  ]);
});

test('single months without any record are named, those of a thin series are not', () => {
  const recorded = (...months: string[]) => trendsOf(months.map((month) => [month, 'R-22', 5]));
  expect(notes(recorded('2026-08', '2026-10', '2026-11'))).toContain('Nothing is recorded in September 2026.');
  expect(
    notes(recorded('2026-05', '2026-06', '2026-07', '2026-09', '2026-11', '2026-12', '2027-01', '2027-02')),
  ).toContain('Nothing is recorded in August 2026 and October 2026.');
  expect(notes(recorded('2026-01', '2026-11')).join(' ')).not.toContain('Nothing is recorded in');
});

test('records of nothing at all are said as they are', () => {
  expect(answer(years(0, 0))).toBe('November 2026 brought in 0 kg, as in November 2025.');
});
