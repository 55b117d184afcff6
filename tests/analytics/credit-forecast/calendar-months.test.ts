import { describe, expect, test } from 'vitest';
import { historyOfMonths, monthAfter, placeOfMonth } from '@/analytics/credit-forecast/model/calendar-months';

describe('months', () => {
  test('count over the turn of the year', () => {
    expect(monthAfter('2026-11', 2)).toBe('2027-01');
    expect(monthAfter('2026-01', -1)).toBe('2025-12');
    expect(placeOfMonth('2026-02') - placeOfMonth('2025-12')).toBe(2);
  });

  test.each(['2026-13', '2026-1', 'soon', '2026-00'])('%s is none', (text) => {
    expect(() => placeOfMonth(text)).toThrow(RangeError);
  });
});

describe('a history from rows', () => {
  const span = { from: '2025-12', to: '2026-02' };
  const row = (month: string, refrigerant: string, recoveredKg: number) => ({ month, refrigerant, recoveredKg });

  test('sums a month, fills in nothing, and leaves out what lies outside', () => {
    const history = historyOfMonths(
      span,
      [row('2025-12', 'R-22', 1), row('2025-12', 'R-22', 2), row('2026-02', 'R-32', 4), row('2026-03', 'R-22', 9)],
      [row('2026-01', 'R-134a', 200), row('2025-11', 'R-134a', 300)],
      ['2026-01', '2020-01'],
    );
    expect(history).toEqual({
      firstMonthOfYear: 11,
      months: 3,
      routineKg: new Map([
        ['R-22', [3, 0, 0]],
        ['R-32', [0, 0, 4]],
      ]),
      largeJobs: [{ at: 1, refrigerant: 'R-134a', recoveredKg: 200 }],
      lost: new Set([1]),
    });
  });

  test('months in the wrong order are refused', () => {
    expect(() => historyOfMonths({ from: '2026-02', to: '2026-01' }, [], [])).toThrow(RangeError);
  });
});
