import { expect, test } from 'vitest';
import { everyMonth, lastWholeMonth, toStacks } from '@/analytics/monthly-trends/series';
import { trendsOf } from '../support/trends';

test('every month between the first and the last stands there, zeros included', () => {
  const { months } = toStacks(
    trendsOf([
      ['2025-11', 'R-22', 2],
      ['2026-02', 'R-410A', 3],
    ]),
  );
  expect(months.map(({ month, recoveredMass, layers }) => [month, recoveredMass, Object.values(layers)])).toEqual([
    ['2025-11', 2, [0, 2]],
    ['2025-12', 0, [0, 0]],
    ['2026-01', 0, [0, 0]],
    ['2026-02', 3, [3, 0]],
  ]);
  expect(months[1]?.medianYield).toBeNull();
});

test('the largest layer comes first, the others together come last, and nothing is lost', () => {
  const { layers, months } = toStacks(
    trendsOf(
      [
        ['2026-01', 'small', 2],
        ['2026-01', 'large', 5],
      ],
      {
        otherKeys: { keys: 3, rows: [{ month: '2026-01', recoveredMass: 3.003, recoveries: 4, flagged: 0, co2e: 0 }] },
      },
    ),
  );
  expect(layers.map(({ key, keys }) => [key, keys])).toEqual([
    ['large', 1],
    ['small', 1],
    [null, 3],
  ]);
  expect(months[0]?.layers.rest).toBe(3.003);
});

test('a key that is called like the rest is not the rest', () => {
  const { layers } = toStacks(trendsOf([['2026-01', 'rest', 1]]));
  expect(layers).toEqual([{ id: 'layer-0', key: 'rest', keys: 1 }]);
});

test('running and cut months are marked, and the last whole month is neither', () => {
  const { months } = toStacks(
    trendsOf(
      [
        ['2026-09', 'R-22', 1],
        ['2026-10', 'R-22', 1],
        ['2026-11', 'R-22', 1],
        ['2026-12', 'R-22', 1],
      ],
      { partialMonth: '2026-12', cutMonths: ['2026-09', '2026-11'] },
    ),
  );
  expect(months.map(({ state }) => state)).toEqual(['cut', 'whole', 'cut', 'running']);
  expect(lastWholeMonth(months)?.month).toBe('2026-10');
});

test('nothing gives nothing; a year turns', () => {
  expect(toStacks(trendsOf([]))).toEqual({ layers: [], months: [] });
  expect(everyMonth('2025-12', '2026-01')).toEqual(['2025-12', '2026-01']);
  expect(everyMonth('2026-01', '2025-12')).toEqual([]);
});
